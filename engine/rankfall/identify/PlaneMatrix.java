package rankfall.identify;

import java.math.BigInteger;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.AlgebraicNumber;
import rankfall.exact.Polynomial;
import rankfall.exact.Rationals;

/**
 * The eigenvalues of a real matrix of order 2, up to a common factor.
 *
 * @param field of the entries
 * @param trace not 0
 * @param determinant not a fourth of the square of the trace
 */
record PlaneMatrix(RealField field, Polynomial trace, Polynomial determinant) {
  private Polynomial square() {
    return trace.pow(2);
  }

  private Polynomial four(Polynomial p) {
    return p.times(BigInteger.valueOf(4));
  }

  /** The square of the difference of the eigenvalues. */
  private Polynomial discriminant() {
    return square().minus(four(determinant));
  }

  boolean hasRealEigenvalues() {
    return field.signs().signum(discriminant()) > 0;
  }

  /** The number h of the Bianchi type: minus the square of sum over difference. */
  AlgebraicNumber h() {
    return field.quotient(square().negate(), discriminant());
  }

  /** The real part over the imaginary part, positive, of complex eigenvalues. */
  AlgebraicNumber overImaginary() {
    return field.squareRoot(square().negate(), discriminant());
  }

  /**
   * The eigenvalue of smaller absolute value over the other one, both real: (1 - w)/(1 + w) for w =
   * difference over sum, both positive.
   */
  AlgebraicNumber ratio() {
    Polynomial middle = determinant.times(BigInteger.TWO).minus(square());
    return field.root(List.of(determinant, middle, determinant), this::compareRatio);
  }

  private int compareRatio(BigFraction q) {
    if (Rationals.compare(q, BigFraction.ONE) >= 0) {
      return -1;
    }
    BigFraction below = BigFraction.ONE.add(q);
    if (below.signum() <= 0) {
      return 1;
    }
    BigFraction w = BigFraction.ONE.subtract(q).divide(below);
    return -field.compareRoot(discriminant(), square(), w);
  }
}
