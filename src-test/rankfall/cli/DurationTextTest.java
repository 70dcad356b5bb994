package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.time.Duration;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import picocli.CommandLine.TypeConversionException;

final class DurationTextTest {
  @ParameterizedTest
  @CsvSource({"1s, PT1S", "60s, PT60S", "5m, PT5M", "1h, PT1H", "90m, PT90M", "20ms, PT0.02S"})
  void aNumberAndAUnitAreALength(String text, Duration expected) {
    assertEquals(expected, new DurationText().convert(text));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "5", "m", "0s", "-1s", "1.5h", "5 m", "5M", "1d", "99999999s"})
  void anythingElseIsRefused(String text) {
    assertThrows(TypeConversionException.class, () -> new DurationText().convert(text));
  }
}
