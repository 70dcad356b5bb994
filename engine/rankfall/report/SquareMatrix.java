package rankfall.report;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.IntStream;
import rankfall.Analysis.MatrixEntry;

/**
 * A symmetric matrix as it is set.
 *
 * @param rows all entries by rows
 */
record SquareMatrix(List<List<Formula>> rows) {

  /** The matrix of order {@code n} with these entries in its upper triangle. */
  static SquareMatrix of(int n, List<MatrixEntry> entries, Formulas formulas) {
    Formula zero = new Formula.Number("0");
    List<List<Formula>> rows = new ArrayList<>();
    for (int k = 0; k < n; k++) {
      rows.add(new ArrayList<>(Collections.nCopies(n, zero)));
    }
    for (MatrixEntry e : entries) {
      Formula value = formulas.of(e.value());
      rows.get(e.row()).set(e.column(), value);
      rows.get(e.column()).set(e.row(), value);
    }
    return new SquareMatrix(rows.stream().map(List::copyOf).toList());
  }

  /** The number of rows. */
  int order() {
    return rows.size();
  }

  /** The sum over the columns of the widest entry, in letters. */
  int width() {
    return IntStream.range(0, order())
        .map(c -> rows.stream().mapToInt(r -> r.get(c).width()).max().orElse(0))
        .sum();
  }
}
