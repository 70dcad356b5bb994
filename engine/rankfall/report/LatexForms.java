package rankfall.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Stratum;
import rankfall.Forms.Angle;
import rankfall.Forms.Casimir;
import rankfall.Forms.Covector;
import rankfall.Forms.FormDeviation;
import rankfall.Forms.InvariantForms;
import rankfall.Forms.Positivity;
import rankfall.Forms.Roots;
import rankfall.Forms.TorusForm;
import rankfall.Forms.WithoutRoots;

/**
 * Torus, Casimir element and invariant forms in the appendix.
 *
 * @param formulas lays out values
 * @param hermitian whether the listed elements are i times those of the algebra
 */
record LatexForms(FormFormulas formulas, boolean hermitian) {
  /** Widest matrix that is set as one, in letters over all columns. */
  private static final int WIDEST_MATRIX = 44;

  /** Widest line of values, in letters. */
  private static final int WIDEST_LINE = 56;

  /** Most terms of a Casimir element that are set. */
  private static final int MOST_TERMS = 60;

  private static String paragraph(String latex) {
    return "{\\raggedright\\noindent " + latex + "\\par}\n\n";
  }

  private static String text(String plain) {
    return LatexText.escape(plain);
  }

  private static String list(List<Formula> items) {
    return Latex.inline(Formulas.sequence(items));
  }

  /** The form on a torus. */
  String torus(TorusForm t) {
    List<Formula> elements = formulas.elements(t, hermitian);
    List<Formula> dual = new ArrayList<>();
    for (int k = 0; k < elements.size(); k++) {
      dual.add(FormFormulas.dual(k));
    }
    StringBuilder out = new StringBuilder();
    out.append(paragraph(text(FormWords.span(t, hermitian)) + " " + list(elements) + ":"));
    out.append(matrix("K", elements, t.form()));
    t.positive().ifPresent(p -> out.append(paragraph(positive(t, p))));
    if (!t.orthonormal().isEmpty()) {
      out.append(
          paragraph(
              "An orthonormal basis, in these elements: "
                  + list(
                      t.orthonormal().stream()
                          .map(v -> formulas.unit(v, FormFormulas.names(t, hermitian)))
                          .toList())
                  + "."));
    }
    out.append(angles("Angles between the elements", elements, t.angles()));
    if (t.dual().isEmpty()) {
      out.append(
          paragraph(
              "There is no dual form: the form is degenerate on the torus for all parameter"
                  + " values."));
    } else {
      out.append(paragraph("The form on the dual space, in the dual basis " + list(dual) + ":"));
      out.append(matrix("K^{-1}", dual, t.dual().get()));
      out.append(angles("Angles between the elements of the dual basis", dual, t.dualAngles()));
    }
    out.append(covectors(t));
    return out.append(roots(t)).toString();
  }

  private String positive(TorusForm t, Positivity p) {
    String lead = text(FormWords.positive(t));
    return p.conditions().isEmpty()
        ? lead
        : lead
            + " "
            + list(
                p.conditions().stream().map(c -> formulas.formulas().text(c.toString())).toList())
            + ".";
  }

  private String matrix(String name, List<Formula> vectors, List<MatrixEntry> entries) {
    SquareMatrix m = SquareMatrix.of(vectors.size(), entries, formulas.formulas());
    if (m.width() <= WIDEST_MATRIX) {
      return "\\[\n" + name + " = " + Latex.matrix(m.rows()) + "\n\\]\n";
    }
    LatexTable table = new LatexTable("Entries of the form", List.of(0.16, 0.16, 0.68));
    table.head("Row", "Column", "Entry");
    for (MatrixEntry e : entries) {
      table.row(
          Latex.inline(vectors.get(e.row())),
          Latex.inline(vectors.get(e.column())),
          Latex.inline(formulas.formulas().of(e.value())));
    }
    return table.text();
  }

  private String angles(String caption, List<Formula> vectors, List<Angle> angles) {
    if (angles.isEmpty()) {
      return "";
    }
    LatexTable table = new LatexTable(caption, List.of(0.2, 0.2, 0.4, 0.2));
    table.head("Between", "and", "Squared cosine", "Angle");
    for (Angle a : angles) {
      table.row(
          Latex.inline(vectors.get(a.first())),
          Latex.inline(vectors.get(a.second())),
          a.squaredCosine().map(c -> Latex.inline(formulas.formulas().of(c))).orElse("--"),
          a.degrees().map(d -> "$" + d + "^{\\circ}$").orElse(""));
    }
    return table.text();
  }

  private String covectors(TorusForm t) {
    if (t.covectors().isEmpty()) {
      return "";
    }
    LatexTable table = new LatexTable("Covectors", List.of(0.14, 0.28, 0.38, 0.2));
    table.head("Covector", "Values on the elements", "Sharp", "Squared length");
    for (Covector c : t.covectors()) {
      table.row(
          Latex.inline(formulas.formulas().text(c.name())),
          Latex.inline(formulas.values(c.components())),
          Latex.inline(formulas.sharp(c, FormFormulas.names(t, hermitian))),
          Latex.inline(formulas.formulas().of(c.squaredLength())));
    }
    return table.text();
  }

  private String roots(TorusForm t) {
    if (t.roots() instanceof WithoutRoots w) {
      return paragraph(text(w.reason()));
    }
    Roots r = (Roots) t.roots();
    LatexTable table = new LatexTable("Simple roots", List.of(0.2, 0.5, 0.3));
    table.head("Root", "Values on the elements", "Squared length");
    for (int k = 0; k < r.simple().size(); k++) {
      table.row(
          Latex.inline(FormFormulas.root(k)),
          Latex.inline(formulas.values(r.simple().get(k))),
          Latex.inline(formulas.formulas().of(r.squaredLengths().get(k))));
    }
    return paragraph(
            "The torus is a Cartan subalgebra; its roots are those of type "
                + text(r.type())
                + ", with the Cartan matrix")
        + "\\[\n"
        + Latex.matrix(FormFormulas.integers(r.cartan()))
        + "\n\\]\n"
        + table.text()
        + paragraph("Positive roots: " + Latex.inline(FormFormulas.positive(r)) + ".");
  }

  /** A Casimir element. */
  String casimir(Casimir c, List<String> basis) {
    return c.entries().size() > MOST_TERMS
        ? paragraph("Its coefficients are the entries of the inverse of the Killing matrix.")
        : paragraph(Latex.inline(formulas.casimir(c, basis)));
  }

  /** The invariant forms of all strata. */
  String invariants(List<Stratum> strata) {
    LatexTable table =
        new LatexTable("Invariant forms of the strata", List.of(0.08, 0.17, 0.17, 0.58));
    table.head("", "Dimension", "Non-de\\-gen\\-er\\-ate one", "General member");
    for (Stratum s : strata) {
      Optional<InvariantForms> forms = s.invariantForms();
      if (forms.isPresent()) {
        InvariantForms f = forms.get();
        List<String> lines = lines(s, f);
        table.row(
            LatexStrata.subscripted(s.name()),
            text(FormWords.dimension(f)),
            FormWords.existence(f.nonDegenerate()),
            lines.isEmpty() ? "" : lines.get(0));
        lines.stream().skip(1).forEach(l -> table.row("", "", "", l));
        table.space();
      }
    }
    return table.text();
  }

  private List<String> lines(Stratum s, InvariantForms f) {
    List<String> out = new ArrayList<>();
    if (!FormWords.extent(f).isEmpty()) {
      out.add(text(FormWords.extent(f)));
    }
    formulas.member(f.basis(), f.coefficients(), s.basis()).forEach(m -> out.add(Latex.inline(m)));
    f.determinant()
        .map(formulas.formulas()::of)
        .filter(d -> d.width() <= FormsView.WIDEST)
        .ifPresent(d -> out.add("Determinant " + Latex.inline(d)));
    f.inverse()
        .ifPresent(
            m -> {
              out.add(text(FormWords.inverse(m, f)));
              out.addAll(grouped(formulas.inverse(m.entries(), s.basis())));
            });
    for (FormDeviation d : f.deviations()) {
      out.add(
          "Where also "
              + Latex.inline(formulas.vanishing(d.equations()))
              + ": dimension "
              + d.dimension()
              + ", non-degenerate one: "
              + FormWords.existence(d.nonDegenerate())
              + ".");
    }
    if (!FormWords.unsettled(f).isEmpty()) {
      out.add(text(FormWords.unsettled(f)));
    }
    return out;
  }

  /** Some values a line, so that the cell can go on over the page between lines. */
  private static List<String> grouped(List<Formula> values) {
    List<String> out = new ArrayList<>();
    List<Formula> line = new ArrayList<>();
    int width = 0;
    for (Formula f : values) {
      if (!line.isEmpty() && width + f.width() > WIDEST_LINE) {
        out.add(list(line));
        line.clear();
        width = 0;
      }
      line.add(f);
      width += f.width() + 2;
    }
    if (!line.isEmpty()) {
      out.add(list(line));
    }
    return out;
  }
}
