package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class ChainPointTest {
  private static final Variables RING = new Variables(List.of("x", "y", "z"));

  private static Chain.Rule rule(Variables ring, String variable, String equation) {
    return new Chain.Rule(ring.index(variable), Read.polynomial(ring, equation));
  }

  private static Chain chain(Chain.Rule... rules) {
    return new Chain(rules[0].equation().variables(), List.of(rules));
  }

  private static String point(Chain chain, boolean realOnly) {
    return ChainPoint.of(chain, Map.of(), realOnly, List.of()).map(List::toString).orElse("none");
  }

  static LongStream seeds() {
    return Sample.seeds(60);
  }

  /** The sixth roots of unity: cos 60 degrees is 1/2, sin 60 degrees is half the root of 3. */
  @Test
  void sixthRootOfUnity() {
    Variables m = new Variables(List.of("m"));
    Chain c = chain(rule(m, "m", "m^2 - m + 1"));
    assertEquals("[root(x^2 - x + 1, 0.50000000 + 0.86602540*i)]", point(c, false));
    assertEquals("none", point(c, true));
  }

  @Test
  void coordinatesFitTogether() {
    Chain.Rule unit = rule(RING, "x", "x^2 + 1");
    assertEquals(
        "[root(x^2 + 1, 0.00000000 + 1.00000000*i), "
            + "root(x^2 + 1, 0.00000000 - 1.00000000*i), -1]",
        point(chain(rule(RING, "y", "y + x"), rule(RING, "z", "z + 1"), unit), false));
    assertEquals(
        "[root(x^2 + 1, 0.00000000 + 1.00000000*i), "
            + "root(x^4 + 1, 0.70710678 + 0.70710678*i), "
            + "root(x^4 + 1, 0.70710678 - 0.70710678*i)]",
        point(chain(rule(RING, "z", "y*z - 1"), unit, rule(RING, "y", "y^2 - x")), false)
            .replace("-0.70710678 - 0.70710678*i", "0.70710678 + 0.70710678*i")
            .replace("-0.70710678 + 0.70710678*i", "0.70710678 - 0.70710678*i"));
  }

  @Test
  void unrelatedRealRoots() {
    Chain c =
        chain(rule(RING, "z", "z - x*y"), rule(RING, "x", "x^2 - 2"), rule(RING, "y", "y^2 - 3"));
    List<RealZeros.Condition> positive =
        List.of(
            new RealZeros.Condition(Read.polynomial(RING, "x"), RealZeros.Relation.POSITIVE),
            new RealZeros.Condition(Read.polynomial(RING, "-z"), RealZeros.Relation.POSITIVE));
    assertEquals(
        "[root(x^2 - 2, 1.41421356), root(x^2 - 3, -1.73205081), root(x^2 - 6, -2.44948974)]",
        ChainPoint.of(c, Map.of(), true, positive).orElseThrow().toString());
    List<RealZeros.Condition> impossible = new ArrayList<>(positive);
    impossible.add(
        new RealZeros.Condition(Read.polynomial(RING, "z^2 - 6"), RealZeros.Relation.NON_ZERO));
    assertEquals(Optional.empty(), ChainPoint.of(c, Map.of(), true, impossible));
  }

  /** A number of the ring is the root that is meant, whichever comes first. */
  @ParameterizedTest
  @ValueSource(ints = {-1, 1})
  void numbersKeepTheirSign(int sign) {
    NumberFieldTower tower =
        NumberFieldTower.rational()
            .with(
                "r",
                List.of(BigFraction.of(-2), BigFraction.ZERO, BigFraction.ONE),
                BigFraction.of(sign))
            .tower();
    Variables ring = new Variables(List.of("x", "r"), 1);
    Chain c = chain(rule(ring, "x", "x^2 - r"), rule(ring, "r", "r^2 - 2"));
    Chain upward = new Chain(ring, List.of(c.rules().get(1), c.rules().get(0)));
    List<ComplexNumber> p =
        ChainPoint.of(upward, Map.of(1, tower.roots().get(0)), false, List.of()).orElseThrow();
    assertEquals(
        sign > 0
            ? "[root(x^4 - 2, 1.18920712), root(x^2 - 2, 1.41421356)]"
            : "[root(x^4 - 2, 0.00000000 + 1.18920712*i), root(x^2 - 2, -1.41421356)]",
        p.toString());
  }

  /** Vieta: the boxes hold the sum of the roots; as many are real as Descartes' method finds. */
  @ParameterizedTest
  @MethodSource("seeds")
  void rootsSumUpToTheSecondCoefficient(long seed) {
    Sample s = new Sample(seed);
    Variables x = new Variables(List.of("x"));
    Polynomial p =
        Factoring.squareFreePart(
            s.nonConstant(x, 5, 9, 30).plus(Polynomial.variable(x, 0).pow(1 + s.below(10))));
    if (p.isConstant()) {
      return;
    }
    Univariate f = Univariate.of(p);
    ComplexRoots roots = ComplexRoots.of(f);
    assertEquals(f.degree(), roots.boxes().size());
    ComplexBox sum = ComplexBox.of(BigFraction.ZERO);
    for (ComplexBox b : roots.refined().boxes()) {
      sum = sum.plus(b);
    }
    BigFraction expected =
        f.degree() == 0
            ? BigFraction.ZERO
            : BigFraction.of(f.coefficient(f.degree() - 1).negate(), f.coefficient(f.degree()));
    assertTrue(sum.re().contains(expected), p.toString());
    assertTrue(sum.im().contains(BigFraction.ZERO), p.toString());
    assertTrue(Rationals.compare(sum.re().width(), BigFraction.of(1, 1000)) < 0);
    assertEquals(
        RealRoots.of(p).count(), roots.boxes().stream().filter(ComplexBox::isReal).count());
  }

  /** Mignotte's polynomial has two real roots about 1/5 that differ by less than a thousandth. */
  @Test
  void closeRootsAreToldApart() {
    Variables x = new Variables(List.of("x"));
    Polynomial p = Read.polynomial(x, "x^9 - 2*(5*x - 1)^2");
    ComplexRoots roots = ComplexRoots.of(Univariate.of(p));
    assertEquals(9, roots.boxes().size());
    assertEquals(3, roots.boxes().stream().filter(ComplexBox::isReal).count());
  }
}
