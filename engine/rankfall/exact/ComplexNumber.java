package rankfall.exact;

import java.math.BigDecimal;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/** A complex algebraic number: one of the roots of its minimal polynomial. Immutable. */
public final class ComplexNumber {
  private static final int DECIMALS = 8;
  private final Univariate minimal;
  private final ComplexRoots roots;
  private final int index;

  ComplexNumber(Univariate minimal, ComplexRoots roots, int index) {
    this.minimal = minimal;
    this.roots = roots;
    this.index = index;
  }

  /** {@return the minimal polynomial in a variable x: primitive, leading coefficient positive} */
  public Polynomial minimalPolynomial() {
    return minimal.polynomial();
  }

  /** {@return whether the imaginary part is 0} */
  public boolean isReal() {
    return box().isReal();
  }

  ComplexBox box() {
    return roots.boxes().get(index);
  }

  ComplexNumber refined() {
    return new ComplexNumber(minimal, roots.refined(), index);
  }

  /**
   * A fraction, or the text of the reports for a root: the one nearest to the decimals, which have
   * eight places, or as many more as they need to tell the root.
   *
   * @return for example {@code -3/2} or {@code root(x^2 - x + 1, 0.50000000 + 0.86602540*i)}
   */
  @Override
  public String toString() {
    if (minimal.degree() == 1) {
      return Rationals.text(
          BigFraction.of(minimal.coefficient(0).negate(), minimal.coefficient(1)));
    }
    ComplexRoots fine = roots;
    for (int places = DECIMALS; ; places++) {
      while (Rationals.compare(
              fine.boxes().get(index).re().width(),
              BigFraction.of(BigDecimal.TEN.pow(places + 4).toBigInteger()).reciprocal())
          > 0) {
        fine = fine.refined();
      }
      BigDecimal re = ComplexRoots.decimal(fine.boxes().get(index).re(), places);
      BigDecimal im = ComplexRoots.decimal(fine.boxes().get(index).im(), places);
      if (isNearest(fine.boxes(), ComplexRoots.fraction(re), ComplexRoots.fraction(im))) {
        return "root(" + minimal + ", " + text(re, im) + ")";
      }
    }
  }

  private boolean isNearest(List<ComplexBox> boxes, BigFraction x, BigFraction y) {
    BigFraction own = boxes.get(index).squaredDistance(x, y).upper();
    for (int k = 0; k < boxes.size(); k++) {
      if (k != index && Rationals.compare(own, boxes.get(k).squaredDistance(x, y).lower()) >= 0) {
        return false;
      }
    }
    return true;
  }

  private String text(BigDecimal re, BigDecimal im) {
    return isReal()
        ? re.toPlainString()
        : re.toPlainString() + (im.signum() < 0 ? " - " : " + ") + im.abs().toPlainString() + "*i";
  }
}
