package rankfall.exact;

import java.math.BigInteger;
import java.util.List;

/**
 * A monomial with its coefficient.
 *
 * @param coefficient not 0
 * @param exponents one a variable, in the order of the ring
 */
public record Term(BigInteger coefficient, List<Integer> exponents) {
  /** Copies the exponents. */
  public Term {
    exponents = List.copyOf(exponents);
  }
}
