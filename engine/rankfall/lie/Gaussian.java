package rankfall.lie;

import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;

/**
 * The complex quotient {@code re + i*im} of real variables.
 *
 * @param re the real part
 * @param im the imaginary part; 0 throughout over a complex ground, where i is a variable
 */
record Gaussian(RationalFunction re, RationalFunction im) {
  static Gaussian real(RationalFunction re) {
    return new Gaussian(re, zero(re));
  }

  /** The imaginary unit. */
  static Gaussian unit(Variables variables) {
    RationalFunction one = RationalFunction.of(rankfall.exact.Polynomial.one(variables));
    return new Gaussian(zero(one), one);
  }

  private static RationalFunction zero(RationalFunction of) {
    return RationalFunction.of(rankfall.exact.Polynomial.zero(of.numerator().variables()));
  }

  Gaussian plus(Gaussian g) {
    return new Gaussian(re.plus(g.re), im.plus(g.im));
  }

  Gaussian negate() {
    return new Gaussian(re.negate(), im.negate());
  }

  Gaussian times(Gaussian g) {
    if (im.isZero() && g.im.isZero()) {
      return real(re.times(g.re));
    }
    return new Gaussian(re.times(g.re).minus(im.times(g.im)), re.times(g.im).plus(im.times(g.re)));
  }

  /** What vanishes where this does: the real part of a real quotient, else the squared modulus. */
  RationalFunction norm() {
    return im.isZero() ? re : re.times(re).plus(im.times(im));
  }

  /** {@code this/g}, where {@link #norm} of g is not 0. */
  Gaussian over(Gaussian g) {
    if (g.im.isZero()) {
      return new Gaussian(re.over(g.re), im.isZero() ? im : im.over(g.re));
    }
    RationalFunction n = g.norm();
    Gaussian p = times(new Gaussian(g.re, g.im.negate()));
    return new Gaussian(p.re.over(n), p.im.over(n));
  }

  boolean isZero() {
    return re.isZero() && im.isZero();
  }

  boolean isReal() {
    return im.isZero();
  }
}
