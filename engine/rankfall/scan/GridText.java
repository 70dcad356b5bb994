package rankfall.scan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.spec.ExactNumber;

/**
 * Reads the axes of a call: {@code a=-2:2:401,b=1/2,c=0;1;2} is 401 values of a from -2 to 2, one
 * of b, three of c.
 */
public final class GridText {
  private GridText() {}

  /**
   * The axes of a grid.
   *
   * @param text as written
   * @return by name
   * @throws IllegalArgumentException if the text is no grid, or an axis has no step; the message is
   *     for the user
   */
  public static Map<String, Axis> grid(String text) {
    return read(
        text, "a=-2:2:401 or b=1/2 or c=0;1;2", (name, value) -> axis(name, value.split(":", -1)));
  }

  /**
   * The ranges of a sample: {@code a=-2:2,b=1/2}.
   *
   * @param text as written
   * @return by name
   * @throws IllegalArgumentException if the text holds no ranges; the message is for the user
   */
  public static Map<String, Axis> ranges(String text) {
    return read(text, "a=-2:2 or b=1/2", (name, value) -> range(name, value.split(":", -1)));
  }

  private interface Reading {
    Axis of(String name, String value);
  }

  private static Map<String, Axis> read(String text, String example, Reading reading) {
    Map<String, Axis> out = new TreeMap<>();
    for (String part : text.split(",", -1)) {
      int sign = part.indexOf('=');
      if (sign < 1) {
        throw new IllegalArgumentException("'" + part + "' is no axis; write " + example);
      }
      String name = part.substring(0, sign).strip();
      if (out.put(name, reading.of(name, part.substring(sign + 1))) != null) {
        throw new IllegalArgumentException("the axis of '" + name + "' is given twice");
      }
    }
    return out;
  }

  private static Axis axis(String name, String[] fields) {
    return switch (fields.length) {
      case 1 -> listed(name, fields[0]);
      case 3 ->
          Axis.steps(
              name, number(name, fields[0]), number(name, fields[1]), count(name, fields[2]));
      default ->
          throw new IllegalArgumentException(
              "the axis of '"
                  + name
                  + "' wants bounds and a number of points: "
                  + name
                  + "=-2:2:401");
    };
  }

  private static Axis range(String name, String[] fields) {
    return switch (fields.length) {
      case 1 -> Axis.values(name, List.of(number(name, fields[0])));
      case 2 -> Sample.range(name, number(name, fields[0]), number(name, fields[1]));
      default ->
          throw new IllegalArgumentException(
              "the range of '" + name + "' wants two bounds: " + name + "=-2:2");
    };
  }

  private static Axis listed(String name, String text) {
    List<BigFraction> values = new ArrayList<>();
    for (String value : text.split(";", -1)) {
      BigFraction v = number(name, value);
      if (values.contains(v)) {
        throw new IllegalArgumentException(
            "'" + value + "' stands twice in the axis of '" + name + "'");
      }
      values.add(v);
    }
    return Axis.values(name, values);
  }

  private static BigFraction number(String name, String text) {
    return ExactNumber.of(text)
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "'"
                        + text
                        + "' is no rational number for '"
                        + name
                        + "'; write for example 3/2"));
  }

  private static long count(String name, String text) {
    if (!text.strip().matches("[0-9]{1,18}") || Long.parseLong(text.strip()) == 0) {
      throw new IllegalArgumentException(
          "'" + text + "' is no number of points for '" + name + "'; write for example 401");
    }
    return Long.parseLong(text.strip());
  }
}
