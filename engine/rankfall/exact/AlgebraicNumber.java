package rankfall.exact;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A real algebraic number: a root of an irreducible polynomial with integer coefficients, held
 * apart from the other real roots by an isolating interval. Immutable; equality is equality of
 * numbers.
 */
public final class AlgebraicNumber implements Comparable<AlgebraicNumber> {
  private static final int DECIMALS = 8;
  private final Univariate minimal;
  private final int index;
  private final Interval isolating;

  private AlgebraicNumber(Univariate minimal, int index, Interval isolating) {
    this.minimal = minimal;
    this.index = index;
    this.isolating = isolating;
  }

  /**
   * {@return a rational number}
   *
   * @param value any
   */
  public static AlgebraicNumber of(BigFraction value) {
    return new AlgebraicNumber(
        Univariate.of(List.of(Rationals.numerator(value).negate(), Rationals.denominator(value))),
        0,
        Interval.of(value));
  }

  /**
   * {@return the real roots of a polynomial, each once, ascending}
   *
   * @param p not 0; at most one variable occurs in it
   */
  public static List<AlgebraicNumber> rootsOf(Polynomial p) {
    List<AlgebraicNumber> out = new ArrayList<>();
    if (p.isConstant()) {
      Univariate.of(p);
      return out;
    }
    for (Polynomial factor : Factoring.irreducible(p)) {
      Univariate f = Univariate.of(factor);
      if (f.degree() == 1) {
        out.add(of(BigFraction.of(f.coefficient(0).negate(), f.coefficient(1))));
      } else {
        RealRoots r = RealRoots.of(f);
        for (int k = 0; k < r.count(); k++) {
          out.add(new AlgebraicNumber(f, k, r.intervals().get(k)));
        }
      }
    }
    out.sort(null);
    return List.copyOf(out);
  }

  /**
   * The real root of a polynomial nearest to a rational number.
   *
   * @param p not 0; at most one variable occurs in it
   * @param value any
   * @return empty if there is no real root or two are equally near
   */
  public static Optional<AlgebraicNumber> nearest(Polynomial p, BigFraction value) {
    List<AlgebraicNumber> roots = rootsOf(p);
    OptionalInt k = RealRoots.of(p).nearest(value);
    return k.isPresent() ? Optional.of(roots.get(k.getAsInt())) : Optional.empty();
  }

  /** {@return the minimal polynomial in a variable x: primitive, leading coefficient positive} */
  public Polynomial minimalPolynomial() {
    return minimal.polynomial();
  }

  /** {@return the degree over the rational numbers; 1 for a rational number} */
  public int degree() {
    return minimal.degree();
  }

  /** {@return whether the degree is 1} */
  public boolean isRational() {
    return degree() == 1;
  }

  /** {@return the value of a rational number; empty for an irrational one} */
  public Optional<BigFraction> rational() {
    return isRational() ? Optional.of(isolating.lower()) : Optional.empty();
  }

  /**
   * {@return an interval that holds the number}
   *
   * @param width at most so wide; positive
   */
  public Interval within(BigFraction width) {
    return RealRoots.refined(minimal, isolating, width);
  }

  /** {@return the sign: -1, 0 or 1} */
  public int sign() {
    return compareTo(BigFraction.ZERO);
  }

  /**
   * {@return the sign of the difference to a rational number}
   *
   * @param value what is taken away
   */
  public int compareTo(BigFraction value) {
    return RealRoots.compare(minimal, isolating, value);
  }

  @Override
  public int compareTo(AlgebraicNumber b) {
    if (equals(b)) {
      return 0;
    }
    BigFraction width = BigFraction.ONE;
    while (true) {
      Interval x = within(width);
      Interval y = b.within(width);
      if (Rationals.compare(x.upper(), y.lower()) < 0) {
        return -1;
      }
      if (Rationals.compare(y.upper(), x.lower()) < 0) {
        return 1;
      }
      if (x.isPoint()) {
        return -b.compareTo(x.lower());
      }
      if (y.isPoint()) {
        return compareTo(y.lower());
      }
      width = width.divide(256);
    }
  }

  /**
   * {@return the exact sign of a polynomial at this number}
   *
   * @param p at most one variable occurs in it
   */
  public int signOf(Polynomial p) {
    if (p.isConstant()) {
      return p.constantValue().signum();
    }
    Univariate q = Univariate.of(p);
    if (isRational()) {
      return q.signAt(isolating.lower());
    }
    if (q.degree() >= degree() && q.gcd(minimal).degree() > 0) {
      return 0;
    }
    BigFraction width = BigFraction.ONE;
    while (true) {
      OptionalInt s = q.on(within(width)).sign();
      if (s.isPresent()) {
        return s.getAsInt();
      }
      width = width.divide(256);
    }
  }

  /** {@return the greatest integer not above the number} */
  public BigInteger floor() {
    return floorOf(BigInteger.ONE, BigFraction.ZERO);
  }

  /** {@return the least integer not below the number} */
  public BigInteger ceil() {
    return isRational() && Rationals.denominator(isolating.lower()).equals(BigInteger.ONE)
        ? floor()
        : floor().add(BigInteger.ONE);
  }

  private BigInteger floorOf(BigInteger scale, BigFraction add) {
    BigFraction width = BigFraction.of(BigInteger.ONE, scale.shiftLeft(2));
    while (true) {
      Interval i = within(width);
      BigInteger low = Rationals.floor(i.lower().multiply(scale).add(add));
      BigInteger high = Rationals.floor(i.upper().multiply(scale).add(add));
      if (low.equals(high)) {
        return low;
      }
      BigFraction border = BigFraction.of(high).subtract(add).divide(scale);
      if (high.subtract(low).equals(BigInteger.ONE)) {
        return compareTo(border) >= 0 ? high : low;
      }
      width = width.divide(16);
    }
  }

  /**
   * {@return the number rounded to a decimal; halves are rounded up}
   *
   * @param digits after the point, 0 or more
   */
  public BigDecimal decimal(int digits) {
    return new BigDecimal(floorOf(BigInteger.TEN.pow(digits), BigFraction.of(1, 2)), digits);
  }

  /**
   * {@return a short rational number strictly between two different numbers}
   *
   * @param a one
   * @param b another
   * @throws IllegalArgumentException if they are equal
   */
  public static BigFraction between(AlgebraicNumber a, AlgebraicNumber b) {
    int c = a.compareTo(b);
    if (c == 0) {
      throw new IllegalArgumentException("nothing lies between equal numbers: " + a);
    }
    AlgebraicNumber low = c < 0 ? a : b;
    AlgebraicNumber high = c < 0 ? b : a;
    BigFraction width = BigFraction.ONE;
    while (true) {
      BigFraction l = low.within(width).upper();
      BigFraction h = high.within(width).lower();
      if (Rationals.compare(l, h) < 0) {
        return new Interval(l, h).simplestInside();
      }
      width = width.divide(4);
    }
  }

  @Override
  public boolean equals(Object o) {
    return o instanceof AlgebraicNumber b && index == b.index && minimal.equals(b.minimal);
  }

  @Override
  public int hashCode() {
    return 31 * minimal.hashCode() + index;
  }

  /**
   * A fraction, or the text of the reports for a root: the one nearest to the decimal, which has
   * eight places, or as many more as it needs to tell the root.
   *
   * @return for example {@code -3/2} or {@code root(x^2 - 2, 1.41421356)}
   */
  @Override
  public String toString() {
    if (isRational()) {
      return Rationals.text(isolating.lower());
    }
    RealRoots all = RealRoots.of(minimal);
    int digits = DECIMALS;
    while (true) {
      BigDecimal d = decimal(digits);
      OptionalInt k = all.nearest(BigFraction.of(d.unscaledValue(), BigInteger.TEN.pow(digits)));
      if (k.isPresent() && k.getAsInt() == index) {
        return "root(" + minimal + ", " + d.toPlainString() + ")";
      }
      digits++;
    }
  }
}
