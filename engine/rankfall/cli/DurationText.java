package rankfall.cli;

import java.time.Duration;
import java.time.temporal.ChronoUnit;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads a length of time such as {@code 60s}, {@code 5m} or {@code 1h}. */
final class DurationText implements ITypeConverter<Duration> {
  private static final Pattern FORM = Pattern.compile("([0-9]{1,6})(ms|[smh])");
  private static final Map<String, ChronoUnit> UNITS =
      Map.of(
          "ms", ChronoUnit.MILLIS,
          "s", ChronoUnit.SECONDS,
          "m", ChronoUnit.MINUTES,
          "h", ChronoUnit.HOURS);

  @Override
  public Duration convert(String text) {
    Matcher matcher = FORM.matcher(text);
    if (!matcher.matches() || Integer.parseInt(matcher.group(1)) == 0) {
      throw new TypeConversionException(
          "'" + text + "' is no length of time; write for example 60s, 5m or 1h");
    }
    return Duration.of(Integer.parseInt(matcher.group(1)), UNITS.get(matcher.group(2)));
  }
}
