package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class PolynomialTest {
  private static final Variables ABC = new Variables(List.of("a", "b", "c"));

  private static Polynomial poly(String text) {
    return Read.polynomial(ABC, text);
  }

  static LongStream seeds() {
    return Sample.seeds(200);
  }

  @Test
  void termsStandInDescendingGradedLexicographicOrder() {
    assertEquals(
        "a^2 + a*b + a*c + b^2 + b*c + c^2 + a + b + c + 1",
        poly("1 + c + b + a + c^2 + b*c + b^2 + a*c + a*b + a^2").toString());
    assertEquals("a*c^2 + b^3", poly("b^3 + a*c^2").toString());
    assertEquals("-a^2 - 2*a*b + 1", poly("1 - 2*a*b - a^2").toString());
    assertEquals("0", poly("a - a").toString());
    assertEquals("1", poly("1").toString());
    assertEquals("-12", poly("-12").toString());
  }

  @Test
  void quotientsPrintInLowestTerms() {
    assertEquals(
        "(a + b)/(2*c)", RationalFunction.of(poly("a^2 - b^2"), poly("2*a*c - 2*b*c")).toString());
    assertEquals("a/b", RationalFunction.of(poly("-a"), poly("-b")).toString());
    assertEquals("-a/3", RationalFunction.of(poly("2*a"), poly("-6")).toString());
    assertEquals("1/a^2", RationalFunction.of(poly("1"), poly("a^2")).toString());
    assertEquals("1/(a - b)", RationalFunction.of(poly("-1"), poly("b - a")).toString());
  }

  @Test
  void degreesAndSupportOfEdgeCases() {
    Polynomial zero = Polynomial.zero(ABC);
    assertEquals(0, zero.totalDegree());
    assertEquals(0, zero.degree(1));
    assertEquals(0, zero.termCount());
    assertEquals(List.of(), zero.terms());
    assertEquals(List.of(zero), zero.coefficientsIn(0));
    assertEquals(5, poly("a^2*b^3 + a^4").totalDegree());
    assertEquals(List.of(0, 2), poly("a*c + 1").support());
    assertThrows(IllegalStateException.class, () -> poly("a").constantValue());
    assertThrows(IndexOutOfBoundsException.class, () -> Polynomial.variable(ABC, 3));
    assertThrows(IllegalArgumentException.class, () -> Polynomial.variable(ABC, "d"));
    assertThrows(IllegalArgumentException.class, () -> new Variables(List.of("a", "a")));
  }

  @Test
  void ringWithoutVariablesWorks() {
    Variables none = new Variables(List.of());
    Polynomial six = Polynomial.constant(none, 6);
    assertEquals("6", six.toString());
    assertEquals(six, Polynomial.of(none, six.terms()));
    assertEquals(Polynomial.constant(none, 2), six.gcd(Polynomial.constant(none, 4)));
    assertEquals(BigFraction.of(6), six.at(List.of()));
    assertEquals("3/2", RationalFunction.of(six, Polynomial.constant(none, 4)).toString());
    assertEquals(List.of(), six.support());
    assertEquals("1", six.primitive().toString());
  }

  @Test
  void differentRingsAreRefused() {
    Polynomial other = Polynomial.one(new Variables(List.of("a", "b")));
    assertThrows(IllegalArgumentException.class, () -> poly("a").plus(other));
    assertThrows(IllegalArgumentException.class, () -> poly("a").times(other));
    assertFalse(poly("1").equals(other));
  }

  @Test
  void greatIntegersSurvive() {
    BigInteger big = BigInteger.TEN.pow(60).negate();
    Polynomial p = Polynomial.constant(ABC, big);
    assertEquals(big, p.constantValue());
    assertEquals(big.pow(3), p.pow(3).constantValue());
    assertEquals(BigInteger.TEN.pow(60), p.content());
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void ringLaws(long seed) {
    Sample s = new Sample(seed);
    Polynomial p = s.polynomial(ABC, 5, 4, 5);
    Polynomial q = s.polynomial(ABC, 5, 4, 5);
    Polynomial r = s.polynomial(ABC, 5, 4, 5);
    String before = p + "|" + q + "|" + r;
    assertEquals(p.plus(q), q.plus(p));
    assertEquals(p.times(q), q.times(p));
    assertEquals(p.plus(q).plus(r), p.plus(q.plus(r)));
    assertEquals(p.times(q).times(r), p.times(q.times(r)));
    assertEquals(p.times(q.plus(r)), p.times(q).plus(p.times(r)));
    assertEquals(p.plus(q).hashCode(), q.plus(p).hashCode());
    assertTrue(p.minus(p).isZero());
    assertEquals(p.negate(), Polynomial.zero(ABC).minus(p));
    assertEquals(p.pow(3), p.times(p).times(p));
    assertTrue(p.pow(0).isOne());
    assertEquals(p, Polynomial.of(ABC, p.terms()));
    assertEquals(before, p + "|" + q + "|" + r, "an operation changed its operand");
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void evaluationIsAHomomorphism(long seed) {
    Sample s = new Sample(seed);
    Polynomial p = s.polynomial(ABC, 5, 4, 5);
    Polynomial q = s.polynomial(ABC, 5, 4, 5);
    List<BigFraction> x = s.point(3, 4);
    assertEquals(p.at(x).multiply(q.at(x)), p.times(q).at(x));
    assertEquals(p.at(x).add(q.at(x)), p.plus(q).at(x));
    List<BigFraction> moved = new ArrayList<>(x);
    moved.set(1, q.at(x));
    assertEquals(p.at(moved), p.substitute(1, q).at(x));
    List<Optional<BigFraction>> some =
        List.of(Optional.of(x.get(0)), Optional.empty(), Optional.of(x.get(2)));
    assertEquals(p.at(x), p.partlyAt(some).at(x));
    assertFalse(p.partlyAt(some).numerator().contains(0));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void divisionGcdAndContent(long seed) {
    Sample s = new Sample(seed);
    Polynomial p = s.nonZero(ABC, 4, 3, 5);
    Polynomial q = s.nonZero(ABC, 4, 3, 5);
    Polynomial r = s.nonZero(ABC, 4, 3, 5);
    assertEquals(p, p.times(q).over(q));
    Polynomial g = p.times(r).gcd(q.times(r));
    assertTrue(g.leadingCoefficient().signum() > 0);
    assertTrue(g.dividedBy(r).isPresent(), r + " divides the gcd " + g);
    Polynomial left = p.times(r).over(g);
    Polynomial right = q.times(r).over(g);
    assertTrue(left.gcd(right).isOne(), left + " and " + right);
    assertEquals(g, q.times(r).gcd(p.times(r)));
    assertEquals(p.gcd(Polynomial.zero(ABC)), p.gcd(p));
    assertEquals(BigInteger.ONE, p.primitive().content());
    assertEquals(
        p,
        p.primitive()
            .times(p.content())
            .times(BigInteger.valueOf(p.leadingCoefficient().signum())));
    if (!r.isConstant()) {
      Polynomial one = p.times(r).plus(Polynomial.one(ABC));
      assertEquals(Optional.empty(), one.dividedBy(r));
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void coefficientsAndDerivatives(long seed) {
    Sample s = new Sample(seed);
    Polynomial p = s.polynomial(ABC, 6, 5, 5);
    Polynomial q = s.polynomial(ABC, 6, 5, 5);
    for (int v = 0; v < 3; v++) {
      Polynomial sum = Polynomial.zero(ABC);
      List<Polynomial> c = p.coefficientsIn(v);
      for (int k = 0; k < c.size(); k++) {
        assertFalse(c.get(k).contains(v));
        sum = sum.plus(c.get(k).times(Polynomial.variable(ABC, v).pow(k)));
      }
      assertEquals(p, sum);
      assertEquals(
          p.times(q).derivative(v), p.derivative(v).times(q).plus(p.times(q.derivative(v))));
    }
  }

  /** The resultant vanishes at common roots, and only there (leading coefficients 1). */
  @ParameterizedTest
  @MethodSource("seeds")
  void resultantOfProductsOfLinearFactors(long seed) {
    Sample s = new Sample(seed);
    Polynomial a = Polynomial.variable(ABC, 0);
    Polynomial expected = Polynomial.one(ABC);
    Polynomial f = Polynomial.one(ABC);
    Polynomial g = Polynomial.one(ABC);
    List<Polynomial> left = List.of(tail(s), tail(s));
    List<Polynomial> right = List.of(tail(s), tail(s));
    for (int k = 0; k < 2; k++) {
      f = f.times(a.minus(left.get(k)));
      g = g.times(a.minus(right.get(k)));
      for (int j = 0; j < 2; j++) {
        expected = expected.times(left.get(k).minus(right.get(j)));
      }
    }
    Polynomial r = f.resultant(g, 0);
    assertTrue(r.equals(expected) || r.equals(expected.negate()), r + " is not " + expected);
  }

  /** The resultant vanishes exactly if there is a common factor, and it is multiplicative. */
  @ParameterizedTest
  @MethodSource("seeds")
  void resultantTellsCommonFactors(long seed) {
    Sample s = new Sample(seed);
    Polynomial f = s.nonZero(ABC, 4, 3, 4);
    Polynomial g = s.nonZero(ABC, 4, 3, 4);
    Polynomial h = s.nonZero(ABC, 3, 2, 3);
    Polynomial r = f.resultant(g, 0);
    assertFalse(r.contains(0));
    assertEquals(f.gcd(g).contains(0), r.isZero());
    Polynomial product = f.resultant(h, 0).times(g.resultant(h, 0));
    Polynomial both = f.times(g).resultant(h, 0);
    assertTrue(both.equals(product) || both.equals(product.negate()), f + ", " + g + ", " + h);
  }

  /** Sylvester's determinant of two quadratic polynomials, written out. */
  @Test
  void resultantOfTwoQuadrics() {
    Variables v = new Variables(List.of("x", "a", "b", "c", "d", "e", "f"));
    Polynomial r =
        Read.polynomial(v, "a*x^2 + b*x + c").resultant(Read.polynomial(v, "d*x^2 + e*x + f"), 0);
    assertEquals(Read.polynomial(v, "(a*f - c*d)^2 - (a*e - b*d)*(b*f - c*e)"), r);
  }

  /** Sparse polynomials on which the library's resultant fails. */
  @Test
  void resultantOfSparsePolynomials() {
    Polynomial r = poly("a^2 - 2").resultant(poly("b^2 - a*c^2"), 0);
    assertTrue(List.of("b^4 - 2*c^4", "-b^4 + 2*c^4").contains(r.toString()), r.toString());
  }

  private static Polynomial tail(Sample s) {
    return Polynomial.variable(ABC, 1)
        .times(s.integer(3))
        .plus(Polynomial.variable(ABC, 2).times(s.integer(3)));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void quotientsFormAField(long seed) {
    Sample s = new Sample(seed);
    RationalFunction f = quotient(s);
    RationalFunction g = quotient(s);
    RationalFunction h = quotient(s);
    assertEquals(f.times(g.plus(h)), f.times(g).plus(f.times(h)));
    assertEquals(f.plus(g).plus(h), f.plus(g.plus(h)));
    assertTrue(f.minus(f).isZero());
    assertTrue(f.denominator().leadingCoefficient().signum() > 0);
    assertTrue(f.numerator().gcd(f.denominator()).isOne());
    if (!f.isZero()) {
      assertEquals(g, g.over(f).times(f));
      assertEquals(f.pow(-2).times(f.pow(3)), f);
    } else {
      assertThrows(ArithmeticException.class, () -> g.over(f));
      assertThrows(ArithmeticException.class, () -> f.pow(-1));
    }
    List<BigFraction> x = s.point(3, 7);
    if (f.denominator().at(x).signum() != 0 && g.denominator().at(x).signum() != 0) {
      assertEquals(f.at(x).multiply(g.at(x)), f.times(g).at(x));
      assertEquals(f.at(x).add(g.at(x)), f.plus(g).at(x));
    }
  }

  private static RationalFunction quotient(Sample s) {
    return RationalFunction.of(s.polynomial(ABC, 3, 2, 4), s.nonZero(ABC, 3, 2, 4));
  }
}
