package rankfall.scan;

import java.math.BigInteger;
import java.util.List;

/** A polynomial in big integers: exact, whatever the size. */
final class BigForm extends SignForm {
  private final Monomials[] parts;
  private final BigInteger[] coefficients;

  /**
   * A form.
   *
   * @param along the polynomial by powers of the coordinate along the line, constant one first; one
   *     only if that coordinate does not occur
   */
  BigForm(List<Monomials> along) {
    super(along.size() > 1);
    parts = along.toArray(new Monomials[0]);
    coefficients = new BigInteger[parts.length];
  }

  @Override
  void enter(Coordinates at) {
    for (int k = 0; k < parts.length; k++) {
      coefficients[k] = parts[k].value(at);
    }
  }

  @Override
  int here(Coordinates at) {
    BigInteger value = coefficients[coefficients.length - 1];
    if (coefficients.length > 1) {
      BigInteger x = BigInteger.valueOf(at.inner());
      for (int k = coefficients.length - 2; k >= 0; k--) {
        value = value.multiply(x).add(coefficients[k]);
      }
    }
    return value.signum();
  }
}
