package rankfall.scan;

import java.util.OptionalDouble;
import rankfall.exact.Polynomial;

/** The numbers of a family: what its algebraic numbers and the polynomials in them are. */
public interface NumberSigns {
  /**
   * The sign of a number.
   *
   * @param number a polynomial in the ring of the family in which only algebraic numbers occur
   * @return -1, 0 or 1; of numbers that are not real, 0 or 1
   */
  int sign(Polynomial number);

  /**
   * A number as a double.
   *
   * @param number as for {@link #sign}; its sign is not 0
   * @return with a relative error of at most 2^-52; empty where the number is not real, or not
   *     between 2^-500 and 2^500 in size
   */
  OptionalDouble near(Polynomial number);
}
