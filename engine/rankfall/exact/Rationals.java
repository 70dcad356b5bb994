package rankfall.exact;

import java.math.BigInteger;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * Order, rounding and text of rational numbers.
 *
 * <p>The order of the library's own {@code BigFraction.compareTo} is reversed between two negative
 * numbers (version 1.2), and its denominators may be negative; so ask here.
 */
public final class Rationals {
  private Rationals() {}

  /**
   * Compares by value.
   *
   * @param a one number
   * @param b another
   * @return the sign of {@code a - b}
   */
  public static int compare(BigFraction a, BigFraction b) {
    int s = a.signum();
    return s != b.signum() ? Integer.compare(s, b.signum()) : a.subtract(b).signum();
  }

  /**
   * {@return the lesser number}
   *
   * @param a one number
   * @param b another
   */
  public static BigFraction min(BigFraction a, BigFraction b) {
    return compare(a, b) <= 0 ? a : b;
  }

  /**
   * {@return the greater number}
   *
   * @param a one number
   * @param b another
   */
  public static BigFraction max(BigFraction a, BigFraction b) {
    return compare(a, b) >= 0 ? a : b;
  }

  /**
   * {@return the greatest integer not above a number}
   *
   * @param q any
   */
  public static BigInteger floor(BigFraction q) {
    BigInteger[] d = numerator(q).divideAndRemainder(denominator(q));
    return d[1].signum() < 0 ? d[0].subtract(BigInteger.ONE) : d[0];
  }

  /**
   * {@return the least integer not below a number}
   *
   * @param q any
   */
  public static BigInteger ceil(BigFraction q) {
    return floor(q.negate()).negate();
  }

  /**
   * {@return the numerator over a positive denominator}
   *
   * @param q any
   */
  public static BigInteger numerator(BigFraction q) {
    return q.getDenominator().signum() < 0 ? q.getNumerator().negate() : q.getNumerator();
  }

  /**
   * {@return the positive denominator in lowest terms}
   *
   * @param q any
   */
  public static BigInteger denominator(BigFraction q) {
    return q.getDenominator().abs();
  }

  /**
   * The text of the reports.
   *
   * @param q any
   * @return for example {@code -3/2} or {@code 5}
   */
  public static String text(BigFraction q) {
    BigInteger d = denominator(q);
    return numerator(q) + (d.equals(BigInteger.ONE) ? "" : "/" + d);
  }
}
