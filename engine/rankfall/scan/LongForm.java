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

  LongForm(IntegerPolynomial p, int inner) {
    super(inner >= 0 && p.degree(inner) > 0);
    List<IntegerPolynomial> along = p.along(inner);
    parts = along.stream().map(Monomials::new).toArray(Monomials[]::new);
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
