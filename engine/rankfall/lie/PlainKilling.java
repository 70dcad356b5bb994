package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import rankfall.exact.Domain;

/**
 * The Killing matrix of the constants C: entry (i, j) is the trace of ad e_i ad e_j, the sum of
 * {@code C_ik^l C_jl^k} over k and l (Humphreys, Introduction to Lie Algebras, section 5.1).
 *
 * <p>Plain: only non-zero products are formed, nothing is simplified.
 */
public final class PlainKilling {
  private PlainKilling() {}

  /**
   * The Killing matrix.
   *
   * @return n rows of n exact values, not in normal form; symmetric
   */
  public static <E> List<List<E>> of(StructureConstants<E> constants) {
    return of(LieBracket.of(constants));
  }

  /**
   * The Killing matrix.
   *
   * @return n rows of n exact values, not in normal form; symmetric
   */
  public static <E> List<List<E>> of(LieBracket<E> bracket) {
    int n = bracket.dimension();
    List<List<E>> kappa = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      List<E> row = new ArrayList<>();
      for (int j = 0; j < n; j++) {
        row.add(j < i ? kappa.get(j).get(i) : trace(bracket, i, j));
      }
      kappa.add(row);
    }
    return kappa.stream().map(List::copyOf).toList();
  }

  private static <E> E trace(LieBracket<E> bracket, int i, int j) {
    Domain<E> domain = bracket.domain();
    E sum = domain.zero();
    for (int k = 0; k < bracket.dimension(); k++) {
      for (var e : bracket.of(i, k).entrySet()) {
        E back = bracket.of(j, e.getKey()).get(k);
        if (back != null) {
          sum = domain.plus(sum, domain.times(e.getValue(), back));
        }
      }
    }
    return sum;
  }
}
