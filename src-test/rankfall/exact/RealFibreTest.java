package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import rankfall.exact.Chain.Rule;

class RealFibreTest {
  private static final Variables RING = new Variables(List.of("t", "x", "y", "z"));

  private static Polynomial poly(String text) {
    return Read.polynomial(RING, text);
  }

  private static Rule rule(String variable, String equation) {
    return new Rule(RING.index(variable), poly(equation));
  }

  private static List<RealSample> above(Chain chain, BigFraction t) {
    List<BigFraction> point = new java.util.ArrayList<>(Collections.nCopies(4, BigFraction.ZERO));
    point.set(0, t);
    return new RealFibre(chain, Map.of()).above(point);
  }

  /** x^2 = t, y^2 = x + 1, z = 1/y: no sheet left of 0, two from 0 to 1 ... and four. */
  private static Chain tower() {
    return new Chain(
        RING, List.of(rule("z", "y*z - 1"), rule("x", "x^2 - t"), rule("y", "y^2 - x - 1")));
  }

  /**
   * The real points number as elementary algebra says: x = +-sqrt(t), and y is real where x is -1
   * or more; at t = 1 the branch x = -1 has y = 0, at which 1/y has a pole.
   */
  @Test
  void sheetsAreCounted() {
    assertEquals(0, above(tower(), BigFraction.of(-1)).size());
    assertEquals(4, above(tower(), BigFraction.of(1, 2)).size());
    assertEquals(2, above(tower(), BigFraction.ONE).size());
    assertEquals(2, above(tower(), BigFraction.of(2)).size());
  }

  /** At each point all rules hold, and signs agree with decimals of the coordinates. */
  @Test
  void pointsSatisfyTheRules() {
    Random random = new Random(3);
    for (int k = 0; k < 12; k++) {
      BigFraction t = BigFraction.of(random.nextInt(40), 1 + random.nextInt(9));
      for (RealSample p : above(tower(), t)) {
        for (Rule r : tower().rules()) {
          assertEquals(0, p.sign(r.equation()), t + " " + p);
        }
        List<AlgebraicNumber> x = p.coordinates();
        for (String text : List.of("x*y - z", "x^2*z - 2*y + 1", "y - z")) {
          double value = value(text, x);
          if (Math.abs(value) > 1e-6) {
            assertEquals(Math.signum(value), p.sign(poly(text)), text + " at " + p);
          }
        }
      }
    }
  }

  private static double value(String text, List<AlgebraicNumber> x) {
    double sum = 0;
    for (Term m : poly(text).terms()) {
      double product = m.coefficient().doubleValue();
      for (int v = 0; v < 4; v++) {
        product *= Math.pow(x.get(v).decimal(12).doubleValue(), m.exponents().get(v));
      }
      sum += product;
    }
    return sum;
  }

  /** The circle over 3/5 has the rational points (3/5, 4/5) and (3/5, -4/5). */
  @Test
  void rationalPointsAreRational() {
    Chain circle =
        new Chain(RING, List.of(rule("x", "x"), rule("z", "z"), rule("y", "y^2 + t^2 - 1")));
    List<RealSample> points = above(circle, BigFraction.of(3, 5));
    assertEquals(2, points.size());
    assertTrue(points.stream().allMatch(p -> p.rationalCoordinates().isPresent()));
    assertEquals("[3/5, 0, -4/5, 0]", points.get(0).toString());
    assertTrue(above(circle, BigFraction.of(1, 2)).get(0).rationalCoordinates().isEmpty());
  }
}
