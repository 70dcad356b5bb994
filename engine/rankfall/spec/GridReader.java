package rankfall.spec;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.apache.commons.numbers.fraction.BigFraction;

/** Reads the values of one parameter in {@code scan}. */
final class GridReader {
  private static final int MAX_POINTS = 1_000_000;
  private static final List<String> KEYS = List.of("from", "to", "points");
  private static final String EXAMPLE = "{from: -2, to: 2, points: 17} or [1/2, 1, 2]";

  private GridReader() {}

  static List<BigFraction> read(YamlNode.Entry entry, Faults faults) {
    if (entry.value() instanceof YamlNode.Sequence list) {
      return listed(entry.name(), list, faults);
    }
    if (entry.value() instanceof YamlNode.Mapping mapping) {
      return stepped(entry, mapping, faults);
    }
    throw SpecFault.of(
        entry.valuePlace(),
        "the scan of '" + entry.name() + "' is neither steps nor a list",
        "write " + EXAMPLE);
  }

  private static List<BigFraction> listed(String name, YamlNode.Sequence list, Faults faults) {
    if (list.items().isEmpty()) {
      throw SpecFault.of(
          list.place(), "the scan of '" + name + "' has no values", "write " + EXAMPLE);
    }
    List<BigFraction> values = new ArrayList<>();
    Set<BigFraction> met = new HashSet<>();
    for (YamlNode item : list.items()) {
      faults.gather(
          () -> {
            BigFraction value = Scalars.number(item, "a value of the scan of " + name);
            if (!met.add(value)) {
              throw SpecFault.of(
                  item.place(), "a value of the scan of " + name + " stands twice", "remove one");
            }
            values.add(value);
          });
    }
    return List.copyOf(values);
  }

  private static List<BigFraction> stepped(
      YamlNode.Entry entry, YamlNode.Mapping mapping, Faults faults) {
    Fields fields = Fields.of(mapping, KEYS, faults);
    for (String key : KEYS) {
      if (!fields.has(key)) {
        throw SpecFault.of(
            entry.key().place(),
            "the scan of '" + entry.name() + "' has no '" + key + "'",
            "write " + EXAMPLE);
      }
    }
    Optional<YamlNode.Entry> from = fields.entry("from");
    Optional<YamlNode.Entry> to = fields.entry("to");
    Optional<ScalarText> points = fields.text("points", "points: 17");
    if (from.isEmpty() || to.isEmpty() || points.isEmpty()) {
      return List.of();
    }
    BigFraction first = Scalars.number(from.get().value(), "'from'");
    BigFraction last = Scalars.number(to.get().value(), "'to'");
    int count = Scalars.integer(points.get(), "points", 2, MAX_POINTS);
    if (first.subtract(last).signum() >= 0) {
      throw SpecFault.of(
          to.get().valuePlace(),
          "the scan of '" + entry.name() + "' does not go up: 'to' is not above 'from'",
          "exchange them, or write a list of values");
    }
    BigFraction step = last.subtract(first).divide(count - 1);
    List<BigFraction> values = new ArrayList<>();
    for (int k = 0; k < count; k++) {
      values.add(first.add(step.multiply(k)));
    }
    return List.copyOf(values);
  }
}
