package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.published.PublishedEntry;
import rankfall.published.PublishedTables;

/** The name of any algebra. */
class AlgebraNamesTest {

  /** A point of the published tables. */
  record Site(PublishedEntry entry, PublishedEntry.Point point) {
    @Override
    public String toString() {
      return entry.id() + " " + point.at();
    }

    int dimension() {
      return Integer.parseInt(point.facts().getOrDefault("dimension", "-1"));
    }

    ExactAlgebra algebra() {
      return PointAlgebra.of(entry.spec(), point.at());
    }
  }

  private static Stream<Site> sites() {
    return PublishedTables.all().stream()
        .flatMap(e -> e.points().stream().map(p -> new Site(e, p)));
  }

  static Stream<Site> small() {
    return sites().filter(s -> s.dimension() >= 0 && s.dimension() <= 6);
  }

  /** A name belongs to the algebra, not to the basis. */
  @ParameterizedTest
  @MethodSource("small")
  void nameIsTheSameInAnotherBasis(Site s) {
    ExactAlgebra g = s.algebra();
    Optional<TypeName> name = AlgebraNames.of(g);
    assertTrue(name.isPresent());
    assertEquals(name, AlgebraNames.of(Turned.of(g, new Random(3), 2 * g.dimension())));
  }

  static Stream<Site> named() {
    return small().filter(s -> s.point().facts().containsKey("type"));
  }

  /** Names of the published tables; sources in the data files. */
  @ParameterizedTest
  @MethodSource("named")
  void nameIsThePublishedOne(Site s) {
    TypeName name = AlgebraNames.of(s.algebra()).orElseThrow();
    List<String> all = new ArrayList<>(name.otherNames());
    all.add(name.name());
    assertTrue(all.contains(s.point().facts().get("type")), () -> all.toString());
  }

  static Stream<Site> worlds() {
    return sites().filter(s -> s.point().world().isPresent() && s.dimension() == 10);
  }

  /** All worlds of Bacry and Levy-Leblond 1968 in the published tables. */
  @ParameterizedTest
  @MethodSource("worlds")
  void worldIsNamed(Site s) {
    TypeName name = AlgebraNames.of(s.algebra()).orElseThrow();
    List<String> all = new ArrayList<>(name.otherNames());
    all.add(name.name());
    String due = s.point().world().orElseThrow().replaceFirst(", (.*)", " ($1)");
    assertTrue(all.contains(due), () -> all.toString());
  }

  /** Over complex ground only what needs no order; common practice, no source. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "C^3 | [e1,e2] = 0",
        "h3 over C | [e1,e2] = e3",
        "sl(2,C) | [e1,e2] = e3; [e2,e3] = e1; [e3,e1] = e2",
        "aff(1,C) + C | [e1,e2] = e2",
      })
  void complexAlgebras(String due, String brackets) {
    String yaml =
        "family: test\nground: complex\ngenerators: [e1, e2, e3]\nbrackets: |\n  "
            + brackets.replace("; ", "\n  ")
            + "\n";
    TypeName name = AlgebraNames.of(PointAlgebra.of(yaml, Map.of())).orElseThrow();
    assertEquals(due, name.name());
  }
}
