package rankfall.scan;

import rankfall.exact.Polynomial;

/** Signs of numbers that hold the algebraic numbers of a family. */
@FunctionalInterface
public interface NumberSigns {
  /**
   * The sign of a number.
   *
   * @param number a polynomial in the ring of the family in which only algebraic numbers occur
   * @return -1, 0 or 1; of numbers that are not real, 0 or 1
   */
  int sign(Polynomial number);
}
