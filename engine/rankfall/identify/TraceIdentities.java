package rankfall.identify;

import java.util.List;
import rankfall.identify.SimpleType.Series;

/**
 * Tells simple types apart by identities between the traces of even powers of ad x, which hold for
 * all x of an algebra of the type.
 *
 * <p>Over the algebraic closure the eigenvalues of ad x are the roots at the semisimple part of x.
 * With a_1 .. a_n the coordinates, they are (Humphreys, Introduction to Lie Algebras, section 12.1)
 * all {@code +-a_i +-a_j} (i less than j), for B_n also {@code +-a_i}, for C_n also {@code +-2
 * a_i}. So the traces P_k of (ad x)^2k are polynomials in the power sums I_k of the squares:
 *
 * <pre>P_k / 2 = sum over m from 0 to k of binomial(2k, 2m) (I_m I_(k-m) - I_k)  + s_k I_k,</pre>
 *
 * where I_0 = n and s_k is 0 for D_n, 1 for B_n, 4^k for C_n. The relation is solved for I_k, and
 * Newton's identities give the elementary symmetric function of degree n + 1 of the n squares,
 * which is 0. Exceptional algebras have no invariant of degree 4 but the square of the Killing
 * form, so {@code 2 (2 + dim) P_2 = 5 P_1^2} (Okubo, J. Math. Phys. 20, 1979, 586). An identity
 * that fails, be it modulo a prime, refutes the type; one that holds proves nothing.
 */
final class TraceIdentities {
  private TraceIdentities() {}

  /** How many traces are asked to refute a type. */
  static int traces(SimpleType type) {
    return Math.max(2, type.rank() + 1);
  }

  /**
   * Whether an identity of the type fails.
   *
   * @param p P_1, P_2, ..., at least as many as asked for
   * @return false also where nothing is known
   */
  static boolean refute(SimpleType type, long[] p, PrimeField field) {
    if (type.exceptional()) {
      long left = field.times(2L * (2 + type.dimension()), p[1]);
      return left != field.times(5, field.times(p[0], p[0]));
    }
    if (type.series() == Series.A) {
      return false;
    }
    int n = type.rank();
    long half = field.inverse(2);
    long[] sums = new long[n + 2];
    sums[0] = n;
    for (int k = 1; k <= n + 1; k++) {
      long known = 0;
      long coefficient = field.of(2L * n + own(type, k, field) - field.power(2, 2 * k - 1));
      List<Long> row = binomials(2 * k, field);
      for (int m = 1; m < k; m++) {
        long product = field.times(sums[m], sums[k - m]);
        known = field.plus(known, field.times(row.get(2 * m), product));
      }
      if (coefficient == 0) {
        return false;
      }
      long rest = field.minus(field.times(half, p[k - 1]), known);
      sums[k] = field.times(rest, field.inverse(coefficient));
    }
    return elementary(sums, n + 1, field) != 0;
  }

  /** The s_k of the class comment. */
  private static long own(SimpleType type, int k, PrimeField field) {
    return switch (type.series()) {
      case B -> 1;
      case C -> field.power(4, k);
      default -> 0;
    };
  }

  private static List<Long> binomials(int n, PrimeField field) {
    List<Long> row = List.of(1L);
    for (int i = 0; i < n; i++) {
      List<Long> last = row;
      row =
          java.util.stream.IntStream.rangeClosed(0, i + 1)
              .mapToObj(
                  j -> field.plus(j > 0 ? last.get(j - 1) : 0, j < last.size() ? last.get(j) : 0))
              .toList();
    }
    return row;
  }

  /** Newton: {@code k e_k = sum of (-1)^(i-1) e_(k-i) I_i}. */
  private static long elementary(long[] sums, int degree, PrimeField field) {
    long[] e = new long[degree + 1];
    e[0] = 1;
    for (int k = 1; k <= degree; k++) {
      long sum = 0;
      for (int i = 1; i <= k; i++) {
        long term = field.times(e[k - i], sums[i]);
        sum = i % 2 == 1 ? field.plus(sum, term) : field.minus(sum, term);
      }
      e[k] = field.times(sum, field.inverse(k));
    }
    return e[degree];
  }
}
