package rankfall.cli;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.spec.ExactNumber;

/** Reads {@code a=1 b=-3/2} of the command line against the parameters of a family. */
final class Assignments {
  private Assignments() {}

  /**
   * One exact value for each parameter.
   *
   * @param texts as written, {@code name=value} each
   * @param parameters of the family, in order
   * @return values by name, in the order of the parameters
   * @throws IllegalArgumentException if a text has another form, a name is unknown, missing or
   *     given twice, or a value is no rational number; the message is for the user
   */
  static Map<String, BigFraction> of(List<String> texts, List<String> parameters) {
    Map<String, BigFraction> given = new LinkedHashMap<>();
    for (String text : texts) {
      int sign = text.indexOf('=');
      if (sign < 1) {
        throw new IllegalArgumentException("'" + text + "' is no value; write for example a=3/2");
      }
      String name = text.substring(0, sign).strip();
      if (!parameters.contains(name)) {
        throw new IllegalArgumentException(
            "'" + name + "' is no parameter of the family; it has " + listed(parameters));
      }
      if (given.put(name, value(name, text.substring(sign + 1))) != null) {
        throw new IllegalArgumentException("'" + name + "' is given twice");
      }
    }
    Map<String, BigFraction> ordered = new LinkedHashMap<>();
    for (String parameter : parameters) {
      if (!given.containsKey(parameter)) {
        throw new IllegalArgumentException("no value for the parameter '" + parameter + "'");
      }
      ordered.put(parameter, given.get(parameter));
    }
    return ordered;
  }

  private static BigFraction value(String name, String text) {
    Optional<BigFraction> value = ExactNumber.of(text);
    return value.orElseThrow(
        () ->
            new IllegalArgumentException(
                "'" + text + "' is no rational number for '" + name + "'; write for example 3/2"));
  }

  private static String listed(List<String> parameters) {
    return parameters.isEmpty() ? "none" : String.join(", ", parameters);
  }
}
