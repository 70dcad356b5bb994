package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class AssignmentsTest {
  @Test
  void valuesAreExactAndInTheOrderOfTheCall() {
    Map<String, BigFraction> point = Assignments.of(List.of("b=0.25", "a=-3/2"));
    assertEquals(Map.of("a", BigFraction.of(-3, 2), "b", BigFraction.of(1, 4)), point);
    assertEquals(List.of("b", "a"), List.copyOf(point.keySet()));
  }

  @Test
  void aFamilyWithoutParametersWantsNoValue() {
    assertTrue(Assignments.of(List.of()).isEmpty());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "a=1 a=1 b=2 | 'a' is given twice",
        "a=1 b | 'b' is no value; write for example a=3/2",
        "=1 | '=1' is no value; write for example a=3/2",
        "a=x b=1 | 'x' is no rational number for 'a'; write for example 3/2",
        "a=1/0 b=1 | '1/0' is no rational number for 'a'; write for example 3/2"
      })
  void aWrongCallIsExplained(String call, String message) {
    IllegalArgumentException wrong =
        assertThrows(
            IllegalArgumentException.class, () -> Assignments.of(List.of(call.split(" "))));
    assertEquals(message, wrong.getMessage());
  }
}
