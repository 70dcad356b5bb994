package rankfall.exact;

import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A rectangle in the complex plane, sides parallel to the axes; arithmetic encloses and never
 * rounds.
 *
 * @param re the real parts
 * @param im the imaginary parts
 */
record ComplexBox(Interval re, Interval im) {
  private static final Interval ZERO = Interval.of(BigFraction.ZERO);

  static ComplexBox of(BigFraction real) {
    return new ComplexBox(Interval.of(real), ZERO);
  }

  ComplexBox plus(ComplexBox b) {
    return new ComplexBox(re.plus(b.re), im.plus(b.im));
  }

  ComplexBox times(ComplexBox b) {
    return new ComplexBox(
        re.times(b.re).minus(im.times(b.im)), re.times(b.im).plus(im.times(b.re)));
  }

  boolean mayBeZero() {
    return re.contains(BigFraction.ZERO) && im.contains(BigFraction.ZERO);
  }

  boolean meetsRealAxis() {
    return im.contains(BigFraction.ZERO);
  }

  boolean isReal() {
    return im.equals(ZERO);
  }

  boolean isApartFrom(ComplexBox b) {
    return isApart(re, b.re) || isApart(im, b.im);
  }

  private static boolean isApart(Interval a, Interval b) {
    return Rationals.compare(a.upper(), b.lower()) < 0
        || Rationals.compare(b.upper(), a.lower()) < 0;
  }

  ComplexBox real() {
    return new ComplexBox(re, ZERO);
  }

  /** The squares of the distances of its points from a point. */
  Interval squaredDistance(BigFraction x, BigFraction y) {
    return re.minus(Interval.of(x)).pow(2).plus(im.minus(Interval.of(y)).pow(2));
  }
}
