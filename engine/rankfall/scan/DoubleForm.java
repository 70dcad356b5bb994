package rankfall.scan;

import java.util.List;

/**
 * A polynomial in doubles with a proved bound of the error; where the bound does not decide,
 * another form of it answers.
 *
 * <p>The bound (Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed. 2002, ch. 3 and 5).
 * Let u = 2^-53. Coordinates are integers and become doubles by rounding to nearest, a relative
 * error of at most u each; coefficients are doubles with a relative error of at most 2 u. A term of
 * total degree d takes part in d such roundings of coordinates, in at most d multiplications
 * (tables of powers, their products, Horner's steps) and in at most T + k additions, T the number
 * of terms and k the degree along the line. So with K = 3 + 3 d + T each term enters the computed
 * value with a factor 1 + θ, |θ| <= γ = K u / (1 - K u) (lemma 3.1; an error of 2 u counts as three
 * roundings), and the error is at most γ M, M the sum of the absolute values of the terms. The same
 * operations on absolute values compute M' >= (1 - γ) M. The error is thus at most γ / (1 - γ) M' =
 * K u / (1 - 2 K u) M', which is less than 8/7 K u M' for K u <= 1/16; the bound used is 2 K u M',
 * rounded once. On a line M' is computed once at the greatest absolute value along the line, which
 * only makes it larger, since rounded operations on non-negative numbers are monotone.
 *
 * <p>Underflow cannot happen: coefficients are 2^-500 or more in absolute value (integers, or
 * numbers of a field in that range), coordinates are integers, so that every product is 0 or at
 * least 2^-500, and sums do not underflow. After an overflow M' is infinite or no number, and then
 * no comparison with the bound holds, so that the other form answers. M' = 0 only if all terms are
 * exactly 0.
 */
final class DoubleForm extends SignForm {
  private static final double UNIT = 0x1p-53;

  private final Monomials[] parts;
  private final SignForm exact;
  private final double reach;
  private final double factor;
  private final double[] coefficients;
  private double bound;

  /**
   * A form.
   *
   * @param along the polynomial by powers of the coordinate along the line, constant one first; one
   *     only if that coordinate does not occur
   * @param degree at least the total degree
   * @param reach the greatest absolute value of that coordinate
   * @param exact answers where the bound does not decide
   */
  DoubleForm(List<Monomials> along, int degree, long reach, SignForm exact) {
    super(along.size() > 1);
    this.parts = along.toArray(new Monomials[0]);
    this.coefficients = new double[parts.length];
    this.reach = reach;
    this.exact = exact;
    int terms = along.stream().mapToInt(Monomials::size).sum();
    this.factor = 2 * UNIT * (3 + 3.0 * degree + terms);
  }

  @Override
  void enter(Coordinates at) {
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
    return bound == 0 ? 0 : exact.sign(at);
  }
}
