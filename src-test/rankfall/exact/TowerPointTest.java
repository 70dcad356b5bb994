package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.exact.Chain.Rule;

class TowerPointTest {
  private static final Variables RING = new Variables(List.of("a", "r", "s", "w", "i", "y"));

  private static Polynomial poly(String text) {
    return Read.polynomial(RING, text);
  }

  private static Rule rule(String variable, String equation) {
    return new Rule(RING.index(variable), poly(equation));
  }

  private static Map<Integer, BigFraction> near(Object... pairs) {
    java.util.TreeMap<Integer, BigFraction> out = new java.util.TreeMap<>();
    for (int k = 0; k < pairs.length; k += 2) {
      out.put(RING.index((String) pairs[k]), (BigFraction) pairs[k + 1]);
    }
    return out;
  }

  private static final BigFraction ONE = BigFraction.ONE;

  /** r = sqrt(2), s = sqrt(3 + r), w the real root of w^3 = w + r s, y = (s + 1)/(r + w). */
  private static TowerPoint threeLevels() {
    Chain chain =
        new Chain(
            RING,
            List.of(
                rule("y", "(r + w)*y - s - 1"),
                rule("r", "r^2 - 2"),
                rule("s", "s^2 - 3 - r"),
                rule("w", "w^3 - w - r*s")));
    return TowerPoint.of(chain, near("r", ONE, "s", ONE, "w", ONE));
  }

  @Test
  void rootsAreChosenNearestToTheNumber() {
    Chain chain = new Chain(RING, List.of(rule("r", "r^2 - 2"), rule("w", "w^3 - 3*w + 1")));
    TowerPoint p = TowerPoint.of(chain, near("r", BigFraction.of(-1), "w", BigFraction.of(1, 3)));
    assertEquals("root(x^2 - 2, -1.41421356)", p.coordinates().get(1).toString());
    assertEquals("root(x^3 - 3*x + 1, 0.34729636)", p.coordinates().get(3).toString());
    assertEquals(-1, p.sign(poly("r")));
    assertEquals(1, p.sign(poly("w - r")));
    assertEquals(0, p.sign(poly("r^3 - 2*r")));
  }

  @Test
  void upperRuleSeesTheChosenRootBelow() {
    Chain chain = new Chain(RING, List.of(rule("r", "r^2 - 2"), rule("s", "s^2 - r")));
    TowerPoint p = TowerPoint.of(chain, near("r", ONE, "s", ONE));
    assertEquals("root(x^4 - 2, 1.18920712)", p.coordinates().get(2).toString());
    IllegalArgumentException none =
        assertThrows(
            IllegalArgumentException.class,
            () -> TowerPoint.of(chain, near("r", BigFraction.of(-1), "s", ONE)));
    assertEquals("s has no real value: s^2 - r = 0", none.getMessage());
  }

  @Test
  void theImaginaryUnitHasNoValue() {
    Chain chain = new Chain(RING, List.of(rule("r", "r^2 - 2"), rule("i", "i^2 + 1")));
    assertThrows(
        IllegalArgumentException.class, () -> TowerPoint.of(chain, near("r", ONE, "i", ONE)));
    TowerPoint p = TowerPoint.of(chain, near("r", ONE));
    assertEquals(1, p.sign(poly("r - 1")));
    assertFalse(p.covers(poly("i*r")));
    IllegalArgumentException e =
        assertThrows(IllegalArgumentException.class, () -> p.sign(poly("i*r")));
    assertEquals("i has no real value here, so r*i has no sign", e.getMessage());
    assertThrows(IllegalArgumentException.class, () -> p.sign(poly("a")));
  }

  @Test
  void equallyNearRootsAreRefused() {
    Chain chain = new Chain(RING, List.of(rule("r", "r^2 - 2")));
    assertThrows(
        IllegalArgumentException.class, () -> TowerPoint.of(chain, near("r", BigFraction.ZERO)));
  }

  @Test
  void threeLevelsWithAQuotientOnTop() {
    TowerPoint p = threeLevels();
    double r = Math.sqrt(2);
    double s = Math.sqrt(3 + r);
    double w = 1.7;
    for (int k = 0; k < 60; k++) {
      w -= (w * w * w - w - r * s) / (3 * w * w - 1);
    }
    assertEquals(w, p.coordinates().get(3).decimal(12).doubleValue(), 1e-11);
    assertEquals((s + 1) / (r + w), p.decimal(poly("y"), 12).doubleValue(), 1e-11);
    assertEquals(0, p.sign(poly("(r + w)*y - s - 1")));
    assertEquals(0, p.sign(poly("(s^2 - 3)^2 - 2")));
    assertEquals(BigInteger.valueOf((long) Math.floor(100 * w)), p.floor(poly("100*w")));
    assertEquals(BigInteger.valueOf(-2), p.floor(poly("r^2*w - w*2 - 2")));
    assertEquals(BigInteger.valueOf(-2), p.ceil(poly("r^2*w - w*2 - 2")));
  }

  @Test
  void valuesThatDifferByLittleAreToldApart() {
    Chain chain = new Chain(RING, List.of(rule("r", "r^2 - 2"), rule("s", "s^2 - 3")));
    TowerPoint p = TowerPoint.of(chain, near("r", ONE, "s", ONE));
    Polynomial tiny = poly("r + s - 3").pow(20);
    assertEquals(1, p.sign(tiny));
    assertEquals(1, p.sign(poly("3 - r").pow(5).times(tiny)));
    assertEquals(-1, p.sign(poly("r - s").pow(21)));
    assertEquals(0, p.sign(poly("(s - r)*(s + r) - 1")));
    assertEquals(1, p.sign(RationalFunction.of(poly("r - s"), poly("1 - s"))));
    assertThrows(
        ArithmeticException.class,
        () -> p.sign(RationalFunction.of(poly("1"), poly("s^2 - r^2 - 1"))));
    BigFraction between = p.between(poly("s"), poly("r"));
    assertEquals(BigFraction.of(3, 2), between);
    assertThrows(IllegalArgumentException.class, () -> p.between(poly("s^2"), poly("r^2 + 1")));
  }

  static LongStream seeds() {
    return Sample.seeds(60);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void signsAreMultiplicativeAndAgreeWithEnclosures(long seed) {
    TowerPoint p = threeLevels();
    Sample sample = new Sample(seed);
    Polynomial f = drop(sample.polynomial(RING, 4, 4, 5));
    Polynomial g = drop(sample.polynomial(RING, 4, 4, 5));
    assertEquals(p.sign(f) * p.sign(g), p.sign(f.times(g)));
    assertEquals(p.compare(f, g), -p.compare(g, f));
    assertEquals(0, p.sign(f.times(poly("r^2 - 2"))));
    Interval i = p.within(f, BigFraction.of(1, 1000));
    assertTrue(Rationals.compare(i.width(), BigFraction.of(1, 1000)) <= 0);
    if (i.sign().isPresent()) {
      assertEquals(i.sign().getAsInt(), p.sign(f));
    }
    assertTrue(p.compare(f, Polynomial.constant(RING, p.floor(f))) >= 0);
    assertTrue(p.compare(f, Polynomial.constant(RING, p.ceil(f))) <= 0);
  }

  private static Polynomial drop(Polynomial p) {
    Polynomial zero = Polynomial.zero(RING);
    return p.substitute(0, zero).substitute(4, zero);
  }
}
