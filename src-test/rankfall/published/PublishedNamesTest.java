package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.identify.LeviNames;
import rankfall.identify.TypeName;
import rankfall.published.PublishedEntry.Point;

/** The names of algebras in the published tables; the sources stand in the data files. */
class PublishedNamesTest {
  static Stream<PublishedEntry> entries() {
    return PublishedTables.all().stream()
        .filter(
            e ->
                e.points().stream()
                    .anyMatch(p -> p.facts().containsKey("type") || p.facts().containsKey("levi")));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("entries")
  void namesAtPoints(PublishedEntry entry) {
    List<String> differences = new ArrayList<>();
    for (Point point : entry.points()) {
      if (Integer.parseInt(point.facts().getOrDefault("dimension", "0")) > 100) {
        continue;
      }
      long t0 = System.nanoTime();
      if (point.facts().containsKey("type")) {
        TypeName found = LeviNames.of(ExactPoint.of(entry.spec(), point.at()).orElseThrow());
        List<String> due = due(point);
        if (due.stream().noneMatch(d -> found.name().equals(d) || found.otherNames().contains(d))) {
          differences.add(point.at() + " due " + due + " found " + found);
        }
      }
      if (point.facts().containsKey("levi")) {
        TypeName found =
            LeviNames.factor(ExactPoint.of(entry.spec(), point.at()).orElseThrow()).orElseThrow();
        String d = point.facts().get("levi");
        System.err.println(
            "LEVI "
                + entry.id()
                + " "
                + LeviNames.of(ExactPoint.of(entry.spec(), point.at()).orElseThrow()));
        if (!(found.name().equals(d) || found.otherNames().contains(d))) {
          differences.add(point.at() + " levi due " + d + " found " + found);
        }
      }
      long ms = (System.nanoTime() - t0) / 1000000;
      if (ms > 200)
        System.err.println("SLOW " + entry.id() + " " + point.facts().get("dimension") + " " + ms);
    }
    assertEquals(List.of(), differences, entry.source());
  }

  private static List<String> due(Point point) {
    List<String> out = new ArrayList<>(List.of(point.facts().get("type")));
    String aliases = point.facts().getOrDefault("typeAliases", "[]");
    String inside = aliases.substring(1, aliases.length() - 1);
    if (!inside.isEmpty()) {
      out.addAll(List.of(inside.split(", ")));
    }
    return out;
  }
}
