package rankfall.report;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import rankfall.AlgebraType;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Killing;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Region;
import rankfall.Analysis.Relation;
import rankfall.exact.Polynomial;
import rankfall.spec.Spec;

/**
 * A fragment for {@code \input} inside an article with {@code amsmath}, {@code booktabs} and {@code
 * longtable}; ASCII only. Formulas stand in cells and paragraphs in which lines can break.
 */
final class LatexAppendix {
  /** Largest order of a matrix that is set as one. */
  private static final int LARGEST_ORDER = 8;

  /** Widest matrix that is set as one, in letters over all columns, spaces between them apart. */
  private static final int WIDEST_MATRIX = 44;

  /** Widest name of a basis element, in letters, that a narrow column holds. */
  private static final int WIDEST_NAME = 8;

  private final Analysis analysis;
  private final Formulas formulas;
  private final StringBuilder out = new StringBuilder();

  private LatexAppendix(Analysis analysis) {
    this.analysis = analysis;
    this.formulas = new Formulas(FamilyNames.notation(analysis));
  }

  /** {@code appendix.tex}. */
  static String of(Analysis analysis) {
    LatexAppendix a = new LatexAppendix(analysis);
    a.head();
    analysis.findings().ifPresent(a::findings);
    return a.out.toString();
  }

  private void line(String text) {
    out.append(text).append('\n');
  }

  private void section(String title) {
    line("");
    line(Latex.ROOM);
    line("\\subsection*{" + title + "}");
  }

  private void paragraph(String latex) {
    line(latex);
    line("");
  }

  private static String text(String plain) {
    return LatexText.escape(plain);
  }

  private void head() {
    String family = analysis.spec().family();
    line("% Rankfall " + analysis.version() + ", family " + family);
    line("% SHA-256 of the spec: " + analysis.spec().source().sha256());
    line("% For \\input in a document that loads amsmath, booktabs and longtable.");
    line(Latex.DEFINITIONS);
    line(Latex.ROOM);
    line("\\section{" + text(analysis.spec().title().orElse(family)) + "}");
    line("\\label{rankfall:" + family + "}");
    paragraph("\\noindent " + text(Words.status(analysis)));
    if (!analysis.message().isEmpty()) {
      paragraph("\\noindent\\textbf{" + text(analysis.message()) + "}");
    }
    items("Undecided:", analysis.undecided());
    items("Remarks:", analysis.remarks());
  }

  private void items(String lead, List<String> sentences) {
    if (!sentences.isEmpty()) {
      line("\\noindent " + lead);
      line("\\begin{itemize}");
      sentences.forEach(s -> line("\\item " + text(s)));
      line("\\end{itemize}");
    }
  }

  private void findings(Findings f) {
    paragraph("\\noindent " + text(Words.setting(analysis.spec())) + parameters());
    relations(f.relations());
    poles(f.poles());
    if (f.components().isEmpty()) {
      paragraph("\\noindent " + text(Words.NO_GENERAL_POINT));
    }
    for (Component c : f.components()) {
      component(c, f.components().size() > 1);
    }
    Contents contents = Contents.of(analysis);
    if (contents.hasStrata()) {
      LatexStrata strata = new LatexStrata(formulas);
      section("Strata");
      out.append(strata.profiles(f.strata())).append(strata.points(f.strata()));
      if (f.strata().stream().anyMatch(s -> s.invariantForms().isPresent())) {
        section("Invariant forms");
        paragraph("\\noindent " + text(FormWords.INVARIANT));
        out.append(forms().invariants(f.strata()));
      }
      if (!f.contractions().isEmpty()) {
        section("Contracted algebras");
        paragraph("\\noindent " + text(Words.CONTRACTIONS));
        out.append(strata.contractions(f.contractions(), f.components().size() > 1));
      }
    }
    if (contents.hasRegions()) {
      regions(f.regions());
    }
  }

  private String parameters() {
    List<String> names = analysis.spec().parameters();
    List<Formula> where =
        analysis.spec().where().stream().map(c -> formulas.text(c.text())).toList();
    return names.isEmpty()
        ? " There are no parameters."
        : " Parameters: "
            + Latex.inline(Formulas.sequence(names.stream().map(formulas::text).toList()))
            + (where.isEmpty() ? "" : " with " + Latex.inline(Formulas.sequence(where)))
            + ".";
  }

  private void relations(List<Relation> relations) {
    if (relations.isEmpty()) {
      return;
    }
    section("Relations");
    LatexTable table = new LatexTable("Relations between the parameters", List.of(0.66, 0.34));
    table.head("Relation", "Origin");
    for (Relation r : relations) {
      table.row(
          Latex.inline(Formulas.equal(product(r.factors()), new Formula.Number("0"))),
          text(Words.origin(r.origin())));
    }
    out.append(table.text());
  }

  private Formula product(List<Polynomial> factors) {
    return factors.size() == 1
        ? formulas.of(factors.get(0))
        : Formulas.product(factors.stream().map(p -> Formulas.enclosed(formulas.of(p))).toList());
  }

  private void poles(List<Polynomial> poles) {
    if (!poles.isEmpty()) {
      Formula list = Formulas.sequence(poles.stream().map(formulas::of).toList());
      paragraph(
          "{\\raggedright\\noindent An entry is undefined where one of these vanishes: "
              + Latex.inline(list)
              + ".\\par}");
    }
  }

  private void component(Component c, boolean oneOfMany) {
    if (oneOfMany) {
      section("Component " + c.number());
      paragraph(
          "{\\raggedright\\noindent "
              + Latex.inline(formulas.vanishing(c.equations()))
              + ", of dimension "
              + c.parameterDimension()
              + ".\\par}");
    }
    brackets(c);
    killing(c);
    conditions(c);
    LatexForms forms = forms();
    c.torus()
        .ifPresent(
            t -> {
              section("Torus and dual form");
              out.append(forms.torus(t));
            });
    c.casimir()
        .ifPresent(
            x -> {
              section("Casimir element");
              paragraph("\\noindent " + text(FormWords.CASIMIR));
              out.append(forms.casimir(x, c.basis()));
            });
  }

  private LatexForms forms() {
    return new LatexForms(
        new FormFormulas(formulas), analysis.spec().convention() == Spec.Convention.HERMITIAN);
  }

  private void brackets(Component c) {
    section("Brackets");
    List<Formula> brackets = FamilyNames.brackets(c, formulas);
    if (brackets.isEmpty()) {
      paragraph("All brackets vanish.");
      return;
    }
    LatexTable table = new LatexTable("Brackets of the generators", List.of(1.0));
    table.head("Non-zero brackets");
    brackets.forEach(b -> table.row(Latex.inline(b)));
    out.append(table.text());
  }

  private void killing(Component c) {
    Killing k = c.killing();
    section("Killing form");
    paragraph("\\noindent " + text(Words.general(c)));
    matrix("K", c.basis(), k.entries());
    k.determinant()
        .ifPresent(
            d ->
                paragraph(
                    "{\\raggedright\\noindent Its determinant is $\\det K = "
                        + Latex.of(formulas.of(d))
                        + "$.\\par}"));
    if (!k.kernel().isEmpty()) {
      paragraph(
          "{\\raggedright\\noindent Its kernel at a general point is spanned by "
              + Latex.inline(formulas.span(k.kernel(), c.basis()))
              + ".\\par}");
    }
  }

  private void matrix(String name, List<String> basis, List<MatrixEntry> entries) {
    SquareMatrix m = SquareMatrix.of(basis.size(), entries, formulas);
    if (entries.isEmpty()) {
      paragraph("All entries of its matrix vanish.");
    } else if (m.order() <= LARGEST_ORDER && m.width() <= WIDEST_MATRIX) {
      paragraph(
          "{\\raggedright\\noindent In the basis "
              + Latex.inline(Formulas.sequence(basis.stream().map(formulas::text).toList()))
              + " its matrix is\\par}");
      line("\\[\n" + name + " = " + Latex.matrix(m.rows()) + "\n\\]");
    } else {
      boolean wide = basis.stream().anyMatch(b -> formulas.text(b).width() > WIDEST_NAME);
      LatexTable table =
          new LatexTable(
              "Non-zero entries of the Killing matrix, upper triangle",
              wide ? List.of(0.25, 0.25, 0.5) : List.of(0.16, 0.16, 0.68));
      table.head("Row", "Column", "Entry");
      for (MatrixEntry e : entries) {
        table.row(
            Latex.inline(formulas.text(basis.get(e.row()))),
            Latex.inline(formulas.text(basis.get(e.column()))),
            Latex.inline(formulas.of(e.value())));
      }
      out.append(table.text());
    }
  }

  private void conditions(Component c) {
    section("Degeneration");
    paragraph("\\noindent " + text(Words.conditions(c, analysis.status())));
    if (c.conditions().isEmpty()) {
      return;
    }
    LatexTable table =
        new LatexTable("Where the Killing form degenerates", List.of(0.31, 0.12, 0.11, 0.33, 0.13));
    table.head("Condition", "Power", "Rank", "Kernel", "Real points");
    for (Condition d : c.conditions()) {
      List<String> kernel =
          d.kernel().isEmpty() ? List.of("") : LatexStrata.vectors(d.kernel(), d.basis(), formulas);
      table.row(
          Latex.inline(formulas.vanishing(d.equations())),
          d.multiplicity().map(m -> Integer.toString(m)).orElse(""),
          d.rank().map(r -> Integer.toString(r)).orElse(Words.NO_ALGEBRA),
          kernel.get(0),
          Words.realPoints(d.realPoints()));
      kernel.stream().skip(1).forEach(v -> table.row("", "", "", v, ""));
    }
    out.append(table.text());
  }

  private static String type(AlgebraType t) {
    return TypeText.latex(t.text())
        + (t.otherNames().isEmpty()
            ? ""
            : " (" + TypeText.latex(String.join(", ", t.otherNames())) + ")");
  }

  private void regions(List<Region> regions) {
    section("Real regions");
    LatexTable table =
        new LatexTable("Real regions of the strata", List.of(0.13, 0.37, 0.14, 0.24, 0.12));
    table.head("Region", "Conditions", "$(+,-,0)$", "Type", "Proof");
    for (Region r : regions) {
      table.row(
          LatexStrata.subscripted(r.stratum()) + ", " + LatexStrata.subscripted(r.name()),
          r.conditions().isEmpty()
              ? "all points"
              : Latex.inline(
                  Formulas.sequence(
                      r.conditions().stream().map(c -> formulas.text(c.toString())).toList())),
          "$("
              + Stream.of(r.signature().plus(), r.signature().minus(), r.signature().zero())
                  .map(n -> Integer.toString(n))
                  .collect(Collectors.joining(","))
              + ")$",
          r.type().map(LatexAppendix::type).orElse(""),
          CsvFiles.proof(r.exact()));
    }
    out.append(table.text());
  }
}
