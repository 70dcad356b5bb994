package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.identify.ExactAlgebra;
import rankfall.identify.LeviNames;
import rankfall.identify.TypeName;
import rankfall.published.PublishedEntry.Point;

/** The names of algebras in the published tables; the sources stand in the data files. */
class PublishedNamesTest {
  private static final int LARGE = 100;

  static Stream<PublishedEntry> entries() {
    return named(0, LARGE);
  }

  static Stream<PublishedEntry> largeEntries() {
    return named(LARGE, Integer.MAX_VALUE);
  }

  static Stream<PublishedEntry> smallEntries() {
    return named(0, 7);
  }

  private static Stream<PublishedEntry> named(int from, int below) {
    return PublishedTables.all().stream()
        .filter(e -> e.points().stream().anyMatch(PublishedNamesTest::isNamed))
        .filter(
            e -> {
              int largest =
                  e.points().stream()
                      .map(p -> p.facts().getOrDefault("dimension", "0"))
                      .mapToInt(Integer::parseInt)
                      .max()
                      .orElse(0);
              return from <= largest && largest < below;
            });
  }

  private static boolean isNamed(Point point) {
    return point.facts().containsKey("type") || point.facts().containsKey("levi");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("entries")
  void namesAtPoints(PublishedEntry entry) {
    assertNames(entry);
  }

  /** Dimension 153: type and character leave two real forms, and both are named. */
  @Tag("large")
  @ParameterizedTest(name = "{0}")
  @MethodSource("largeEntries")
  void namesOfLargeAlgebras(PublishedEntry entry) {
    assertNames(entry);
  }

  private static void assertNames(PublishedEntry entry) {
    List<String> differences = new ArrayList<>();
    for (Point point : entry.points()) {
      if (isNamed(point)) {
        ExactAlgebra algebra = ExactPoint.of(entry.spec(), point.at()).orElseThrow();
        if (point.facts().containsKey("type")) {
          TypeName found = LeviNames.of(algebra);
          if (!agree(point, found)) {
            differences.add(point.at() + ": due " + due(point) + ", found " + found);
          }
        }
        if (point.facts().containsKey("levi")) {
          TypeName found = LeviNames.factor(algebra).orElseThrow();
          if (!names(found).contains(point.facts().get("levi"))) {
            differences.add(point.at() + ": factor due, found " + found);
          }
        }
      }
    }
    assertEquals(List.of(), differences, entry.source());
  }

  /**
   * One of the names is due, or each of two that are left open. What stands in parentheses behind a
   * name tells algebras apart that share it, as the two called so(3,1) |x R^4.
   */
  private static boolean agree(Point point, TypeName found) {
    List<String> due = due(point);
    return names(found).stream()
        .map(n -> n.replaceAll(" \\(R\\^\\d+ = [CH]\\^\\d+\\)$", ""))
        .anyMatch(n -> due.containsAll(List.of(n.split(" or "))));
  }

  private static List<String> names(TypeName name) {
    List<String> out = new ArrayList<>(List.of(name.name()));
    out.addAll(name.otherNames());
    return out;
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

  /** A name belongs to the algebra, not to the basis, rational or not. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("smallEntries")
  void namesDoNotDependOnTheBasis(PublishedEntry entry) {
    Random random = new Random(entry.id().hashCode());
    for (Point point : entry.points()) {
      if (isNamed(point)) {
        ExactAlgebra algebra = ExactPoint.of(entry.spec(), point.at()).orElseThrow();
        boolean rational =
            algebra.constants().brackets().values().stream()
                .allMatch(row -> row.values().stream().allMatch(c -> c.isConstant()));
        if (rational && !algebra.complex()) {
          TypeName name = LeviNames.of(algebra);
          assertEquals(name, LeviNames.of(AnotherBasis.of(algebra, false, random)));
          assertEquals(name, LeviNames.of(AnotherBasis.of(algebra, true, random)));
        }
      }
    }
  }

  /** The comparison notices every name of another algebra of the same dimension. */
  @Test
  void anotherNameIsNoticed() {
    PublishedEntry entry = entries().filter(e -> e.id().equals("so-4-1")).findFirst().orElseThrow();
    Point point = entry.points().get(0);
    assertTrue(agree(point, TypeName.of("so(4,1)")));
    for (String other : List.of("so(5)", "so(3,2)", "so(4,1) or so(5)", "so(3,1) |x R^4")) {
      assertTrue(!agree(point, TypeName.of(other)), other);
    }
  }
}
