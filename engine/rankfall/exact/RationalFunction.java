package rankfall.exact;

import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A quotient of polynomials in lowest terms, the denominator's leading coefficient positive; so
 * equality is mathematical equality in the field of fractions of the polynomial ring.
 *
 * @param numerator above
 * @param denominator below, not 0
 */
public record RationalFunction(Polynomial numerator, Polynomial denominator) {
  /** Brings the quotient to lowest terms. */
  public RationalFunction {
    if (denominator.isZero()) {
      throw new ArithmeticException("denominator is 0");
    }
    if (!denominator.isOne()) {
      Polynomial g = numerator.gcd(denominator);
      if (denominator.leadingCoefficient().signum() < 0) {
        g = g.negate();
      }
      if (!g.isOne()) {
        numerator = numerator.over(g);
        denominator = denominator.over(g);
      }
    }
  }

  /** The quotient of two polynomials. */
  public static RationalFunction of(Polynomial numerator, Polynomial denominator) {
    return new RationalFunction(numerator, denominator);
  }

  /** A polynomial as a quotient. */
  public static RationalFunction of(Polynomial numerator) {
    return new RationalFunction(numerator, Polynomial.one(numerator.variables()));
  }

  /** A rational number as a quotient. */
  public static RationalFunction of(Variables variables, BigFraction value) {
    return new RationalFunction(
        Polynomial.constant(variables, value.getNumerator()),
        Polynomial.constant(variables, value.getDenominator()));
  }

  /** The sum. */
  public RationalFunction plus(RationalFunction f) {
    if (denominator.equals(f.denominator)) {
      return new RationalFunction(numerator.plus(f.numerator), denominator);
    }
    return new RationalFunction(
        numerator.times(f.denominator).plus(f.numerator.times(denominator)),
        denominator.times(f.denominator));
  }

  /** The difference. */
  public RationalFunction minus(RationalFunction f) {
    return plus(f.negate());
  }

  /** The product. */
  public RationalFunction times(RationalFunction f) {
    return new RationalFunction(numerator.times(f.numerator), denominator.times(f.denominator));
  }

  /**
   * The quotient.
   *
   * @throws ArithmeticException if {@code f} is 0
   */
  public RationalFunction over(RationalFunction f) {
    return new RationalFunction(numerator.times(f.denominator), denominator.times(f.numerator));
  }

  /** The negative. */
  public RationalFunction negate() {
    return new RationalFunction(numerator.negate(), denominator);
  }

  /**
   * A power.
   *
   * @param exponent any integer
   * @throws ArithmeticException if the exponent is negative and this is 0
   */
  public RationalFunction pow(int exponent) {
    return exponent < 0
        ? new RationalFunction(denominator.pow(-exponent), numerator.pow(-exponent))
        : new RationalFunction(numerator.pow(exponent), denominator.pow(exponent));
  }

  /** Whether this is 0. */
  public boolean isZero() {
    return numerator.isZero();
  }

  /**
   * The value at a point.
   *
   * @param point one value a variable
   * @throws ArithmeticException at a pole
   */
  public BigFraction at(List<BigFraction> point) {
    BigFraction below = denominator.at(point);
    if (below.signum() == 0) {
      throw new ArithmeticException("pole of " + this);
    }
    return numerator.at(point).divide(below);
  }

  /**
   * The rational number that this is.
   *
   * @throws IllegalStateException if a variable occurs
   */
  public BigFraction constantValue() {
    return BigFraction.of(numerator.constantValue(), denominator.constantValue());
  }

  /** Whether no variable occurs. */
  public boolean isConstant() {
    return numerator.isConstant() && denominator.isConstant();
  }

  /** The text of the reports. */
  @Override
  public String toString() {
    return PolynomialText.of(this);
  }
}
