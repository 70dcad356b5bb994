package rankfall.scan;

import java.util.List;

/**
 * A polynomial in longs: exact, since no partial sum or product can overflow ({@link
 * IntegerPolynomial#bound} is below 2^63; Horner's partial values are sums of the same terms over
 * powers of a coordinate of absolute value 1 or more).
 */
final class LongForm extends SignForm {
  private final Monomials[] parts;
  private final long[] coefficients;

  /**
   * A form.
   *
   * @param along the polynomial by powers of the coordinate along the line, constant one first; one
   *     only if that coordinate does not occur
   */
  LongForm(List<Monomials> along) {
    super(along.size() > 1);
    parts = along.toArray(new Monomials[0]);
    coefficients = new long[parts.length];
  }

  @Override
  void enter(Coordinates at) {
    for (int k = 0; k < parts.length; k++) {
      coefficients[k] = parts[k].longValue(at);
    }
  }

  @Override
  int here(Coordinates at) {
    long x = at.inner();
    long value = coefficients[coefficients.length - 1];
    for (int k = coefficients.length - 2; k >= 0; k--) {
      value = value * x + coefficients[k];
    }
    return Long.signum(value);
  }
}
