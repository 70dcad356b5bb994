package rankfall.report;

import io.pebbletemplates.pebble.extension.escaper.SafeString;
import java.util.ArrayList;
import java.util.List;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Findings;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Stratum;
import rankfall.Forms.Angle;
import rankfall.Forms.Casimir;
import rankfall.Forms.InvariantForms;
import rankfall.Forms.Roots;
import rankfall.Forms.TorusForm;
import rankfall.Forms.WithoutRoots;
import rankfall.SignCondition;
import rankfall.exact.RationalFunction;
import rankfall.spec.Spec;

/**
 * What the page shows of forms beside the Killing form; finished markup as {@code SafeString}.
 *
 * @param tori one a component with a torus
 * @param casimirWords what a Casimir element is
 * @param casimirs one a component with a Casimir element
 * @param invariantWords what invariant forms are
 * @param invariants one a stratum; empty where none was decided
 */
record FormsView(
    List<TorusView> tori,
    String casimirWords,
    List<CasimirView> casimirs,
    String invariantWords,
    List<InvariantView> invariants) {
  /** Most terms of a Casimir element that are set. */
  private static final int MOST_TERMS = 60;

  /** Widest determinant that is set, in letters. */
  static final int WIDEST = 240;

  /** A vector with its length. */
  record LengthView(SafeString name, SafeString squaredLength) {}

  /** Two vectors with their angle. */
  record AngleView(SafeString first, SafeString second, SafeString cosine, String degrees) {}

  /** A covector, or a simple root. */
  record CovectorView(
      SafeString name, SafeString values, List<SafeString> sharp, SafeString squaredLength) {}

  /** Roots, or why there are none. */
  record RootsView(
      String reason,
      String type,
      List<CovectorView> simple,
      List<SafeString> cartan,
      List<SafeString> positive) {}

  /** The form on a torus. */
  record TorusView(
      String heading,
      String span,
      SafeString elements,
      SafeString form,
      String positive,
      List<SafeString> conditions,
      List<SafeString> orthonormal,
      List<LengthView> lengths,
      List<AngleView> angles,
      List<SafeString> dual,
      List<LengthView> dualLengths,
      List<AngleView> dualAngles,
      List<CovectorView> covectors,
      RootsView roots) {}

  /** A Casimir element; no formula where it is too long. */
  record CasimirView(String heading, List<SafeString> formula) {}

  /** Invariant forms of a stratum. */
  record InvariantView(
      String stratum,
      String dimension,
      String nonDegenerate,
      String extent,
      List<SafeString> member,
      List<SafeString> determinant,
      String inverseWords,
      List<SafeString> inverse,
      List<DeviationView> deviations,
      String unsettled) {}

  /** Where invariant forms are otherwise. */
  record DeviationView(SafeString equations, String dimension, String nonDegenerate) {}

  /** The view of an analysis of any status. */
  static FormsView of(Analysis a) {
    Part part = new Part(a.spec(), new FormFormulas(new Formulas(FamilyNames.notation(a))));
    List<Component> components = a.findings().map(Findings::components).orElse(List.of());
    boolean several = components.size() > 1;
    List<TorusView> tori = new ArrayList<>();
    List<CasimirView> casimirs = new ArrayList<>();
    for (Component c : components) {
      String heading = several ? "Component " + c.number() : "";
      c.torus().ifPresent(t -> tori.add(part.torus(heading, t)));
      c.casimir().ifPresent(x -> casimirs.add(part.casimir(heading, x, c.basis())));
    }
    List<InvariantView> invariants = new ArrayList<>();
    for (Stratum s : a.findings().map(Findings::strata).orElse(List.of())) {
      s.invariantForms().ifPresent(f -> invariants.add(part.invariant(s, f)));
    }
    return new FormsView(tori, FormWords.CASIMIR, casimirs, FormWords.INVARIANT, invariants);
  }

  /** Turns the parts of one analysis into views. */
  private record Part(Spec spec, FormFormulas formulas) {
    private static SafeString math(Formula f) {
      return new SafeString(MathMl.inline(f));
    }

    private SafeString matrix(int n, List<MatrixEntry> entries) {
      return new SafeString(MathMl.matrix(formulas.matrix(n, entries)));
    }

    TorusView torus(String heading, TorusForm t) {
      int n = t.elements().size();
      boolean hermitian = spec.convention() == Spec.Convention.HERMITIAN;
      List<Formula> elements = formulas.elements(t, hermitian);
      List<String> names = FormFormulas.names(t, hermitian);
      List<Formula> dual = dual(t);
      return new TorusView(
          heading,
          FormWords.span(t, hermitian),
          math(Formulas.sequence(elements)),
          matrix(n, t.form()),
          FormWords.positive(t),
          t.positive()
              .map(p -> p.conditions().stream().map(this::condition).toList())
              .orElse(List.of()),
          t.orthonormal().stream().map(v -> math(formulas.unit(v, names))).toList(),
          lengths(elements, t.form()),
          angles(elements, t.angles()),
          t.dual().map(d -> matrix(n, d)).stream().toList(),
          t.dual().map(d -> lengths(dual, d)).orElse(List.of()),
          angles(dual, t.dualAngles()),
          t.covectors().stream()
              .map(
                  c ->
                      new CovectorView(
                          math(formulas.formulas().text(c.name())),
                          math(formulas.values(c.components())),
                          List.of(math(formulas.sharp(c, names))),
                          math(formulas.formulas().of(c.squaredLength()))))
              .toList(),
          roots(t));
    }

    private SafeString condition(SignCondition c) {
      return math(formulas.formulas().text(c.toString()));
    }

    private static List<Formula> dual(TorusForm t) {
      List<Formula> out = new ArrayList<>();
      for (int k = 0; k < t.elements().size(); k++) {
        out.add(FormFormulas.dual(k));
      }
      return out;
    }

    private List<LengthView> lengths(List<Formula> names, List<MatrixEntry> entries) {
      List<LengthView> out = new ArrayList<>();
      for (int k = 0; k < names.size(); k++) {
        int at = k;
        out.add(
            new LengthView(
                math(names.get(k)),
                math(
                    entries.stream()
                        .filter(e -> e.row() == at && e.column() == at)
                        .map(e -> formulas.formulas().of(e.value()))
                        .findFirst()
                        .orElse(new Formula.Number("0")))));
      }
      return out;
    }

    private List<AngleView> angles(List<Formula> names, List<Angle> angles) {
      return angles.stream()
          .map(
              a ->
                  new AngleView(
                      math(names.get(a.first())),
                      math(names.get(a.second())),
                      a.squaredCosine()
                          .map(c -> math(formulas.formulas().of(c)))
                          .orElse(new SafeString("&#8211;")),
                      FormWords.degrees(a)))
          .toList();
    }

    private RootsView roots(TorusForm t) {
      if (t.roots() instanceof WithoutRoots w) {
        return new RootsView(w.reason(), "", List.of(), List.of(), List.of());
      }
      Roots r = (Roots) t.roots();
      List<CovectorView> simple = new ArrayList<>();
      for (int k = 0; k < r.simple().size(); k++) {
        RationalFunction length = r.squaredLengths().get(k);
        simple.add(
            new CovectorView(
                math(FormFormulas.root(k)),
                math(formulas.values(r.simple().get(k))),
                List.of(),
                math(formulas.formulas().of(length))));
      }
      return new RootsView(
          "",
          r.type(),
          simple,
          List.of(new SafeString(MathMl.matrix(FormFormulas.integers(r.cartan())))),
          List.of(math(FormFormulas.positive(r))));
    }

    CasimirView casimir(String heading, Casimir c, List<String> basis) {
      return new CasimirView(
          heading,
          c.entries().size() > MOST_TERMS ? List.of() : List.of(math(formulas.casimir(c, basis))));
    }

    InvariantView invariant(Stratum s, InvariantForms f) {
      return new InvariantView(
          s.name(),
          FormWords.dimension(f),
          FormWords.existence(f.nonDegenerate()),
          FormWords.extent(f),
          formulas.member(f.basis(), f.coefficients(), s.basis()).stream().map(Part::math).toList(),
          f.determinant().map(formulas.formulas()::of).stream()
              .filter(d -> d.width() <= WIDEST)
              .map(Part::math)
              .toList(),
          f.inverse().map(m -> FormWords.inverse(m, f)).orElse(""),
          f.inverse()
              .map(m -> formulas.inverse(m.entries(), s.basis()).stream().map(Part::math).toList())
              .orElse(List.of()),
          f.deviations().stream()
              .map(
                  d ->
                      new DeviationView(
                          math(formulas.vanishing(d.equations())),
                          Integer.toString(d.dimension()),
                          FormWords.existence(d.nonDegenerate())))
              .toList(),
          FormWords.unsettled(f));
    }
  }
}
