package rankfall.exact;

import java.math.BigInteger;
import java.util.OptionalInt;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A closed interval with rational ends; arithmetic encloses (Moore 1966) and never rounds.
 *
 * @param lower the lower end
 * @param upper the upper end, at least the lower one
 */
public record Interval(BigFraction lower, BigFraction upper) {
  private static final BigFraction HALF = BigFraction.of(1, 2);

  /**
   * Checks the order of the ends.
   *
   * @param lower the lower end
   * @param upper the upper end
   * @throws IllegalArgumentException if they stand in the wrong order
   */
  public Interval {
    if (Rationals.compare(lower, upper) > 0) {
      throw new IllegalArgumentException("ends in wrong order: " + lower + " > " + upper);
    }
  }

  /**
   * {@return the interval that holds one number only}
   *
   * @param value both ends
   */
  public static Interval of(BigFraction value) {
    return new Interval(value, value);
  }

  /** {@return whether both ends are equal} */
  public boolean isPoint() {
    return lower.equals(upper);
  }

  /** {@return the distance of the ends} */
  public BigFraction width() {
    return upper.subtract(lower);
  }

  /** {@return the number halfway between the ends} */
  public BigFraction middle() {
    return lower.add(upper).multiply(HALF);
  }

  /**
   * {@return whether a number lies in the interval, ends included}
   *
   * @param value any
   */
  public boolean contains(BigFraction value) {
    return Rationals.compare(lower, value) <= 0 && Rationals.compare(value, upper) <= 0;
  }

  /** {@return the sign that all its numbers have; empty if they differ in sign} */
  public OptionalInt sign() {
    int s = lower.signum();
    return s == upper.signum() && (s != 0 || isPoint()) ? OptionalInt.of(s) : OptionalInt.empty();
  }

  /**
   * {@return the sums}
   *
   * @param b the other summand
   */
  public Interval plus(Interval b) {
    return new Interval(lower.add(b.lower), upper.add(b.upper));
  }

  /**
   * {@return the differences}
   *
   * @param b what is taken away
   */
  public Interval minus(Interval b) {
    return new Interval(lower.subtract(b.upper), upper.subtract(b.lower));
  }

  /**
   * {@return the products}
   *
   * @param b the other factor
   */
  public Interval times(Interval b) {
    BigFraction p = lower.multiply(b.lower);
    BigFraction q = lower.multiply(b.upper);
    BigFraction r = upper.multiply(b.lower);
    BigFraction s = upper.multiply(b.upper);
    return new Interval(
        Rationals.min(Rationals.min(p, q), Rationals.min(r, s)),
        Rationals.max(Rationals.max(p, q), Rationals.max(r, s)));
  }

  /**
   * {@return the powers; an even power is never negative}
   *
   * @param exponent 0 or more
   */
  public Interval pow(int exponent) {
    BigFraction p = lower.pow(exponent);
    BigFraction q = upper.pow(exponent);
    if (exponent > 0 && exponent % 2 == 0 && lower.signum() < 0 && upper.signum() > 0) {
      return new Interval(BigFraction.ZERO, Rationals.max(p, q));
    }
    return new Interval(Rationals.min(p, q), Rationals.max(p, q));
  }

  /**
   * {@return the quotients}
   *
   * @param b what is divided by; must not hold 0
   * @throws ArithmeticException if it does
   */
  public Interval over(Interval b) {
    if (b.contains(BigFraction.ZERO)) {
      throw new ArithmeticException("the divisor holds 0: " + b);
    }
    return times(new Interval(b.upper.reciprocal(), b.lower.reciprocal()));
  }

  /**
   * {@return a slightly greater interval with short dyadic ends}
   *
   * @param bits the ends become multiples of {@code 2^-bits}
   */
  public Interval outward(int bits) {
    BigInteger scale = BigInteger.ONE.shiftLeft(bits);
    return new Interval(
        BigFraction.of(Rationals.floor(lower.multiply(scale)), scale),
        BigFraction.of(Rationals.ceil(upper.multiply(scale)), scale));
  }

  /**
   * {@return the rational number of least denominator strictly between the ends, the one nearest to
   * 0 among several integers (walk down the Stern-Brocot tree by continued fractions)}
   *
   * @throws IllegalStateException if the interval is a point
   */
  public BigFraction simplestInside() {
    if (isPoint()) {
      throw new IllegalStateException("nothing strictly inside " + this);
    }
    if (lower.signum() < 0 && upper.signum() > 0) {
      return BigFraction.ZERO;
    }
    return upper.signum() <= 0
        ? simplest(upper.negate(), lower.negate()).negate()
        : simplest(lower, upper);
  }

  private static BigFraction simplest(BigFraction low, BigFraction high) {
    BigInteger whole = Rationals.floor(low);
    BigFraction next = BigFraction.of(whole.add(BigInteger.ONE));
    if (Rationals.compare(next, high) < 0) {
      return next;
    }
    BigFraction l = low.subtract(whole);
    BigFraction h = high.subtract(whole);
    if (l.signum() == 0) {
      BigInteger n = Rationals.floor(h.reciprocal()).add(BigInteger.ONE);
      return BigFraction.of(whole).add(BigFraction.of(n).reciprocal());
    }
    return BigFraction.of(whole).add(simplest(h.reciprocal(), l.reciprocal()).reciprocal());
  }
}
