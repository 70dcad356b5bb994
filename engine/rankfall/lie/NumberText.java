package rankfall.lie;

/**
 * How exact numbers print.
 *
 * @param <E> the elements of which quotients are taken
 */
@FunctionalInterface
public interface NumberText<E> {
  /**
   * The text of a quotient, in lowest terms.
   *
   * @param numerator any
   * @param denominator not 0
   * @return for example {@code -3/2}, {@code 4} or {@code 0}
   */
  String quotient(E numerator, E denominator);
}
