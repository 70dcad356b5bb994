package rankfall.exact;

import java.util.List;
import java.util.stream.Collectors;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * {@code unit * product of base^multiplicity}.
 *
 * @param unit a rational number, not 0
 * @param factors primitive irreducible bases, pairwise different, in the order of their text
 */
public record Factorization(BigFraction unit, List<Factor> factors) {
  /** Copies the factors. */
  public Factorization {
    factors = List.copyOf(factors);
  }

  /**
   * An irreducible factor.
   *
   * @param base primitive, leading coefficient positive, not constant
   * @param multiplicity 1 or more
   */
  public record Factor(Polynomial base, int multiplicity) {}

  /** The text, for example {@code -8*a^2*(b - c)}. */
  @Override
  public String toString() {
    if (factors.isEmpty()) {
      return number(unit);
    }
    String product =
        factors.stream()
            .map(
                f ->
                    (f.base().termCount() > 1 ? "(" + f.base() + ")" : f.base().toString())
                        + (f.multiplicity() > 1 ? "^" + f.multiplicity() : ""))
            .collect(Collectors.joining("*"));
    String u = number(unit);
    return u.equals("1") ? product : u.equals("-1") ? "-" + product : u + "*" + product;
  }

  private static String number(BigFraction q) {
    return q.getDenominator().equals(java.math.BigInteger.ONE)
        ? q.getNumerator().toString()
        : q.getNumerator() + "/" + q.getDenominator();
  }
}
