package rankfall.exact;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * All complex roots of a polynomial with integer coefficients and simple roots, each in a box of
 * its own; the boxes of real roots lie on the real axis.
 *
 * <p>Approximations come from the simultaneous iteration of Weierstrass (1891; Durand 1960, Kerner
 * 1966). They are trusted only once discs about them, computed exactly, are disjoint: the disc
 * about {@code z} of radius {@code n*|W|}, where {@code W} is Weierstrass' correction, then holds
 * one root (Smith, Error bounds for zeros of a polynomial based upon Gerschgorin's theorems, J. ACM
 * 17, 1970).
 */
final class ComplexRoots {
  private static final int ROUNDS = 400;
  private static final int MOST_DIGITS = 2000;
  private final Univariate f;
  private final int digits;
  private final List<Complex> centres;
  private final List<ComplexBox> boxes;

  private ComplexRoots(Univariate f, int digits, List<Complex> centres, List<ComplexBox> boxes) {
    this.f = f;
    this.digits = digits;
    this.centres = List.copyOf(centres);
    this.boxes = List.copyOf(boxes);
  }

  /** A decimal approximation. */
  private record Complex(BigDecimal re, BigDecimal im) {
    Complex plus(Complex b) {
      return new Complex(re.add(b.re), im.add(b.im));
    }

    Complex minus(Complex b) {
      return new Complex(re.subtract(b.re), im.subtract(b.im));
    }

    Complex times(Complex b) {
      return new Complex(
          re.multiply(b.re).subtract(im.multiply(b.im)), re.multiply(b.im).add(im.multiply(b.re)));
    }

    Complex over(Complex b, MathContext m) {
      BigDecimal n = b.re.multiply(b.re).add(b.im.multiply(b.im));
      Complex p = times(new Complex(b.re, b.im.negate()));
      return new Complex(p.re.divide(n, m), p.im.divide(n, m));
    }

    Complex rounded(int scale) {
      return new Complex(
          re.setScale(scale, RoundingMode.HALF_EVEN), im.setScale(scale, RoundingMode.HALF_EVEN));
    }

    boolean isZero() {
      return re.signum() == 0 && im.signum() == 0;
    }

    BigDecimal greatestPart() {
      return re.abs().max(im.abs());
    }

    BigDecimal sumOfParts() {
      return re.abs().add(im.abs());
    }
  }

  /**
   * The roots.
   *
   * @param f of degree 1 or more, with simple roots
   */
  static ComplexRoots of(Univariate f) {
    return isolated(f, start(f), 20);
  }

  /** The boxes, always in the same order. */
  List<ComplexBox> boxes() {
    return boxes;
  }

  /** The same roots in the same order, with smaller boxes. */
  ComplexRoots refined() {
    return isolated(f, centres, 2 * digits);
  }

  private static ComplexRoots isolated(Univariate f, List<Complex> from, int digits) {
    int real = RealRoots.of(f).count();
    List<Complex> z = from;
    for (int d = digits; d <= MOST_DIGITS; d *= 2) {
      z = iterated(f, z, d);
      List<ComplexBox> out = new ArrayList<>();
      for (int k = 0; k < z.size(); k++) {
        out.add(box(f, z, k));
      }
      if (areApart(out) && out.stream().filter(ComplexBox::meetsRealAxis).count() == real) {
        return new ComplexRoots(
            f, d, z, out.stream().map(b -> b.meetsRealAxis() ? b.real() : b).toList());
      }
    }
    throw new ArithmeticException("roots not told apart: " + f);
  }

  private static boolean areApart(List<ComplexBox> boxes) {
    for (int i = 0; i < boxes.size(); i++) {
      for (int j = 0; j < i; j++) {
        if (!boxes.get(i).isApartFrom(boxes.get(j))) {
          return false;
        }
      }
    }
    return true;
  }

  /** Points on a circle about the roots (Fujiwara's bound), off the axes. */
  private static List<Complex> start(Univariate f) {
    int n = f.degree();
    double radius = 0;
    int lead = f.coefficient(n).bitLength();
    for (int k = 1; k <= n; k++) {
      if (f.coefficient(n - k).signum() != 0) {
        double bits = f.coefficient(n - k).bitLength() - lead + 1;
        radius = Math.max(radius, Math.pow(2, bits / k));
      }
    }
    List<Complex> out = new ArrayList<>();
    for (int k = 0; k < n; k++) {
      double angle = 2 * Math.PI * k / n + 0.4;
      out.add(
          new Complex(
              BigDecimal.valueOf(Math.max(radius, 1e-3) * Math.cos(angle)),
              BigDecimal.valueOf(Math.max(radius, 1e-3) * Math.sin(angle))));
    }
    return out;
  }

  private static List<Complex> iterated(Univariate f, List<Complex> from, int digits) {
    List<Complex> z = new ArrayList<>(from);
    MathContext m = new MathContext(digits + 10);
    BigDecimal small = BigDecimal.ONE.movePointLeft(digits);
    for (int round = 0; round < ROUNDS; round++) {
      BigDecimal most = BigDecimal.ZERO;
      for (int k = 0; k < z.size(); k++) {
        Complex divisor = divisor(f, z, k, digits + 10);
        if (divisor.isZero()) {
          return z;
        }
        Complex w = value(f, z.get(k), digits + 10).over(divisor, m);
        z.set(k, z.get(k).minus(w).rounded(digits + 5));
        most = most.max(w.greatestPart());
      }
      if (most.compareTo(small) < 0) {
        return z;
      }
    }
    return z;
  }

  private static Complex value(Univariate f, Complex z, int scale) {
    Complex sum = new Complex(BigDecimal.ZERO, BigDecimal.ZERO);
    for (int k = f.degree(); k >= 0; k--) {
      Complex next = scale < 0 ? sum.times(z) : sum.times(z).rounded(scale);
      sum = next.plus(new Complex(new BigDecimal(f.coefficient(k)), BigDecimal.ZERO));
    }
    return sum;
  }

  private static Complex divisor(Univariate f, List<Complex> z, int k, int scale) {
    Complex out = new Complex(new BigDecimal(f.coefficient(f.degree())), BigDecimal.ZERO);
    for (int j = 0; j < z.size(); j++) {
      if (j != k) {
        out = out.times(z.get(k).minus(z.get(j))).rounded(2 * scale);
      }
    }
    return out;
  }

  /** A box about Smith's disc; the radius is computed without rounding down. */
  private static ComplexBox box(Univariate f, List<Complex> z, int k) {
    BigDecimal below = new BigDecimal(f.coefficient(f.degree()).abs());
    for (int j = 0; j < z.size(); j++) {
      if (j != k) {
        below = below.multiply(z.get(k).minus(z.get(j)).greatestPart());
      }
    }
    BigDecimal above = value(f, z.get(k), -1).sumOfParts().multiply(BigDecimal.valueOf(f.degree()));
    BigDecimal radius =
        below.signum() == 0
            ? BigDecimal.TEN.pow(MOST_DIGITS)
            : above.divide(below, new MathContext(20, RoundingMode.UP));
    return new ComplexBox(around(z.get(k).re(), radius), around(z.get(k).im(), radius));
  }

  private static Interval around(BigDecimal x, BigDecimal radius) {
    return new Interval(fraction(x.subtract(radius)), fraction(x.add(radius)));
  }

  static BigFraction fraction(BigDecimal x) {
    return x.scale() >= 0
        ? BigFraction.of(x.unscaledValue(), BigInteger.TEN.pow(x.scale()))
        : BigFraction.of(x.unscaledValue().multiply(BigInteger.TEN.pow(-x.scale())));
  }

  /** The middle of a root's box, rounded. */
  static BigDecimal decimal(Interval part, int places) {
    BigFraction m = part.middle();
    return new BigDecimal(Rationals.numerator(m))
        .divide(new BigDecimal(Rationals.denominator(m)), places, RoundingMode.HALF_EVEN);
  }
}
