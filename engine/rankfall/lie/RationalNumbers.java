package rankfall.lie;

import java.math.BigInteger;
import org.apache.commons.numbers.fraction.BigFraction;

/** Sign of integers and text of their quotients. */
public record RationalNumbers() implements SignRule<BigInteger>, NumberText<BigInteger> {
  @Override
  public int signum(BigInteger value) {
    return value.signum();
  }

  @Override
  public String quotient(BigInteger numerator, BigInteger denominator) {
    BigFraction value = BigFraction.of(numerator, denominator);
    BigInteger below = value.getDenominator();
    BigInteger above = value.getNumerator();
    if (below.signum() < 0) {
      below = below.negate();
      above = above.negate();
    }
    return below.equals(BigInteger.ONE) ? above.toString() : above + "/" + below;
  }
}
