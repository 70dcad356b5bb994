package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class AlgebraicNumberTest {
  private static final Variables X = new Variables(List.of("x"));

  private static List<AlgebraicNumber> roots(String text) {
    return AlgebraicNumber.rootsOf(Read.polynomial(X, text));
  }

  @Test
  void textIsThatOfTheContract() {
    assertEquals("root(x^2 - 2, 1.41421356)", roots("x^2 - 2").get(1).toString());
    assertEquals("root(x^2 - 2, -1.41421356)", roots("x^2 - 2").get(0).toString());
    assertEquals("root(x^3 - x - 1, 1.32471796)", roots("x^3 - x - 1").get(0).toString());
    assertEquals("-3/2", roots("2*x + 3").get(0).toString());
    assertEquals("0", AlgebraicNumber.of(BigFraction.ZERO).toString());
    assertEquals("5", AlgebraicNumber.of(BigFraction.of(5)).toString());
    assertEquals("-1/3", AlgebraicNumber.of(BigFraction.of(1, -3)).toString());
  }

  @Test
  void decimalsGoOnUntilTheyTellTheRoot() {
    List<AlgebraicNumber> r = roots("10000000000000000000000000*x^2 - 2");
    assertEquals("root(5000000000000000000000000*x^2 - 1, -0.0000000000004)", r.get(0).toString());
    assertEquals("root(5000000000000000000000000*x^2 - 1, 0.0000000000004)", r.get(1).toString());
  }

  @Test
  void equalNumbersAreEqualWhateverPolynomialTheyCameFrom() {
    AlgebraicNumber a = roots("x^2 - 2").get(1);
    AlgebraicNumber b = roots("(x^2 - 2)^2*(x - 5)*(x^2 - 3)").get(2);
    assertEquals(a, b);
    assertEquals(a.hashCode(), b.hashCode());
    assertNotEquals(a, roots("x^2 - 2").get(0));
  }

  @Test
  void floorCeilAndDecimal() {
    AlgebraicNumber a = roots("x^2 - 2").get(0);
    assertEquals(BigInteger.valueOf(-2), a.floor());
    assertEquals(BigInteger.valueOf(-1), a.ceil());
    assertEquals("-1.4142", a.decimal(4).toPlainString());
    AlgebraicNumber n = AlgebraicNumber.of(BigFraction.of(-3));
    assertEquals(n.floor(), n.ceil());
    assertEquals("0.13", AlgebraicNumber.of(BigFraction.of(1, 8)).decimal(2).toPlainString());
  }

  @Test
  void signOfAMultipleOfTheMinimalPolynomialIsZero() {
    AlgebraicNumber a = roots("x^3 - x - 1").get(0);
    assertEquals(0, a.signOf(Read.polynomial(X, "(x^3 - x - 1)*(x + 4)")));
    assertEquals(1, a.signOf(Read.polynomial(X, "10000*x - 13247")));
    assertEquals(-1, a.signOf(Read.polynomial(X, "10000*x - 13248")));
  }

  @Test
  void nearestNeedsADecision() {
    Polynomial p = Read.polynomial(X, "x^2 - 2");
    assertEquals(Optional.empty(), AlgebraicNumber.nearest(p, BigFraction.ZERO));
    assertEquals(roots("x^2 - 2").get(1), AlgebraicNumber.nearest(p, BigFraction.ONE).get());
  }

  @Test
  void betweenIsStrictlyBetweenAndShort() {
    AlgebraicNumber a = roots("x^2 - 2").get(1);
    AlgebraicNumber b = roots("x^2 - 3").get(1);
    assertEquals(BigFraction.of(3, 2), AlgebraicNumber.between(b, a));
    assertThrows(IllegalArgumentException.class, () -> AlgebraicNumber.between(a, a));
  }

  static LongStream seeds() {
    return Sample.seeds(200);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void orderIsThatOfTheDecimalsAndSignsAgree(long seed) {
    Sample s = new Sample(seed);
    Polynomial f = s.nonConstant(X, 5, 6, 6);
    Polynomial g = s.nonConstant(X, 5, 4, 6);
    List<AlgebraicNumber> r = AlgebraicNumber.rootsOf(f.times(g));
    assertEquals(RealRoots.of(f.times(g)).count(), r.size());
    for (int k = 0; k < r.size(); k++) {
      AlgebraicNumber a = r.get(k);
      assertEquals(0, a.signOf(f.times(g)));
      assertEquals(0, a.signOf(f) * a.signOf(g));
      assertTrue(a.compareTo(BigFraction.of(a.floor())) >= 0);
      assertTrue(a.compareTo(BigFraction.of(a.ceil())) <= 0);
      assertTrue(a.ceil().subtract(a.floor()).bitLength() <= 1);
      if (k > 0) {
        assertTrue(r.get(k - 1).compareTo(a) < 0);
        BigFraction m = AlgebraicNumber.between(a, r.get(k - 1));
        assertTrue(a.compareTo(m) > 0 && r.get(k - 1).compareTo(m) < 0);
      }
      Polynomial h = s.polynomial(X, 4, 5, 6);
      double v = h.at(List.of(a.within(BigFraction.of(1, 1L << 60)).middle())).doubleValue();
      if (Math.abs(v) > 1e-6) {
        assertEquals((int) Math.signum(v), a.signOf(h));
      }
    }
  }
}
