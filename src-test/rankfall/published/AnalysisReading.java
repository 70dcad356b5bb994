package rankfall.published;

import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Quotient;
import rankfall.exact.Polynomial;
import rankfall.published.PublishedEntry.Cell;
import rankfall.published.PublishedEntry.Condition;

/** Reads off an analysis what the published tables speak of. */
final class AnalysisReading {
  private AnalysisReading() {}

  /**
   * The family at the general point of its only component.
   *
   * @param analysis of a family with one component
   * @return its formulas as text
   * @throws IllegalStateException if the family failed or has another number of components
   */
  static ObservedFamily of(Analysis analysis) {
    List<Component> components =
        analysis
            .findings()
            .map(Analysis.Findings::components)
            .orElseThrow(() -> new IllegalStateException(analysis.message()));
    if (components.size() != 1) {
      throw new IllegalStateException(components.size() + " components");
    }
    Component component = components.get(0);
    List<Integer> torus = analysis.spec().torus().stream().map(component.basis()::indexOf).toList();
    return of(component, torus);
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
    List<String> equations = condition.equations().stream().map(Polynomial::toString).toList();
    return new Condition(String.join("; ", equations), condition.multiplicity().orElse(0));
  }
}
