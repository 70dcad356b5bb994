package rankfall.identify;

import java.util.List;
import java.util.SortedMap;
import rankfall.exact.Domain;
import rankfall.exact.Polynomial;
import rankfall.lie.CharacteristicPolynomial;
import rankfall.lie.Signature;

/** Values and signatures of symmetric bilinear forms that are given by a matrix. */
final class Forms {
  private Forms() {}

  /** The value on two vectors. */
  static <E> E value(
      Domain<E> domain, List<List<E>> matrix, SortedMap<Integer, E> x, SortedMap<Integer, E> y) {
    E sum = domain.zero();
    for (var a : x.entrySet()) {
      for (var b : y.entrySet()) {
        E entry = matrix.get(a.getKey()).get(b.getKey());
        sum = domain.plus(sum, domain.times(domain.times(a.getValue(), b.getValue()), entry));
      }
    }
    return sum;
  }

  /**
   * The signature.
   *
   * @param matrix over the field of the algebra
   * @param g real
   */
  static Signature signature(List<List<Polynomial>> matrix, ExactAlgebra g) {
    return Signature.of(
        CharacteristicPolynomial.byBlocks(g.chain(), matrix), g.signs().orElseThrow());
  }
}
