package rankfall.scan;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Rationals;

/**
 * A fraction as a decimal of 15 significant digits, the last one rounded half to even, without
 * needless zeros; very large and very small ones with a power of ten.
 */
public final class DecimalText {
  private static final MathContext DIGITS = new MathContext(15, RoundingMode.HALF_EVEN);
  private static final int LONGEST_PLAIN = 15;

  private DecimalText() {}

  /** The text of a value. */
  public static String of(BigFraction value) {
    return of(Rationals.numerator(value), Rationals.denominator(value));
  }

  static String of(BigInteger numerator, BigInteger denominator) {
    if (numerator.signum() == 0) {
      return "0";
    }
    BigDecimal d =
        new BigDecimal(numerator).divide(new BigDecimal(denominator), DIGITS).stripTrailingZeros();
    boolean plain = d.precision() - d.scale() <= LONGEST_PLAIN && d.scale() <= 2 * LONGEST_PLAIN;
    return plain ? d.toPlainString() : d.toString();
  }
}
