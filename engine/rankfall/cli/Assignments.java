package rankfall.cli;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.spec.ExactNumber;

/** Reads {@code a=1 b=-3/2} of the command line. */
final class Assignments {
  private Assignments() {}

  /**
   * Exact values by name.
   *
   * @param texts as written, {@code name=value} each
   * @return values by name, in the order of the texts
   * @throws IllegalArgumentException if a text has another form, a name is given twice, or a value
   *     is no rational number; the message is for the user
   */
  static Map<String, BigFraction> of(List<String> texts) {
    Map<String, BigFraction> given = new LinkedHashMap<>();
    for (String text : texts) {
      int sign = text.indexOf('=');
      if (sign < 1) {
        throw new IllegalArgumentException("'" + text + "' is no value; write for example a=3/2");
      }
      String name = text.substring(0, sign).strip();
      if (given.put(name, value(name, text.substring(sign + 1))) != null) {
        throw new IllegalArgumentException("'" + name + "' is given twice");
      }
    }
    return given;
  }

  private static BigFraction value(String name, String text) {
    Optional<BigFraction> value = ExactNumber.of(text);
    return value.orElseThrow(
        () ->
            new IllegalArgumentException(
                "'" + text + "' is no rational number for '" + name + "'; write for example 3/2"));
  }
}
