package rankfall.scan;

import java.math.BigInteger;
import java.util.List;

/**
 * A polynomial in doubles with a proved bound of the error, and in big integers where the bound
 * does not decide.
 *
 * <p>The bound (Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed. 2002, ch. 3 and 5).
 * Let u = 2^-53. Coefficients and coordinates are integers and become doubles by rounding to
 * nearest, a relative error of at most u each. A term of total degree d takes part in 1 + d such
 * roundings, in at most d multiplications (tables of powers, their products, Horner's steps) and in
 * at most T + k additions, T the number of terms and k the degree along the line. So with K = 1 + 3
 * d + T each term enters the computed value with a factor 1 + θ, |θ| <= γ = K u / (1 - K u) (lemma
 * 3.1), and the error is at most γ M, M the sum of the absolute values of the terms. The same
 * operations on absolute values compute M' >= (1 - γ) M. The error is thus at most γ / (1 - γ) M' =
 * K u / (1 - 2 K u) M', which is less than 8/7 K u M' for K u <= 1/16; the bound used is 2 K u M',
 * rounded once. On a line M' is computed once at the greatest absolute value along the line, which
 * only makes it larger, since rounded operations on non-negative numbers are monotone.
 *
 * <p>Underflow cannot happen: every number that is met is a rounded sum or product of integers, so
 * 0 or of absolute value 1 or more. After an overflow M' is infinite or no number, and then no
 * comparison with the bound holds, so that the exact path answers. A value of exact integers below
 * 2^53 whose terms are all 0 has M' = 0 and is told to be 0 at once.
 */
final class DoubleForm extends SignForm {
  private static final double UNIT = 0x1p-53;

  private final Monomials[] parts;
  private final double reach;
  private final double factor;
  private final double[] coefficients;
  private final BigInteger[] exact;
  private double bound;
  private boolean exactKnown;

  /**
   * A form.
   *
   * @param p with integer coefficients
   * @param inner the coordinate along the line, or -1 if there is none
   * @param reach the greatest absolute value of that coordinate
   */
  DoubleForm(IntegerPolynomial p, int inner, long reach) {
    super(inner >= 0 && p.degree(inner) > 0);
    List<IntegerPolynomial> along = p.along(inner);
    parts = along.stream().map(Monomials::new).toArray(Monomials[]::new);
    coefficients = new double[parts.length];
    exact = new BigInteger[parts.length];
    this.reach = reach;
    this.factor = 2 * UNIT * (1 + 3.0 * p.degree() + p.terms().size());
  }

  @Override
  void enter(Coordinates at) {
    exactKnown = false;
    double size = 0;
    for (int k = parts.length - 1; k >= 0; k--) {
      double value = 0;
      double absolute = 0;
      for (int t = 0; t < parts[k].size(); t++) {
        double term = parts[k].term(t, at);
        value += term;
        absolute += Math.abs(term);
      }
      coefficients[k] = value;
      size = size * reach + absolute;
    }
    bound = factor * size;
  }

  @Override
  int here(Coordinates at) {
    double x = at.inner();
    double value = coefficients[coefficients.length - 1];
    for (int k = coefficients.length - 2; k >= 0; k--) {
      value = value * x + coefficients[k];
    }
    if (value > bound) {
      return 1;
    }
    if (value < -bound) {
      return -1;
    }
    return bound == 0 ? 0 : exact(at);
  }

  private int exact(Coordinates at) {
    if (!exactKnown) {
      for (int k = 0; k < parts.length; k++) {
        exact[k] = parts[k].value(at);
      }
      exactKnown = true;
    }
    BigInteger value = exact[exact.length - 1];
    if (exact.length > 1) {
      BigInteger x = BigInteger.valueOf(at.inner());
      for (int k = exact.length - 2; k >= 0; k--) {
        value = value.multiply(x).add(exact[k]);
      }
    }
    return value.signum();
  }
}
