package rankfall.exact;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Determinants of polynomial matrices. */
public final class Determinant {
  /** Largest matrix that is expanded by minors: these are at most 2^7. */
  private static final int FEW_ROWS = 7;

  private Determinant() {}

  /**
   * The determinant: of a small matrix by minors, else by fraction-free elimination, in which every
   * division is exact. Minors of polynomials in many variables stay short, whereas the elimination
   * multiplies minors by minors (Gentleman and Johnson 1976, Analysis of algorithms, a case study:
   * determinants of matrices with polynomial entries, ACM Trans. Math. Software 2).
   *
   * @param variables the ring of the entries
   * @param matrix n x n, rows first, n may be 0; not modified
   * @return the determinant, in the ring of the entries (no equations are used)
   * @see <a href="https://doi.org/10.1090/S0025-5718-1968-0226829-0">Bareiss 1968</a>; departs: the
   *     shortest entry of the remaining matrix is the pivot
   */
  public static Polynomial of(Variables variables, List<List<Polynomial>> matrix) {
    return matrix.size() > FEW_ROWS
        ? byElimination(variables, matrix)
        : byMinors(variables, matrix);
  }

  /** Row by row the minors of the rows so far, by the set of their columns. */
  static Polynomial byMinors(Variables variables, List<List<Polynomial>> matrix) {
    int n = matrix.size();
    Map<Integer, Polynomial> minors = new TreeMap<>(Map.of(0, Polynomial.one(variables)));
    for (List<Polynomial> row : matrix) {
      Map<Integer, Polynomial> next = new TreeMap<>();
      minors.forEach(
          (columns, minor) -> {
            for (int c = 0; c < n; c++) {
              if ((columns >> c & 1) == 0 && !row.get(c).isZero()) {
                Polynomial p = row.get(c).times(minor);
                boolean odd = Integer.bitCount(columns >> c) % 2 == 1;
                next.merge(columns | 1 << c, odd ? p.negate() : p, Polynomial::plus);
              }
            }
          });
      next.values().removeIf(Polynomial::isZero);
      minors = next;
    }
    return minors.getOrDefault((1 << n) - 1, Polynomial.zero(variables));
  }

  static Polynomial byElimination(Variables variables, List<List<Polynomial>> matrix) {
    List<List<Polynomial>> m = new ArrayList<>();
    matrix.forEach(row -> m.add(new ArrayList<>(row)));
    Polynomial previous = Polynomial.one(variables);
    boolean negative = false;
    while (!m.isEmpty()) {
      int[] at = shortest(m);
      if (at[0] < 0) {
        return Polynomial.zero(variables);
      }
      negative ^= (at[0] + at[1]) % 2 == 1;
      List<Polynomial> pivotRow = m.remove(at[0]);
      Polynomial pivot = pivotRow.remove(at[1]);
      for (List<Polynomial> row : m) {
        Polynomial q = row.remove(at[1]);
        for (int c = 0; c < row.size(); c++) {
          row.set(c, pivot.times(row.get(c)).minus(q.times(pivotRow.get(c))).over(previous));
        }
      }
      previous = pivot;
    }
    return negative ? previous.negate() : previous;
  }

  private static int[] shortest(List<List<Polynomial>> m) {
    int[] at = {-1, -1};
    int best = Integer.MAX_VALUE;
    for (int r = 0; r < m.size(); r++) {
      for (int c = 0; c < m.size(); c++) {
        Polynomial p = m.get(r).get(c);
        int cost = p.termCount() * 64 + p.totalDegree();
        if (!p.isZero() && cost < best) {
          best = cost;
          at[0] = r;
          at[1] = c;
        }
      }
    }
    return at;
  }
}
