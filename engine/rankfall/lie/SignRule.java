package rankfall.lie;

/**
 * The order of a ring of real numbers.
 *
 * @param <E> the elements
 */
@FunctionalInterface
public interface SignRule<E> {
  /**
   * The exact sign.
   *
   * @param value in normal form or not
   * @return -1, 0 or 1
   */
  int signum(E value);
}
