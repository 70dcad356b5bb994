package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalInt;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class IntervalTest {
  private static Interval of(long low, long high) {
    return new Interval(BigFraction.of(low), BigFraction.of(high));
  }

  @Test
  void signsAndEvenPowers() {
    assertEquals(OptionalInt.of(1), of(1, 2).sign());
    assertEquals(OptionalInt.empty(), of(0, 2).sign());
    assertEquals(OptionalInt.of(0), of(0, 0).sign());
    assertEquals(of(0, 4), of(-2, 1).pow(2));
    assertEquals(of(-8, 1), of(-2, 1).pow(3));
    assertEquals(of(1, 1), of(-2, 1).pow(0));
  }

  @Test
  void wrongEndsAndDivisionByZeroAreRefused() {
    assertThrows(IllegalArgumentException.class, () -> of(2, 1));
    assertThrows(ArithmeticException.class, () -> of(1, 2).over(of(-1, 0)));
    assertThrows(IllegalStateException.class, () -> of(1, 1).simplestInside());
  }

  @Test
  void simplestNumbers() {
    assertEquals(BigFraction.ZERO, of(-1, 2).simplestInside());
    assertEquals(BigFraction.of(1, 2), of(0, 1).simplestInside());
    assertEquals(BigFraction.of(-1, 2), of(-1, 0).simplestInside());
    assertEquals(BigFraction.of(3), of(2, 9).simplestInside());
    Interval pi = new Interval(BigFraction.of(314, 100), BigFraction.of(315, 100));
    assertEquals(BigFraction.of(22, 7), pi.simplestInside());
  }

  static LongStream seeds() {
    return Sample.seeds(300);
  }

  private static Interval random(Sample s) {
    BigFraction a = s.fraction(6);
    return new Interval(a, a.add(s.fraction(6).abs()));
  }

  private static BigFraction inside(Sample s, Interval i) {
    return i.lower().add(i.width().multiply(BigFraction.of(s.below(5), 4)));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void arithmeticEncloses(long seed) {
    Sample s = new Sample(seed);
    Interval x = random(s);
    Interval y = random(s);
    BigFraction a = inside(s, x);
    BigFraction b = inside(s, y);
    assertTrue(x.plus(y).contains(a.add(b)));
    assertTrue(x.minus(y).contains(a.subtract(b)));
    assertTrue(x.times(y).contains(a.multiply(b)));
    int e = s.below(5);
    assertTrue(x.pow(e).contains(a.pow(e)));
    if (!y.contains(BigFraction.ZERO)) {
      assertTrue(x.over(y).contains(a.divide(b)));
    }
    Interval wide = x.outward(3);
    assertTrue(wide.contains(x.lower()) && wide.contains(x.upper()));
    assertTrue(Rationals.compare(wide.width().subtract(x.width()), BigFraction.of(1, 4)) < 0);
  }

  /** No fraction of smaller denominator lies strictly inside. */
  @ParameterizedTest
  @MethodSource("seeds")
  void simplestInsideIsInsideAndSimplest(long seed) {
    Sample s = new Sample(seed);
    BigFraction a = s.fraction(40);
    Interval i = new Interval(a, a.add(BigFraction.of(1, 1 + s.below(50))));
    BigFraction m = i.simplestInside();
    assertTrue(Rationals.compare(i.lower(), m) < 0 && Rationals.compare(m, i.upper()) < 0);
    long d = Math.abs(m.getDenominator().longValue());
    for (long e = 1; e < d; e++) {
      BigFraction next =
          BigFraction.of(
                  Rationals.floor(i.lower().multiply(BigFraction.of(e)))
                      .add(java.math.BigInteger.ONE))
              .divide(BigFraction.of(e));
      assertTrue(
          Rationals.compare(next, i.upper()) >= 0, next + " has a smaller denominator than " + m);
    }
  }
}
