package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.exact.Chain.Rule;

class ChainTest {
  private static final Variables RING = new Variables(List.of("x", "y", "z", "u"));

  private static Polynomial poly(String text) {
    return Read.polynomial(RING, text);
  }

  /** The curve t -> (t^2, t^3, t^5, 1/t) with t itself no coordinate; x is free. */
  private static final Chain CURVE =
      new Chain(
          RING,
          List.of(
              new Rule(2, poly("z - x*y")),
              new Rule(3, poly("x^2*u - y")),
              new Rule(1, poly("y^2 - x^3"))));

  private static List<BigFraction> point(BigFraction t) {
    return List.of(t.pow(2), t.pow(3), t.pow(5), t.reciprocal());
  }

  static LongStream seeds() {
    return Sample.seeds(150);
  }

  @Test
  void shapeOfTheCurve() {
    assertEquals(List.of(0), CURVE.freeVariables());
    assertEquals(1, CURVE.dimension());
    assertEquals(1, CURVE.tower().size());
    assertEquals(List.of(poly("x^2")), CURVE.initials());
    assertEquals(4, Chain.free(RING).dimension());
    assertFalse(Chain.free(RING).vanishes(poly("x")));
    assertTrue(Chain.free(RING).vanishes(poly("x - x")));
  }

  @Test
  void equationsOfTheCurveVanish() {
    for (String f : List.of("x*u^2 - 1", "z*u - x^2", "z^2 - x^5", "y*u^3 - 1", "z - x*y")) {
      assertTrue(CURVE.vanishes(poly(f)), f);
      assertFalse(CURVE.vanishes(poly(f).plus(Polynomial.one(RING))), f);
    }
  }

  /** What vanishes at more points of the curve than its degree allows vanishes on all of it. */
  @ParameterizedTest
  @MethodSource("seeds")
  void zeroTestAgreesWithTheParametrisation(long seed) {
    Sample s = new Sample(seed);
    Polynomial p = s.polynomial(RING, 4, 3, 3);
    Polynomial relation =
        List.of(poly("x*u^2 - 1"), poly("y^2 - x^3"), poly("z*u - x^2")).get(s.below(3));
    Polynomial q = s.below(2) == 0 ? p : p.times(relation);
    boolean zero = true;
    for (int t = 1; t <= 20; t++) {
      zero &= q.at(point(BigFraction.of(t))).signum() == 0;
    }
    assertEquals(zero, CURVE.vanishes(q), q.toString());
  }

  /** Reduction multiplies all by one common factor that vanishes only with an initial. */
  @ParameterizedTest
  @MethodSource("seeds")
  void reducedListsStayProportional(long seed) {
    Sample s = new Sample(seed);
    List<Polynomial> p =
        List.of(s.polynomial(RING, 4, 4, 3), s.polynomial(RING, 4, 4, 3), Polynomial.one(RING));
    List<Polynomial> r = CURVE.reduced(p);
    List<BigFraction> at = point(BigFraction.of(2 + s.below(5), 1 + s.below(3)));
    BigFraction factor = r.get(2).at(at);
    assertFalse(factor.signum() == 0);
    for (int k = 0; k < 2; k++) {
      assertEquals(p.get(k).at(at).multiply(factor), r.get(k).at(at));
      assertTrue(r.get(k).degree(1) < 2);
      assertFalse(r.get(k).contains(2) || r.get(k).contains(3));
    }
  }
}
