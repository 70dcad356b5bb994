package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class FactoringTest {
  private static final Variables ABCD = new Variables(List.of("a", "b", "c", "d"));

  private static Polynomial poly(String text) {
    return Read.polynomial(ABCD, text);
  }

  private static Polynomial product(Factorization d) {
    Polynomial p = Polynomial.constant(ABCD, d.unit().getNumerator());
    for (Factorization.Factor f : d.factors()) {
      p = p.times(f.base().pow(f.multiplicity()));
    }
    return p;
  }

  static LongStream seeds() {
    return Sample.seeds(150);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void productOfThreeIsSplitAndMultipliesBack(long seed) {
    Sample s = new Sample(seed);
    Polynomial g = s.nonConstant(ABCD, 4, 2, 4);
    Polynomial h = s.nonConstant(ABCD, 4, 3, 4);
    Polynomial f = g.times(g).times(h);
    Factorization d = Factoring.overRationals(f);
    assertEquals(f, product(d));
    assertTrue(
        d.factors().stream().mapToInt(Factorization.Factor::multiplicity).sum() >= 3,
        "(" + g + ")^2*(" + h + ") gave " + d);
    for (Factorization.Factor x : d.factors()) {
      assertEquals(x.base(), x.base().primitive());
      assertEquals(List.of(x.base()), Factoring.irreducible(x.base()));
    }
    assertEquals(
        d.factors().size(),
        d.factors().stream().map(Factorization.Factor::base).distinct().count());
    assertEquals(d, Factoring.overRationals(f));
  }

  /**
   * A polynomial on which the factoring library is known to fail for some of its random choices.
   */
  @RepeatedTest(40)
  void unluckyChoicesDoNotShow() {
    Polynomial f = poly("a + b + c + 5*a*d + 3*b*d + 4*c*d + 6*a*d^2 + 2*b*d^2 + 3*c*d^2");
    assertEquals(f, product(Factoring.overRationals(f)));
    assertEquals(List.of(f.primitive()), Factoring.irreducible(f));
  }

  @Test
  void unitsAndText() {
    assertEquals("-8*a^2*(b - c)", Factoring.overRationals(poly("8*a^2*c - 8*a^2*b")).toString());
    assertEquals("-a*b", Factoring.overRationals(poly("-a*b")).toString());
    assertEquals("6", Factoring.overRationals(poly("6")).toString());
    assertEquals(BigFraction.of(-1), Factoring.overRationals(poly("b - a")).unit());
    assertThrows(ArithmeticException.class, () -> Factoring.overRationals(poly("a - a")));
  }

  /** The library leaves a power of a single variable whole. */
  @Test
  void powersOfVariablesAreSplit() {
    Factorization d = Factoring.overRationals(poly("16*a^3"));
    assertEquals(List.of(new Factorization.Factor(poly("a"), 3)), d.factors());
    assertEquals("-2*b*d^5", Factoring.overRationals(poly("-2*b*d^5")).toString());
    assertEquals(2, Factoring.overRationals(poly("-2*b*d^5")).factors().size());
  }

  @Test
  void irreducibleOverTheRationalsStaysWhole() {
    for (String text :
        List.of("a^2 - 2*b^2", "a^2 + b^2", "a^4 - 10*a^2 + 1", "a*d - b*c", "a^4 + b^4")) {
      assertEquals(1, Factoring.irreducible(poly(text)).size(), text);
    }
    assertEquals(2, Factoring.irreducible(poly("a^4 + 4*b^4")).size());
    assertEquals(6, Factoring.irreducible(poly("a^12 - 1")).size());
  }
}
