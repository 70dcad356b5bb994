package rankfall.lie;

import java.util.List;
import java.util.Optional;
import rankfall.exact.Domain;

/**
 * The Killing form of an algebra whose structure constants are exact numbers, and nothing else of
 * it: for many points.
 *
 * @param dimension of the algebra
 * @param rank of the form
 * @param signature of the form; empty where the numbers are not real
 */
public record PointForm(int dimension, int rank, Optional<Signature> signature) {
  /**
   * The form of a real algebra.
   *
   * @param constants real numbers
   * @param signs their order
   */
  public static <E> PointForm real(StructureConstants<E> constants, SignRule<E> signs) {
    Domain<E> domain = constants.domain();
    List<List<E>> killing = PlainKilling.of(constants);
    Signature s = Signature.of(CharacteristicPolynomial.byBlocks(domain, killing), signs);
    return new PointForm(constants.dimension(), s.rank(), Optional.of(s));
  }

  /**
   * The form of a complex algebra.
   *
   * @param constants complex numbers
   */
  public static <E> PointForm complex(StructureConstants<E> constants) {
    Domain<E> domain = constants.domain();
    int n = constants.dimension();
    List<List<E>> killing = PlainKilling.of(constants);
    int kernel = Subspace.kernel(domain, n, new Vectors<>(domain).rows(killing)).dimension();
    return new PointForm(n, n - kernel, Optional.empty());
  }
}
