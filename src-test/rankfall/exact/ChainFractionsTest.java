package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;

class ChainFractionsTest {
  private static final Variables RING = new Variables(List.of("a", "b", "s", "t"));
  private final Polynomial a = Polynomial.variable(RING, 0);
  private final Polynomial b = Polynomial.variable(RING, 1);
  private final Polynomial s = Polynomial.variable(RING, 2);
  private final Polynomial t = Polynomial.variable(RING, 3);
  private final Polynomial one = Polynomial.one(RING);

  private Polynomial number(long k) {
    return Polynomial.constant(RING, k);
  }

  private final Chain roots =
      new Chain(
          RING,
          List.of(
              new Chain.Rule(2, s.times(s).minus(number(2))),
              new Chain.Rule(3, t.times(t).minus(number(3)))));

  @Test
  void rootsLeaveTheDenominator() {
    assertEquals("s/2", ChainFractions.canonical(roots, one, s).toString());
    // 1/(sqrt 2 + sqrt 3) = sqrt 3 - sqrt 2
    assertEquals("-s + t", ChainFractions.canonical(roots, one, s.plus(t)).toString());
    assertEquals("(a + s)/(a^2 - 2)", ChainFractions.canonical(roots, one, a.minus(s)).toString());
  }

  @Test
  void equalQuotientsHaveOneForm() {
    Polynomial d = a.times(s).plus(t.times(b)).plus(one);
    Polynomial k = s.times(t).plus(a);
    assertEquals(
        ChainFractions.canonical(roots, b, d),
        ChainFractions.canonical(roots, b.times(k), d.times(k)));
    RationalFunction inverse = ChainFractions.canonical(roots, one, d);
    assertEquals(
        "1", ChainFractions.canonical(roots, inverse.times(RationalFunction.of(d))).toString());
  }

  /** The tower s^2 = 2, t with (a*s)*t^3 = t + 1: an initial that is not 1. */
  @Test
  void initialsMayHoldTheTower() {
    Chain chain =
        new Chain(
            RING,
            List.of(
                roots.rules().get(0),
                new Chain.Rule(3, a.times(s).times(t.pow(3)).minus(t).minus(one))));
    Polynomial d = t.times(t).plus(s).plus(b);
    RationalFunction inverse = ChainFractions.canonical(chain, one, d);
    assertEquals(List.of(0, 1), inverse.denominator().support());
    assertEquals(
        "1", ChainFractions.canonical(chain, inverse.times(RationalFunction.of(d))).toString());
  }

  @Test
  void zeroDenominatorIsRefused() {
    assertThrows(
        ArithmeticException.class,
        () -> ChainFractions.canonical(roots, one, s.times(s).minus(number(2))));
  }

  @Test
  void commonDivisorOverTheTower() {
    // a^2 - 2 and a^2 + (1 - s) a - s share a - s
    Polynomial f = a.times(a).minus(number(2));
    Polynomial g = a.times(a).plus(a).minus(a.times(s)).minus(s);
    assertEquals("a - s", ChainFractions.gcd(roots, f, g, 0).toString());
    assertEquals("1", ChainFractions.gcd(roots, f, a.minus(t), 0).toString());
  }
}
