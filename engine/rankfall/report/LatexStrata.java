package rankfall.report;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.regex.Matcher;
import java.util.stream.Collectors;
import rankfall.Analysis.Combination;
import rankfall.Analysis.Contracted;
import rankfall.Analysis.Contraction;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Stratum;

/** The tables of the appendix about strata: numbers in one, points in another. */
record LatexStrata(Formulas formulas) {
  /** Widest kernel that is set on one line, in letters. */
  private static final int WIDEST_LINE = 60;

  /** The numbers of each stratum. */
  String profiles(List<Stratum> strata) {
    List<Double> widths = new ArrayList<>(List.of(0.09));
    widths.addAll(Collections.nCopies(7, 0.068));
    widths.addAll(List.of(0.264, 0.17));
    LatexTable table = new LatexTable("Strata of the parameter variety", widths);
    table.head("", "$c$", "$n$", "$r$", "$d$", "$z$", "$s$", "$u$", "Type", "Real points");
    for (Stratum s : strata) {
      table.row(
          subscripted(s.name()),
          Integer.toString(s.codimension()),
          Integer.toString(s.dimension()),
          Integer.toString(s.rank()),
          Integer.toString(s.derived()),
          Integer.toString(s.centre()),
          Integer.toString(s.radical()),
          Integer.toString(s.nilradical()),
          s.type().map(t -> TypeText.latex(t) + ", ").orElse("") + LatexText.escape(s.kind()),
          Words.realPoints(s.realPoints()));
    }
    return "\\n"
        + "oindent Columns: codimension $c$ of the closure; dimensions $n$ of the algebra,"
        + " $d$ of the derived algebra, $z$ of the centre, $s$ of the radical, $u$ of the"
        + " nilradical; rank $r$ of the Killing form.\n\n"
        + table.text();
  }

  /** Which points each stratum holds, one of them, and the kernel of the form there. */
  String points(List<Stratum> strata) {
    LatexTable table = new LatexTable("Points of the strata", List.of(0.1, 0.9));
    table.head("", "Points, a sample point, the kernel of the form");
    boolean first = true;
    for (Stratum s : strata) {
      if (!first) {
        table.space();
      }
      first = false;
      List<String> lines = new ArrayList<>();
      lines.add(
          s.equations().isEmpty() ? "everywhere" : Latex.inline(formulas.vanishing(s.equations())));
      s.exclusions()
          .forEach(
              e ->
                  lines.add(
                      (lines.size() == 1 ? "except where " : "or where ")
                          + Latex.inline(formulas.vanishing(e))));
      if (!s.witness().isEmpty()) {
        lines.add("Point: " + witness(s.witness()));
      }
      if (!s.kernel().isEmpty()) {
        List<String> vectors = vectors(s.kernel(), s.basis(), formulas);
        lines.add("Kernel: " + vectors.get(0));
        lines.addAll(vectors.subList(1, vectors.size()));
      }
      s.remarks().forEach(r -> lines.add(LatexText.escape(r)));
      rows(table, subscripted(s.name()), lines);
    }
    return table.text();
  }

  /** A row a line, so that a long entry can go on over the page. */
  private static void rows(LatexTable table, String name, List<String> lines) {
    for (int k = 0; k < lines.size(); k++) {
      table.row(k == 0 ? name : "", lines.get(k));
    }
  }

  /** A kernel on one line, or a vector a line where it is long. */
  static List<String> vectors(List<Combination> kernel, List<String> basis, Formulas formulas) {
    Formula whole = formulas.span(kernel, basis);
    return whole.width() <= WIDEST_LINE
        ? List.of(Latex.inline(whole))
        : kernel.stream().map(v -> Latex.inline(formulas.of(v, basis))).toList();
  }

  private String witness(List<Coordinate> point) {
    return point.stream().map(this::coordinate).collect(Collectors.joining(", "));
  }

  private String coordinate(Coordinate c) {
    Matcher root = PageParts.ROOT.matcher(c.value());
    return root.matches()
        ? Latex.inline(formulas.text(c.variable()))
            + " the root near "
            + LatexText.escape(root.group(2))
            + " of "
            + Latex.inline(formulas.text(root.group(1)))
        : Latex.inline(Formulas.equal(formulas.text(c.variable()), formulas.text(c.value())));
  }

  /** What the brackets of a general point become. */
  String contractions(List<Contraction> contractions, boolean severalComponents) {
    LatexTable table =
        new LatexTable("Contracted algebras", List.of(0.15, 0.065, 0.065, 0.065, 0.065, 0.59));
    table.head("Stratum", "$n$", "$r$", "$d$", "$z$", "Non-zero brackets");
    for (Contraction c : contractions) {
      boolean limit = c.outcome() instanceof Contracted;
      List<String> lines = lines(c);
      table.row(
          subscripted(c.stratum()) + (severalComponents ? " from component " + c.component() : ""),
          limit ? Integer.toString(c.basis().size()) : "--",
          c.outcome() instanceof Contracted x ? Integer.toString(x.rank()) : "--",
          c.outcome() instanceof Contracted x ? Integer.toString(x.derived()) : "--",
          c.outcome() instanceof Contracted x ? Integer.toString(x.centre()) : "--",
          lines.get(0));
      lines.stream().skip(1).forEach(l -> table.row("", "", "", "", "", l));
      table.space();
    }
    return table.text();
  }

  /** At least one. */
  private List<String> lines(Contraction c) {
    List<String> out = new ArrayList<>();
    if (c.outcome() instanceof Contracted x && x.type().isPresent()) {
      out.add(TypeText.latex(x.type().get().text()));
    }
    String lead = Words.outcomeLead(c.outcome());
    if (!lead.isEmpty()) {
      out.add(LatexText.escape(lead));
    }
    FamilyNames.followed(c, formulas).forEach(b -> out.add(Latex.inline(b)));
    return out;
  }

  /** {@code S12} with its number as an index. */
  static String subscripted(String name) {
    return "$" + name.substring(0, 1) + "_{" + name.substring(1) + "}$";
  }
}
