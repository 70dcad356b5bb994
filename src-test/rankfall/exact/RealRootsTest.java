package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.OptionalInt;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class RealRootsTest {
  private static final Variables X = new Variables(List.of("x"));

  private static Polynomial poly(String text) {
    return Read.polynomial(X, text);
  }

  private static RealRoots roots(String text) {
    return RealRoots.of(poly(text));
  }

  private static BigFraction q(long n, long d) {
    return BigFraction.of(BigInteger.valueOf(n), BigInteger.valueOf(d));
  }

  private static void assertIsolates(Polynomial p, RealRoots r) {
    Sturm sturm = new Sturm(p.primitive().over(p.primitive().gcd(p.derivative(0)).primitive()));
    for (int k = 0; k < r.count(); k++) {
      Interval i = r.intervals().get(k);
      if (i.isPoint()) {
        assertEquals(0, p.at(List.of(i.lower())).signum());
      } else {
        int atUpper = p.at(List.of(i.upper())).signum() == 0 ? 1 : 0;
        assertEquals(1, sturm.count(i.lower(), i.upper()) - atUpper, "roots inside " + i);
      }
      if (k > 0) {
        assertTrue(Rationals.compare(r.intervals().get(k - 1).upper(), i.lower()) <= 0);
      }
    }
  }

  /** Wilkinson, The evaluation of the zeros of ill-conditioned polynomials, 1959: zeros 1 to 20. */
  @Test
  void wilkinsonsPolynomialHasTheRootsOneToTwenty() {
    Polynomial w = Polynomial.one(X);
    for (int k = 1; k <= 20; k++) {
      w = w.times(poly("x - " + k));
    }
    RealRoots r = RealRoots.of(w);
    assertEquals(20, r.count());
    for (int k = 0; k < 20; k++) {
      assertEquals(0, r.compare(k, BigFraction.of(k + 1)));
    }
  }

  /**
   * Wilkinson 1959: with the coefficient of x^19 changed from -210 by -2^-23 ten zeros become five
   * complex pairs; the real ones are printed there as 1, 2, 3, 4, 5 (4.999999928), 6.000006944,
   * 6.999697234, 8.007267603, 8.917250249, 20.846908101.
   */
  @Test
  void wilkinsonsPerturbedPolynomialKeepsTenRealRoots() {
    Polynomial w = Polynomial.one(X);
    for (int k = 1; k <= 20; k++) {
      w = w.times(poly("x - " + k));
    }
    RealRoots r = RealRoots.of(w.times(BigInteger.TWO.pow(23)).minus(poly("x^19")));
    assertEquals(10, r.count());
    double[] printed = {
      1, 2, 3, 4, 4.999999928, 6.000006944, 6.999697234, 8.007267603, 8.917250249, 20.846908101
    };
    for (int k = 0; k < 10; k++) {
      Interval i = r.refined(k, q(1, 10_000_000_000L));
      assertEquals(printed[k], i.middle().doubleValue(), 1e-9);
    }
  }

  /** Mignotte, Some useful bounds, 1982: x^n - 2 (a x - 1)^2 has two roots very near 1/a. */
  @Test
  void closeRootsOfMignotteAreToldApart() {
    Polynomial m = poly("x^21 - 2*(1000*x - 1)^2");
    RealRoots r = RealRoots.of(m);
    assertEquals(3, r.count());
    BigFraction near = q(1, 1000);
    assertEquals(1, -r.compare(0, near));
    assertEquals(1, r.compare(1, near));
    BigFraction width = BigFraction.ONE.divide(BigInteger.TEN.pow(60));
    BigFraction gap = r.refined(1, width).lower().subtract(r.refined(0, width).upper());
    assertTrue(gap.signum() > 0);
    assertTrue(Rationals.compare(gap, BigFraction.ONE.divide(BigInteger.TEN.pow(33))) < 0);
    assertIsolates(m, r);
  }

  /** Chebyshev: T_30 has the 30 zeros cos((2k - 1) pi / 60). */
  @Test
  void chebyshevOfDegreeThirtyHasThirtyRealRoots() {
    Polynomial a = Polynomial.one(X);
    Polynomial b = poly("x");
    for (int n = 1; n < 30; n++) {
      Polynomial c = poly("2*x").times(b).minus(a);
      a = b;
      b = c;
    }
    RealRoots r = RealRoots.of(b);
    assertEquals(30, r.count());
    for (int k = 1; k <= 30; k++) {
      double expected = Math.cos((2 * (31 - k) - 1) * Math.PI / 60);
      assertEquals(expected, r.refined(k - 1, q(1, 1L << 50)).middle().doubleValue(), 1e-14);
    }
  }

  @Test
  void multipleRootsCountOnce() {
    RealRoots r = roots("(x - 1)^3*(x + 2)^2*(x^2 + 1)^2*(x^2 - 2)^2");
    assertEquals(4, r.count());
    assertEquals(OptionalInt.of(2), r.nearest(BigFraction.of(1)));
  }

  @Test
  void zeroIsFoundAlsoAsAMultipleRoot() {
    RealRoots r = roots("x^3*(x^2 - 3)");
    assertEquals(3, r.count());
    assertEquals(Interval.of(BigFraction.ZERO), r.intervals().get(1));
  }

  @Test
  void endsThatAreRootsCountInAClosedInterval() {
    RealRoots r = roots("x*(x - 1)*(x - 2)*(2*x - 1)");
    assertEquals(3, r.countIn(new Interval(BigFraction.ZERO, BigFraction.ONE)));
    assertEquals(1, r.countIn(Interval.of(BigFraction.of(2))));
    assertEquals(0, r.countIn(new Interval(BigFraction.of(3), BigFraction.of(4))));
  }

  @Test
  void irrationalRootsBesideRationalOnesAreRefinedAwayFromThem() {
    RealRoots r = roots("(x - 1)*(x - 2)*(x^2 - 2)*(x^2 - 3)");
    Interval i = r.refined(3, q(1, 1_000_000));
    assertEquals(Math.sqrt(2), i.middle().doubleValue(), 1e-6);
    Interval j = r.refined(4, q(1, 1_000_000));
    assertEquals(Math.sqrt(3), j.middle().doubleValue(), 1e-6);
  }

  @Test
  void twoRootsEquallyNearAreNoNearestRoot() {
    assertEquals(OptionalInt.empty(), roots("x^2 - 2").nearest(BigFraction.ZERO));
    assertEquals(OptionalInt.of(1), roots("x^2 - 2").nearest(q(1, 1_000_000)));
    assertEquals(OptionalInt.empty(), roots("(x - 1)*(x - 2)").nearest(q(3, 2)));
    assertEquals(OptionalInt.empty(), roots("x^2 + 1").nearest(BigFraction.ZERO));
  }

  @Test
  void constantsHaveNoRootsAndZeroIsRefused() {
    assertEquals(0, roots("7").count());
    assertThrows(ArithmeticException.class, () -> RealRoots.of(Polynomial.zero(X)));
    Variables xy = new Variables(List.of("x", "y"));
    Polynomial two = Read.polynomial(xy, "x*y");
    assertThrows(IllegalArgumentException.class, () -> RealRoots.of(two));
  }

  static LongStream seeds() {
    return Sample.seeds(400);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void countAgreesWithSturm(long seed) {
    Sample s = new Sample(seed);
    Polynomial p = s.nonConstant(X, 6, 3 + s.below(7), 9);
    for (int k = s.below(3); k > 0; k--) {
      p = p.times(s.nonConstant(X, 2, 2, 4));
    }
    RealRoots r = RealRoots.of(p);
    BigFraction far = BigFraction.of(1_000_000);
    Polynomial simple = p.primitive().over(p.primitive().gcd(p.derivative(0)).primitive());
    assertEquals(new Sturm(simple).count(far.negate(), far), r.count());
    assertIsolates(p, r);
    BigFraction low = s.fraction(5);
    BigFraction high = low.add(s.fraction(5).abs());
    int atLow = p.at(List.of(low)).signum() == 0 ? 1 : 0;
    assertEquals(new Sturm(simple).count(low, high) + atLow, r.countIn(new Interval(low, high)));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void refinementKeepsTheRoot(long seed) {
    Sample s = new Sample(seed);
    Polynomial p = s.nonConstant(X, 6, 3 + s.below(7), 9);
    RealRoots r = RealRoots.of(p);
    Polynomial simple = p.primitive().over(p.primitive().gcd(p.derivative(0)).primitive());
    for (int k = 0; k < r.count(); k++) {
      Interval i = r.refined(k, q(1, 1 << 20));
      assertTrue(Rationals.compare(i.width(), q(1, 1 << 20)) <= 0);
      int below = simple.at(List.of(i.lower())).signum();
      int above = simple.at(List.of(i.upper())).signum();
      assertTrue(i.isPoint() ? below == 0 : below * above <= 0);
      assertEquals(OptionalInt.of(k), r.nearest(i.middle()));
    }
  }
}
