package rankfall.lie;

import java.util.List;

/**
 * The numbers of positive, negative and zero eigenvalues of a real symmetric matrix.
 *
 * @param plus 0 or more
 * @param minus 0 or more
 * @param zero 0 or more
 */
public record Signature(int plus, int minus, int zero) {
  /**
   * The signature by Descartes' rule: all eigenvalues are real, so the sign changes of the
   * characteristic polynomial count the positive ones exactly.
   *
   * @param blocks coefficients of characteristic polynomials, leading one first, one list a block
   * @param signs the order of the coefficients' ring
   */
  public static <E> Signature of(List<List<E>> blocks, SignRule<E> signs) {
    Signature sum = new Signature(0, 0, 0);
    for (List<E> p : blocks) {
      sum = sum.plus(ofOne(p.stream().map(signs::signum).toList()));
    }
    return sum;
  }

  private static Signature ofOne(List<Integer> signs) {
    int changes = 0;
    int lastNonZero = 0;
    for (int k = 1; k < signs.size(); k++) {
      if (signs.get(k) != 0) {
        if (!signs.get(k).equals(signs.get(lastNonZero))) {
          changes++;
        }
        lastNonZero = k;
      }
    }
    int n = signs.size() - 1;
    return new Signature(changes, lastNonZero - changes, n - lastNonZero);
  }

  private Signature plus(Signature s) {
    return new Signature(plus + s.plus, minus + s.minus, zero + s.zero);
  }

  /** The number of eigenvalues that are not 0. */
  public int rank() {
    return plus + minus;
  }
}
