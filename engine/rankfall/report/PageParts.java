package rankfall.report;

import io.pebbletemplates.pebble.extension.escaper.SafeString;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import rankfall.AlgebraType;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Contracted;
import rankfall.Analysis.Contraction;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Findings;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Region;
import rankfall.Analysis.Relation;
import rankfall.Analysis.Stratum;
import rankfall.Analysis.Unfollowed;
import rankfall.exact.Polynomial;

/** Turns the parts of one analysis into what the page shows. */
final class PageParts {
  /** Largest order of a matrix that is set as one; a browser is slow beyond. */
  private static final int LARGEST_ORDER = 48;

  /** An irrational coordinate as the contract writes it. */
  static final Pattern ROOT = Pattern.compile("root\\((.*), *([^,]*)\\)");

  private final Analysis.Status status;
  private final boolean severalComponents;
  private final Formulas formulas;

  PageParts(Analysis a) {
    this.status = a.status();
    this.severalComponents = a.findings().map(f -> f.components().size() > 1).orElse(false);
    this.formulas = new Formulas(FamilyNames.notation(a));
  }

  private static SafeString math(Formula f) {
    return new SafeString(MathMl.inline(f));
  }

  SafeString text(String text) {
    return math(formulas.text(text));
  }

  SafeString polynomial(Polynomial p) {
    return math(formulas.of(p));
  }

  /** Names as one formula; empty without names. */
  List<SafeString> names(List<String> names) {
    return names.isEmpty()
        ? List.of()
        : List.of(math(Formulas.sequence(names.stream().map(formulas::text).toList())));
  }

  PageView.RelationView relation(Relation r) {
    Formula left =
        r.factors().size() == 1
            ? formulas.of(r.factors().get(0))
            : Formulas.product(
                r.factors().stream().map(p -> Formulas.enclosed(formulas.of(p))).toList());
    return new PageView.RelationView(
        math(Formulas.equal(left, new Formula.Number("0"))), Words.origin(r.origin()));
  }

  PageView.ComponentView component(Component c, int ofHowMany) {
    List<String> basis = c.basis();
    return new PageView.ComponentView(
        c.number(),
        ofHowMany == 1 ? "" : "Component " + c.number(),
        c.equations().isEmpty() ? List.of() : List.of(math(formulas.vanishing(c.equations()))),
        c.parameterDimension(),
        Words.general(c),
        Words.conditions(c, status),
        c.conditions().stream().map(this::condition).toList(),
        FamilyNames.brackets(c, formulas).stream().map(PageParts::math).toList(),
        math(Formulas.sequence(basis.stream().map(formulas::text).toList())),
        basis.size(),
        matrix(basis, c.killing().entries()),
        c.killing().determinant().map(d -> math(formulas.of(d))).stream().toList(),
        c.killing().kernel().isEmpty()
            ? List.of()
            : List.of(math(formulas.span(c.killing().kernel(), basis))),
        c.killing().blocks().size() < 2
            ? List.of()
            : c.killing().blocks().stream().map(b -> block(b, basis)).toList(),
        Words.withoutDeterminant(c),
        c.dual().map(d -> matrix(basis, d)).stream().toList(),
        Words.withoutInverse(c));
  }

  private SafeString block(List<Integer> block, List<String> basis) {
    return math(Formulas.sequence(block.stream().map(k -> formulas.text(basis.get(k))).toList()));
  }

  private PageView.ConditionView condition(Condition d) {
    return new PageView.ConditionView(
        math(formulas.vanishing(d.equations())),
        d.multiplicity().map(m -> Integer.toString(m)).orElse("\u2013"),
        d.rank().map(r -> Integer.toString(r)).orElse(Words.NO_ALGEBRA),
        d.rank().isEmpty() ? new SafeString("&#8211;") : math(formulas.span(d.kernel(), d.basis())),
        Words.realPoints(d.realPoints()));
  }

  private PageView.MatrixView matrix(List<String> basis, List<MatrixEntry> entries) {
    if (entries.isEmpty()) {
      return new PageView.MatrixView(List.of(), List.of());
    }
    if (basis.size() <= LARGEST_ORDER) {
      SquareMatrix m = SquareMatrix.of(basis.size(), entries, formulas);
      return new PageView.MatrixView(List.of(new SafeString(MathMl.matrix(m.rows()))), List.of());
    }
    return new PageView.MatrixView(
        List.of(),
        entries.stream()
            .map(
                e ->
                    new PageView.EntryView(
                        text(basis.get(e.row())),
                        text(basis.get(e.column())),
                        math(formulas.of(e.value()))))
            .toList());
  }

  PageView.StratumView stratum(Stratum s) {
    return new PageView.StratumView(
        s.name(),
        s.equations().isEmpty() ? List.of() : List.of(math(formulas.vanishing(s.equations()))),
        s.exclusions().stream().map(e -> math(formulas.vanishing(e))).toList(),
        s.codimension(),
        s.dimension(),
        s.rank(),
        s.derived(),
        s.centre(),
        s.radical(),
        s.nilradical(),
        s.kind(),
        s.type().map(t -> new SafeString(TypeText.html(t))).stream().toList(),
        Words.realPoints(s.realPoints()),
        witness(s.witness()),
        s.kernel().isEmpty() ? List.of() : List.of(math(formulas.span(s.kernel(), s.basis()))),
        s.remarks());
  }

  private List<SafeString> witness(List<Coordinate> point) {
    return point.stream().map(this::coordinate).toList();
  }

  /** {@code a = -3/2}, or in words for a root of a polynomial. */
  private SafeString coordinate(Coordinate c) {
    Matcher root = ROOT.matcher(c.value());
    if (!root.matches()) {
      return math(Formulas.equal(formulas.text(c.variable()), formulas.text(c.value())));
    }
    return new SafeString(
        text(c.variable())
            + " the root near "
            + Markup.escape(root.group(2))
            + " of "
            + text(root.group(1)));
  }

  SafeString diagram(Findings f) {
    return new SafeString(ClosureDiagram.of(f.strata(), f.coverings()));
  }

  List<MapView> maps(Findings f) {
    return new MapParts(f, formulas).all();
  }

  List<ScanView> scans(Findings f) {
    return f.scan().map(s -> new ScanParts(f, s, formulas).view()).stream().toList();
  }

  PageView.ContractionView contraction(Contraction c) {
    Optional<Contracted> limit =
        c.outcome() instanceof Contracted x ? Optional.of(x) : Optional.empty();
    return new PageView.ContractionView(
        c.stratum(),
        severalComponents ? "from component " + c.component() : "",
        !(c.outcome() instanceof Unfollowed),
        limit.map(x -> Integer.toString(c.basis().size())).orElse("\u2013"),
        limit.map(x -> Integer.toString(x.rank())).orElse("\u2013"),
        limit.map(x -> Integer.toString(x.derived())).orElse("\u2013"),
        limit.map(x -> Integer.toString(x.centre())).orElse("\u2013"),
        limit.flatMap(Contracted::type).map(t -> new SafeString(TypeText.html(t.text()))).stream()
            .toList(),
        Words.outcomeLead(c.outcome()),
        FamilyNames.followed(c, formulas).stream().map(PageParts::math).toList());
  }

  /** The rows of all regions, each stratum opened by what it is. */
  List<PageView.RegionView> regions(Findings f) {
    MapParts maps = new MapParts(f, formulas);
    List<PageView.RegionView> out = new ArrayList<>();
    String open = "";
    for (Region r : f.regions()) {
      String words = open.equals(r.stratum()) ? "" : Words.stratum(f, r.stratum());
      out.add(region(r, !open.equals(r.stratum()), words, maps.chips(r)));
      open = r.stratum();
    }
    return out;
  }

  private PageView.RegionView region(
      Region r, boolean opensStratum, String words, List<SafeString> chips) {
    return new PageView.RegionView(
        r.stratum(),
        opensStratum,
        words,
        r.name(),
        chips,
        r.conditions().stream().map(c -> text(c.toString())).toList(),
        Words.signature(r.signature()),
        r.type().map(t -> new SafeString(TypeText.html(t.name()))).stream().toList(),
        r.type().map(t -> TypeText.signs(String.join(", ", t.otherNames()))).orElse(""),
        r.type().map(AlgebraType::everywhere).orElse(true),
        CsvFiles.proof(r.exact()),
        witness(r.witness()));
  }
}
