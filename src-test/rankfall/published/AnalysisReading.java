package rankfall.published;

import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Quotient;
import rankfall.Forms.TorusForm;
import rankfall.exact.Polynomial;
import rankfall.published.PublishedEntry.Cell;
import rankfall.published.PublishedEntry.Condition;
import rankfall.published.PublishedEntry.Stratum;

/** Reads off an analysis what the published tables speak of. */
final class AnalysisReading {
  private AnalysisReading() {}

  /**
   * The strata of a family, and its formulas at the general point of its first component.
   *
   * @param analysis of a family
   * @return its formulas as text
   * @throws IllegalStateException if the family failed or something was left undecided
   */
  static ObservedFamily of(Analysis analysis) {
    if (analysis.status() != Analysis.Status.COMPLETE) {
      throw new IllegalStateException(analysis.message());
    }
    Analysis.Findings findings = analysis.findings().orElseThrow();
    Component component = findings.components().get(0);
    List<Integer> torus = analysis.spec().torus().stream().map(component.basis()::indexOf).toList();
    return withTorus(of(component, torus), component)
        .with(
            findings.strata().stream().map(AnalysisReading::stratum).toList(),
            findings.components().stream().map(c -> equations(c.equations())).toList());
  }

  /** Form and dual form as the analysis states them for the real span of the torus. */
  private static ObservedFamily withTorus(ObservedFamily plain, Component component) {
    Optional<TorusForm> torus = component.torus().filter(t -> !t.imaginary());
    if (torus.isEmpty()) {
      return plain;
    }
    List<Integer> all = IntStream.range(0, torus.get().elements().size()).boxed().toList();
    return new ObservedFamily(
        plain.killing(),
        plain.determinant(),
        plain.conditions(),
        cells(torus.get().form(), all),
        torus.get().dual().map(d -> cells(d, all)));
  }

  /**
   * A component with a torus.
   *
   * @param component whose general point is asked
   * @param torus positions of the torus in the basis, from 0; its dual form is read off the inverse
   *     of the whole form, so the torus must be orthogonal to the other generators, as a Cartan
   *     subalgebra is to the root spaces
   * @return its formulas as text
   */
  static ObservedFamily of(Component component, List<Integer> torus) {
    List<MatrixEntry> killing = component.killing().entries();
    boolean orthogonal =
        killing.stream().allMatch(e -> torus.contains(e.row()) == torus.contains(e.column()));
    if (!orthogonal) {
      throw new IllegalStateException("the torus is not orthogonal to the other generators");
    }
    List<Integer> all = component.basis().stream().map(component.basis()::indexOf).toList();
    return new ObservedFamily(
        cells(killing, all),
        component.killing().determinant().map(AnalysisReading::text).orElse("0"),
        component.conditions().stream().map(AnalysisReading::condition).toList(),
        cells(killing, torus),
        component.dual().map(d -> cells(d, torus)));
  }

  private static SortedMap<Cell, String> cells(List<MatrixEntry> entries, List<Integer> positions) {
    SortedMap<Cell, String> cells = new TreeMap<>();
    for (MatrixEntry e : entries) {
      int row = positions.indexOf(e.row());
      int column = positions.indexOf(e.column());
      if (row >= 0 && column >= 0) {
        Cell cell = new Cell(Math.min(row, column) + 1, Math.max(row, column) + 1);
        cells.put(cell, e.value().toString());
      }
    }
    return cells;
  }

  private static String text(Quotient quotient) {
    return "(" + quotient.numerator() + ")/(" + quotient.denominator() + ")";
  }

  private static Condition condition(Analysis.Condition condition) {
    return new Condition(equations(condition.equations()), condition.multiplicity().orElse(0));
  }

  private static Stratum stratum(Analysis.Stratum s) {
    return new Stratum(
        equations(s.equations()), List.of(s.dimension(), s.rank(), s.derived(), s.centre()));
  }

  private static String equations(List<Polynomial> equations) {
    return equations.isEmpty()
        ? "0"
        : equations.stream().map(Polynomial::toString).collect(Collectors.joining("; "));
  }
}
