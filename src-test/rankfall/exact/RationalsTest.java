package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;

class RationalsTest {
  @Test
  void orderIsThatOfTheNumbersForEverySign() {
    for (int a = -6; a <= 6; a++) {
      for (int b = -6; b <= 6; b++) {
        for (int d : new int[] {-7, -2, 1, 3}) {
          int expected = Integer.compare(a * Integer.signum(d), b * Integer.signum(d));
          assertEquals(expected, Rationals.compare(BigFraction.of(a, d), BigFraction.of(b, d)));
        }
      }
    }
  }

  @Test
  void roundingAgreesWithDecimals() {
    for (int n = -9; n <= 9; n++) {
      BigDecimal v = BigDecimal.valueOf(n).divide(BigDecimal.valueOf(4));
      BigInteger floor = v.setScale(0, RoundingMode.FLOOR).toBigInteger();
      BigInteger ceil = v.setScale(0, RoundingMode.CEILING).toBigInteger();
      assertEquals(floor, Rationals.floor(BigFraction.of(-n, -4)));
      assertEquals(ceil, Rationals.ceil(BigFraction.of(n, 4)));
    }
  }

  @Test
  void textHasAPositiveDenominatorInLowestTerms() {
    assertEquals("-1/3", Rationals.text(BigFraction.of(2, -6)));
    assertEquals("2/3", Rationals.text(BigFraction.of(1, -3).add(1)));
    assertEquals("0", Rationals.text(BigFraction.ZERO));
    assertEquals("-4", Rationals.text(BigFraction.of(-8, 2)));
  }
}
