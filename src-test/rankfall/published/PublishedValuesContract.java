package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The program agrees with every entry of the published tables; the test is named by the entry. */
abstract class PublishedValuesContract {

  /**
   * The program under test.
   *
   * @return asked once an entry for the family and once a point
   */
  abstract FamilyObserver program();

  /** From this dimension on a point takes a minute rather than a second. */
  private static final int LARGE = 100;

  static Stream<PublishedEntry> entriesWithPoints() {
    return PublishedTables.all().stream().filter(e -> !e.points().isEmpty() && !isLarge(e));
  }

  static Stream<PublishedEntry> largeEntriesWithPoints() {
    return PublishedTables.all().stream().filter(PublishedValuesContract::isLarge);
  }

  private static boolean isLarge(PublishedEntry entry) {
    return entry.points().stream()
        .map(p -> p.facts().getOrDefault("dimension", "0"))
        .anyMatch(d -> Integer.parseInt(d) >= LARGE);
  }

  static Stream<PublishedEntry> entriesWithFormulas() {
    return PublishedTables.all().stream()
        .filter(
            e ->
                e.killing().isPresent()
                    || e.determinant().isPresent()
                    || e.conditions().isPresent()
                    || e.restricted().isPresent()
                    || e.dual().isPresent()
                    || e.strata().isPresent()
                    || !e.loci().isEmpty());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("entriesWithPoints")
  void factsAtPoints(PublishedEntry entry) {
    assertPoints(entry);
  }

  @Tag("large")
  @ParameterizedTest(name = "{0}")
  @MethodSource("largeEntriesWithPoints")
  void factsAtPointsOfLargeAlgebras(PublishedEntry entry) {
    assertPoints(entry);
  }

  private void assertPoints(PublishedEntry entry) {
    List<String> differences =
        entry.points().stream()
            .flatMap(
                p -> PublishedComparison.point(p, program().point(entry.spec(), p.at())).stream())
            .toList();
    assertEquals(List.of(), differences, entry.source());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("entriesWithFormulas")
  void formulasOfTheFamily(PublishedEntry entry) {
    assertEquals(
        List.of(),
        PublishedComparison.family(entry, program().family(entry.spec())),
        entry.source());
  }
}
