package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.Stream;
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

  static Stream<PublishedEntry> entriesWithPoints() {
    return PublishedTables.all().stream().filter(e -> !e.points().isEmpty());
  }

  static Stream<PublishedEntry> entriesWithFormulas() {
    return PublishedTables.all().stream()
        .filter(
            e ->
                e.killing().isPresent()
                    || e.determinant().isPresent()
                    || e.conditions().isPresent());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("entriesWithPoints")
  void factsAtPoints(PublishedEntry entry) {
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
