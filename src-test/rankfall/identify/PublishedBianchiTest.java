package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.published.PublishedEntry;
import rankfall.published.PublishedTables;

/**
 * Bianchi types and the number h of the published tables; the sources stand in the data files
 * (Bianchi 1898; Ellis and MacCallum 1969).
 */
class PublishedBianchiTest {

  /** A point with a type. */
  record Typed(PublishedEntry entry, PublishedEntry.Point point) {
    @Override
    public String toString() {
      return entry.id() + " " + point.at();
    }
  }

  static Stream<Typed> typed() {
    return PublishedTables.all().stream()
        .flatMap(
            e ->
                e.points().stream()
                    .filter(p -> p.facts().containsKey("bianchi"))
                    .map(p -> new Typed(e, p)));
  }

  @ParameterizedTest
  @MethodSource("typed")
  void typeIsThePublishedOne(Typed t) {
    TypeName name = Bianchi.of(PointAlgebra.of(t.entry().spec(), t.point().at()));
    List<String> all = new ArrayList<>(name.otherNames());
    all.add(0, name.name());
    String type = t.point().facts().get("bianchi");
    String h = t.point().facts().get("h");
    boolean plain = h == null || type.equals("III");
    assertTrue(all.contains("Bianchi " + type + (plain ? "" : ", h = " + h)), () -> all.toString());
    if (h != null) {
      assertTrue(all.stream().anyMatch(n -> n.endsWith("_h, h = " + h)), () -> all.toString());
    }
    assertEquals(
        1, all.stream().filter(n -> n.matches("Bianchi [IVX_0h]+(, h = (?!-1$).*)?")).count());
  }

  /** The tables hold this many types and values of h. */
  @Test
  void allValuesAreAsked() {
    assertEquals(105, typed().count());
    assertEquals(20, typed().filter(t -> t.point().facts().containsKey("h")).count());
  }
}
