package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;

class NumberFieldTowerTest {
  private static List<BigFraction> polynomial(int... coefficients) {
    return Arrays.stream(coefficients).mapToObj(BigFraction::of).toList();
  }

  private static final NumberFieldTower ROOT_OF_TWO =
      NumberFieldTower.rational().with("s", polynomial(-2, 0, 1), BigFraction.of(1)).tower();

  /** x^4 - 2 = (x^2 - s)(x^2 + s) over Q(s): the real roots belong to the first factor. */
  @Test
  void factorIsChosenByTheRoot() {
    NumberFieldTower t =
        ROOT_OF_TWO.with("q", polynomial(-2, 0, 0, 0, 1), BigFraction.of(1)).tower();
    assertEquals("q^2 - s", t.chain().rules().get(1).equation().toString());
    NumberFieldTower.Extension minus =
        ROOT_OF_TWO.with("m", polynomial(-2, 0, 1), BigFraction.of(-1));
    assertEquals("-s", minus.value().toString());
    assertEquals(1, minus.tower().roots().size());
  }

  /** 1393/985 is a convergent of sqrt(2) from above, 577/408 from above, 239/169 from below. */
  @Test
  void signsNextToZero() {
    Polynomial s = Polynomial.variable(ROOT_OF_TWO.chain().variables(), 0);
    Variables ring = s.variables();
    Polynomial at = s.times(Polynomial.constant(ring, 169)).minus(Polynomial.constant(ring, 239));
    assertEquals(1, ROOT_OF_TWO.sign(at));
    assertEquals(-1, ROOT_OF_TWO.sign(at.negate()));
    assertEquals(
        -1,
        ROOT_OF_TWO.sign(
            s.times(Polynomial.constant(ring, 408)).minus(Polynomial.constant(ring, 577))));
    assertEquals(0, ROOT_OF_TWO.sign(s.times(s).minus(Polynomial.constant(ring, 2))));
    assertEquals(-1, ROOT_OF_TWO.sign(Polynomial.constant(ring, -5)));
  }
}
