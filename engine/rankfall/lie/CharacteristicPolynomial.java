package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import rankfall.exact.Domain;

/**
 * The polynomial det(x*1 - A), computed without division.
 *
 * <p>Samuelson's formula in the form of Berkowitz (Inf. Proc. Letters 18, 1984, 147): each leading
 * submatrix gives a triangular Toeplitz matrix that takes the polynomial of the submatrix before to
 * its own. About n^4/4 products.
 */
public final class CharacteristicPolynomial {
  private CharacteristicPolynomial() {}

  /**
   * The coefficients.
   *
   * @param matrix n rows of n exact values
   * @return n + 1 values, not in normal form; the leading one first, which is 1
   */
  public static <E> List<E> of(Domain<E> domain, List<List<E>> matrix) {
    List<E> p = List.of(domain.one());
    for (int r = 0; r < matrix.size(); r++) {
      p = toeplitz(domain, column(domain, matrix, r), p);
    }
    return p;
  }

  /**
   * The polynomials of the diagonal blocks of a symmetric matrix; their product is its own.
   *
   * @return one list of coefficients a block, as {@link #of} gives them
   */
  public static <E> List<List<E>> byBlocks(Domain<E> domain, List<List<E>> matrix) {
    return ZeroPattern.blocks(matrix.size(), (i, j) -> !domain.isZero(matrix.get(i).get(j)))
        .stream()
        .map(block -> of(domain, ZeroPattern.part(matrix, block)))
        .toList();
  }

  /** 1, -a, -r*c, -r*M*c, ... for the leading submatrix M bordered by row r, column c, corner a. */
  private static <E> List<E> column(Domain<E> domain, List<List<E>> a, int size) {
    List<E> out = new ArrayList<>(List.of(domain.one(), domain.negate(a.get(size).get(size))));
    List<E> v = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      v.add(a.get(i).get(size));
    }
    for (int k = 0; k < size; k++) {
      out.add(domain.negate(dot(domain, a.get(size), v)));
      if (k + 1 < size) {
        List<E> next = new ArrayList<>();
        for (int i = 0; i < size; i++) {
          next.add(dot(domain, a.get(i), v));
        }
        v = next;
      }
    }
    return out;
  }

  private static <E> E dot(Domain<E> domain, List<E> row, List<E> v) {
    E sum = domain.zero();
    for (int i = 0; i < v.size(); i++) {
      if (!domain.isZero(row.get(i)) && !domain.isZero(v.get(i))) {
        sum = domain.plus(sum, domain.times(row.get(i), v.get(i)));
      }
    }
    return sum;
  }

  private static <E> List<E> toeplitz(Domain<E> domain, List<E> column, List<E> p) {
    List<E> out = new ArrayList<>();
    for (int i = 0; i < column.size(); i++) {
      E sum = domain.zero();
      for (int j = 0; j < p.size() && j <= i; j++) {
        sum = domain.plus(sum, domain.times(column.get(i - j), p.get(j)));
      }
      out.add(sum);
    }
    return out;
  }

  /**
   * The determinant of a symmetric matrix.
   *
   * @param blocks what {@link #byBlocks} gave
   */
  public static <E> E determinant(Domain<E> domain, List<List<E>> blocks) {
    E product = domain.one();
    for (List<E> p : blocks) {
      int n = p.size() - 1;
      E last = p.get(n);
      product = domain.times(product, n % 2 == 0 ? last : domain.negate(last));
    }
    return product;
  }
}
