package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Map;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import rankfall.published.Quantity.Root;

/** The evaluator of the published tables: exact, and strict about what it reads. */
class ExactTextTest {
  private static final Root ROOT_TWO =
      new Root("sqrt(2)", List.of(BigFraction.of(2), BigFraction.ZERO));

  /** w^3 = w + 1. */
  private static final Root CUBIC =
      new Root("w", List.of(BigFraction.ONE, BigFraction.ONE, BigFraction.ZERO));

  private static final Map<String, Quantity> NAMES =
      Map.of(
          "a", Quantity.of(BigFraction.of(3)),
          "g12", Quantity.of(BigFraction.of(-1, 2)),
          "\u03c91", Quantity.of(BigFraction.of(5)),
          "cos(t)", Quantity.of(BigFraction.of(3, 5)),
          "sin(t)", Quantity.of(BigFraction.of(4, 5)),
          "sqrt(2)", Quantity.of(ROOT_TWO),
          "w", Quantity.of(CUBIC));

  @ParameterizedTest
  @CsvSource({
    "-2^2, -4",
    "2*-a, -6",
    "a - 1 - 1, 1",
    "a/2/3, 1/2",
    "a^-2, 1/9",
    "a^(-1), 1/3",
    "-(a + g12)^2, -25/4",
    "\u03c91*a, 15",
    "cos(t)^2 + sin( t )^2, 1",
    "sqrt(2)^4, 4",
    "(a - sqrt(2))*(a + sqrt(2)), 7",
    "w^3 - w, 1",
    "w^5 - w^4, 1",
    "0*w, 0"
  })
  void valuesAreExact(String text, String value) {
    assertEquals(Quantity.of(BigFraction.parse(value)), ExactText.value(text, NAMES));
  }

  /** w^5 - w^4 = 1 for the root of w^3 = w + 1, as (w^3 - w - 1)(w^2 - w + 1) = w^5 - w^4 - 1. */
  @Test
  void irrationalNumbersAreNoRationalOnes() {
    assertNotEquals(Quantity.of(BigFraction.of(7, 5)), ExactText.value("sqrt(2)", NAMES));
    assertNotEquals(ExactText.value("w", NAMES), ExactText.value("w^2", NAMES));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"", "2 3", "2a", "(a", "a)", "a +", "b", "a..2", "tan(t)", "cos(t", "a^w"})
  void otherTextsAreRefused(String text) {
    assertThrows(IllegalArgumentException.class, () -> ExactText.value(text, NAMES));
  }

  @ParameterizedTest
  @ValueSource(strings = {"1/0", "1/(a - 3)", "1/sqrt(2)"})
  void divisionsThatItCannotDoAreRefused(String text) {
    assertThrows(ArithmeticException.class, () -> ExactText.value(text, NAMES));
  }
}
