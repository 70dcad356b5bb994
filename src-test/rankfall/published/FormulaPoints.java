package rankfall.published;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.schema.FailsafeSchema;
import rankfall.published.Quantity.Root;

/**
 * Exact points at which formulas of an entry are compared. Two rational functions of degree at most
 * d that differ agree at a random point with a chance of at most d over the number of values a
 * coordinate may take (Schwartz 1980, Fast Probabilistic Algorithms for Verification of Polynomial
 * Identities; Zippel 1979), here below 1 in 40 000 a point for the degrees of the tables.
 */
final class FormulaPoints {
  private static final int POINTS = 4;
  private static final int LARGEST = 1_000_000;
  private static final Pattern SQUARE_ROOT =
      Pattern.compile("sqrt\\(\\s*(\\d+)\\s*(?:/\\s*(\\d+)\\s*)?\\)");
  private static final Pattern NAME =
      Pattern.compile("\\p{L}[\\p{L}\\d_]*", Pattern.UNICODE_CHARACTER_CLASS);

  private FormulaPoints() {}

  /**
   * Points on the relations of an entry: parameters and functions get rational values, algebraic
   * numbers stand for themselves.
   *
   * @param entry its id seeds the choice
   * @return at least four, each with the value of every name that a formula may hold
   */
  static List<Map<String, Quantity>> of(PublishedEntry entry) {
    Map<?, ?> spec = spec(entry);
    Map<String, Quantity> fixed = new HashMap<>();
    numbers(entry).forEach(r -> fixed.put(r.name(), Quantity.of(r)));
    List<String> parameters =
        spec.get("parameters") instanceof List<?> l
            ? l.stream().map(Object::toString).toList()
            : List.of();
    Random random = new Random(entry.id().hashCode());
    List<SortedMap<String, String>> ways = entry.solvedBy();
    List<Map<String, Quantity>> points = new ArrayList<>();
    for (int k = 0; k < POINTS * Math.max(1, ways.size()); k++) {
      Map<String, Quantity> point = new HashMap<>(fixed);
      parameters.forEach(p -> point.put(p, Quantity.of(fraction(random))));
      if (!ways.isEmpty()) {
        solve(ways.get(k % ways.size()), point, random);
      }
      points.add(point);
    }
    return points;
  }

  /** The algebraic numbers of an entry. */
  static List<Root> numbers(PublishedEntry entry) {
    Map<?, ?> spec = spec(entry);
    Map<String, Root> numbers = new TreeMap<>();
    Matcher roots = SQUARE_ROOT.matcher(entry.spec());
    while (roots.find()) {
      BigFraction radicand =
          BigFraction.parse(roots.group(1) + (roots.group(2) == null ? "" : "/" + roots.group(2)));
      String name = roots.group().replaceAll("\\s", "");
      numbers.put(name, new Root(name, List.of(radicand, BigFraction.ZERO)));
    }
    if (spec.get("constants") instanceof Map<?, ?> constants) {
      constants.forEach(
          (name, c) ->
              numbers.put(
                  name.toString(), constant(name.toString(), ((Map<?, ?>) c).get("minimal"))));
    }
    return List.copyOf(numbers.values());
  }

  /**
   * The relations of an entry.
   *
   * @return differences of the two sides of each equation under {@code where}
   */
  static List<String> relations(PublishedEntry entry) {
    return spec(entry).get("where") instanceof List<?> where
        ? where.stream()
            .map(Object::toString)
            .filter(w -> w.matches("[^<>!=]*=[^<>!=]*"))
            .map(w -> w.replace("=", "- (") + ")")
            .toList()
        : List.of();
  }

  private static Map<?, ?> spec(PublishedEntry entry) {
    return (Map<?, ?>)
        new Load(LoadSettings.builder().setSchema(new FailsafeSchema()).build())
            .loadFromString(entry.spec());
  }

  private static void solve(
      SortedMap<String, String> way, Map<String, Quantity> point, Random random) {
    Map<String, Quantity> free = new HashMap<>(point);
    way.keySet().forEach(free::remove);
    for (String formula : way.values()) {
      for (String name :
          new TreeSet<>(NAME.matcher(formula).results().map(r -> r.group()).toList())) {
        free.computeIfAbsent(name, n -> Quantity.of(fraction(random)));
      }
    }
    way.forEach((name, formula) -> point.put(name, ExactText.value(formula, free)));
  }

  private static Root constant(String name, Object minimal) {
    String text = minimal.toString();
    Matcher variable = NAME.matcher(text);
    if (!variable.find()) {
      throw new IllegalArgumentException("no variable in " + text);
    }
    Root x = new Root(variable.group(), List.of());
    List<BigFraction> c =
        ExactText.value(text, Map.of(variable.group(), Quantity.of(x))).coefficients(x);
    BigFraction leading = c.get(c.size() - 1).negate();
    return new Root(
        name, IntStream.range(0, c.size() - 1).mapToObj(k -> c.get(k).divide(leading)).toList());
  }

  private static BigFraction fraction(Random random) {
    int sign = random.nextBoolean() ? 1 : -1;
    return BigFraction.of(sign * (1 + random.nextInt(LARGEST)), 1 + random.nextInt(9));
  }
}
