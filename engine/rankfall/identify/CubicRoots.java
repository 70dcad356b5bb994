package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BinaryOperator;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.AlgebraicNumber;
import rankfall.exact.Chain;
import rankfall.exact.Interval;
import rankfall.exact.NumberFieldTower;
import rankfall.exact.Polynomial;
import rankfall.exact.Rationals;
import rankfall.exact.Variables;
import rankfall.lie.CharacteristicPolynomial;
import rankfall.lie.Signature;

/**
 * The roots of {@code p = x^3 - c1 x^2 + c2 x - c3} over a real field; p has three different roots,
 * none of them 0.
 *
 * <p>How many real roots make a polynomial g positive, negative or 0 is read off the signature of
 * Hermite's form with the entries tr(g(C) C^(i+j)), C a matrix with the polynomial p; a pair of
 * complex roots adds one plus and one minus (Hermite 1856; Basu, Pollack and Roy, Algorithms in
 * Real Algebraic Geometry, chapter 4; from memory).
 *
 * @param field the field
 * @param coefficients c1, c2, c3
 */
record CubicRoots(RealField field, List<Polynomial> coefficients) {
  private static final int DEGREE = 3;

  /** Two real numbers that determine the roots up to a common factor. */
  record Ratios(AlgebraicNumber a, AlgebraicNumber b) {}

  /** Whether all three roots are real. */
  boolean allReal() {
    return form(List.of(one())).minus() == 0;
  }

  /**
   * The ratios of three real roots to the one of largest absolute value. Where two of them are
   * largest, the one is taken for which the third one has a positive ratio.
   *
   * @return -1 at least, 1 at most, a less than b
   */
  Ratios real() {
    int top = largest();
    List<AlgebraicNumber> out =
        IntStream.range(0, DEGREE)
            .filter(k -> k != top)
            .mapToObj(k -> ratio(k, top))
            .sorted()
            .toList();
    return new Ratios(out.get(0), out.get(1));
  }

  /**
   * The position of the root of largest absolute value; the sum of the other two is c1 minus it.
   */
  private int largest() {
    if (signum(0) == signum(2)) {
      return signum(0) > 0 ? 2 : 0;
    }
    int outer = -compare(1, coefficients.get(0), one());
    return outer > 0 || (outer == 0 && signum(1) > 0) ? 2 : 0;
  }

  private int signum(int k) {
    return compare(k, field.chain().zero(), one());
  }

  /**
   * The sign of one of three real roots minus a number.
   *
   * @param k ascending from 0
   * @param a above
   * @param b below, positive
   */
  private int compare(int k, Polynomial a, Polynomial b) {
    Signature s = form(List.of(a.negate(), b));
    if (s.plus() >= DEGREE - k) {
      return 1;
    }
    return s.plus() + s.zero() >= DEGREE - k ? 0 : -1;
  }

  private RealField.Cut root(int k) {
    return q -> compare(k, number(Rationals.numerator(q)), number(Rationals.denominator(q)));
  }

  private AlgebraicNumber ratio(int above, int below) {
    Polynomial[] c = inTwoMore(coefficients);
    List<Polynomial> r =
        eliminated(
            (x, y) -> {
              Polynomial z = x.times(y);
              return z.pow(3).minus(c[0].times(z.pow(2))).plus(c[1].times(z)).minus(c[2]);
            });
    RealField.Cut upper = root(above);
    RealField.Cut lower = root(below);
    int sign = signum(below);
    return field.root(r, q -> sign * difference(upper, lower, q));
  }

  /** The sign of x - q y, which is known not to be 0. */
  private static int difference(RealField.Cut x, RealField.Cut y, BigFraction q) {
    Interval a = around(x);
    Interval b = around(y);
    while (true) {
      Interval d = a.minus(b.times(Interval.of(q)));
      if (!d.contains(BigFraction.ZERO)) {
        return d.lower().signum();
      }
      a = halved(x, a);
      b = halved(y, b);
    }
  }

  private static Interval around(RealField.Cut x) {
    BigFraction bound = BigFraction.ONE;
    while (x.compare(bound) > 0 || x.compare(bound.negate()) < 0) {
      bound = bound.multiply(2);
    }
    return new Interval(bound.negate(), bound);
  }

  private static Interval halved(RealField.Cut x, Interval i) {
    int c = x.compare(i.middle());
    if (c == 0) {
      return Interval.of(i.middle());
    }
    return c > 0 ? new Interval(i.middle(), i.upper()) : new Interval(i.lower(), i.middle());
  }

  /**
   * Of one real root and a pair r + is, r - is: a is the real root over s, b is r over s, where the
   * sign of s is such that b is positive, or b = 0 and a positive.
   */
  Ratios complex() {
    Polynomial c1 = coefficients.get(0);
    int root = signAtReal(List.of(field.chain().zero(), one()));
    int sum = signAtReal(List.of(c1, one().negate()));
    AlgebraicNumber size = overImaginary(List.of(field.chain().zero(), number(2)));
    AlgebraicNumber a = root * sum < 0 ? negative(size) : size;
    return new Ratios(a, overImaginary(List.of(c1, one().negate())));
  }

  /** The sign of a polynomial at the only real root. */
  private int signAtReal(List<Polynomial> g) {
    Signature s = form(g);
    return s.plus() - s.minus();
  }

  /**
   * The absolute value of f0 + f1 x over 2s at the real root x, where 4s^2 = 3x^2 - 2 c1 x + 4 c2 -
   * c1^2.
   */
  private AlgebraicNumber overImaginary(List<Polynomial> f) {
    Polynomial c1 = coefficients.get(0);
    Polynomial c2 = coefficients.get(1);
    Polynomial s0 = c2.times(number(4)).minus(c1.pow(2));
    Polynomial s1 = c1.times(number(-2));
    Polynomial s2 = number(3);
    Polynomial[] c = inTwoMore(List.of(f.get(0), f.get(1), s0, s1, s2));
    List<Polynomial> r =
        eliminated(
            (x, y) -> {
              Polynomial above = c[0].plus(c[1].times(x)).pow(2);
              Polynomial below = c[2].plus(c[3].times(x)).plus(c[4].times(x.pow(2)));
              return above.minus(below.times(y.pow(2)));
            });
    return field.root(
        r,
        q -> {
          if (q.signum() < 0) {
            return 1;
          }
          Polynomial n = number(Rationals.numerator(q).pow(2));
          Polynomial d = number(Rationals.denominator(q).pow(2));
          return signAtReal(
              List.of(
                  f.get(0).pow(2).times(d).minus(s0.times(n)),
                  f.get(0).times(f.get(1)).times(number(2)).times(d).minus(s1.times(n)),
                  f.get(1).pow(2).times(d).minus(s2.times(n))));
        });
  }

  private static AlgebraicNumber negative(AlgebraicNumber a) {
    Polynomial p = a.minimalPolynomial();
    Polynomial mirrored = p.substitute(0, Polynomial.variable(p.variables(), 0).negate());
    List<AlgebraicNumber> roots = AlgebraicNumber.rootsOf(p);
    List<AlgebraicNumber> images = AlgebraicNumber.rootsOf(mirrored);
    return images.get(images.size() - 1 - roots.indexOf(a));
  }

  /**
   * The signature of Hermite's form.
   *
   * @param g its coefficients, constant one first
   */
  private Signature form(List<Polynomial> g) {
    Chain chain = field.chain();
    Arithmetic<Polynomial> ring = new Arithmetic<>(chain);
    List<List<Polynomial>> c = companion();
    List<List<Polynomial>> value = ring.product(ring.zero(DEGREE), c);
    for (int k = g.size() - 1; k >= 0; k--) {
      value = ring.combination(g.get(k), ring.unit(DEGREE), ring.product(value, c));
    }
    List<Polynomial> traces = new ArrayList<>();
    for (int k = 0; k < 2 * DEGREE - 1; k++) {
      traces.add(ring.trace(value));
      value = ring.product(value, c);
    }
    List<List<Polynomial>> h = new ArrayList<>();
    for (int i = 0; i < DEGREE; i++) {
      h.add(traces.subList(i, i + DEGREE));
    }
    return Signature.of(List.of(CharacteristicPolynomial.of(chain, h)), field.signs());
  }

  private List<List<Polynomial>> companion() {
    Polynomial o = field.chain().zero();
    return List.of(
        List.of(o, o, coefficients.get(2)),
        List.of(one(), o, coefficients.get(1).negate()),
        List.of(o, one(), coefficients.get(0)));
  }

  private Polynomial one() {
    return field.chain().one();
  }

  private Polynomial number(long k) {
    return Polynomial.constant(field.chain().variables(), k);
  }

  private Polynomial number(BigInteger k) {
    return Polynomial.constant(field.chain().variables(), k);
  }

  /** The ring with two more variables, which come last. */
  private Variables twoMore() {
    return RealField.extended(field.chain(), 2);
  }

  private Polynomial[] inTwoMore(List<Polynomial> p) {
    return p.stream().map(c -> NumberFieldTower.inRing(c, twoMore())).toArray(Polynomial[]::new);
  }

  /**
   * The polynomial in y, constant coefficient first, that vanishes where f(x, y) does for a root x.
   */
  private List<Polynomial> eliminated(BinaryOperator<Polynomial> f) {
    Variables ring = twoMore();
    int at = ring.count() - 2;
    Polynomial x = Polynomial.variable(ring, at);
    Polynomial y = Polynomial.variable(ring, at + 1);
    Polynomial[] c = inTwoMore(coefficients);
    Polynomial p = x.pow(3).minus(c[0].times(x.pow(2))).plus(c[1].times(x)).minus(c[2]);
    return p.resultant(f.apply(x, y), at).coefficientsIn(at + 1).stream()
        .map(q -> NumberFieldTower.inRing(q, field.chain().variables()))
        .toList();
  }
}
