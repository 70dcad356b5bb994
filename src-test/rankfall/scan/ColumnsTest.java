package rankfall.scan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigInteger;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Columns and the decimals in them. */
final class ColumnsTest {
  @Test
  void allColumnsStandInTheOrderOfTheContract() {
    assertEquals(
        List.of(
            "a",
            "cos(t)",
            "a_decimal",
            "cos(t)_decimal",
            "status",
            "dimension",
            "rank",
            "plus",
            "minus",
            "zero",
            "stratum",
            "region",
            "type"),
        Columns.all(List.of("a", "cos(t)")).header());
  }

  @Test
  void chosenColumnsKeepTheOrderOfTheChoice() {
    assertEquals(
        List.of("type", "a", "rank"),
        Columns.of(List.of("a", "b"), List.of("type", "a", "rank")).header());
    assertThrows(
        IllegalArgumentException.class, () -> Columns.of(List.of("a"), List.of("a", "colour")));
    assertThrows(IllegalArgumentException.class, () -> Columns.of(List.of("a"), List.of("a", "a")));
  }

  @ParameterizedTest
  @CsvSource({
    "0, 1, 0",
    "-3, 2, -1.5",
    "1, 3, 0.333333333333333",
    "-2, 3, -0.666666666666667",
    "100, 1, 100",
    "1, 1000000000000, 0.000000000001",
    "123456789012345678, 1, 1.23456789012346E+17"
  })
  void decimalsHaveFifteenDigits(String n, String d, String text) {
    assertEquals(text, DecimalText.of(BigFraction.of(new BigInteger(n), new BigInteger(d))));
  }
}
