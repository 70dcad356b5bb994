package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.published.PublishedEntry.Point;

/** Nothing of the published tables vanishes silently, and what they say is consistent. */
class PublishedTablesTest {

  /** The numbers also stand in the header of each file. */
  @ParameterizedTest
  @CsvSource({
    "normalisation, 37, 22, 559",
    "real-forms, 73, 73, 1061",
    "bianchi, 17, 53, 974",
    "dimension-3-to-5, 51, 85, 1347",
    "contractions, 37, 150, 2892",
    "physics, 20, 37, 724",
    "dependence, 16, 46, 576",
    "traps, 32, 67, 1174",
    "levi, 16, 17, 292"
  })
  void everyFileHoldsAllItsValues(String file, int entries, int points, int values) {
    List<PublishedEntry> read = PublishedTables.read(file);
    assertEquals(entries, read.size());
    assertEquals(points, read.stream().mapToInt(e -> e.points().size()).sum());
    assertEquals(values, read.stream().mapToInt(PublishedEntry::values).sum());
  }

  @Test
  void allFilesTogether() {
    List<PublishedEntry> all = PublishedTables.all();
    assertEquals(299, all.size());
    assertEquals(550, all.stream().mapToInt(e -> e.points().size()).sum());
    assertEquals(9599, all.stream().mapToInt(PublishedEntry::values).sum());
    assertEquals(279, all.stream().filter(e -> e.tier() == 1).count());
  }

  @Test
  void everyEntryHasANameOfItsOwnASourceAndSomethingToSay() {
    Set<String> ids = new HashSet<>();
    Pattern family = Pattern.compile("(?m)^family: (\\S+)$");
    for (PublishedEntry entry : PublishedTables.all()) {
      assertTrue(ids.add(entry.id()), entry.id());
      assertTrue(!entry.source().isBlank(), entry.id());
      assertTrue(entry.values() > 0, entry.id());
      Matcher name = family.matcher(entry.spec());
      assertTrue(name.find(), entry.id());
      assertEquals(entry.id(), name.group(1));
    }
  }

  /** Sylvester: plus + minus is the rank, and with zero the dimension. */
  @Test
  void signaturesAddUp() {
    for (PublishedEntry entry : PublishedTables.all()) {
      for (Point point : entry.points()) {
        if (point.facts().containsKey("plus")) {
          int rank = fact(point, "plus") + fact(point, "minus");
          assertEquals(rank, fact(point, "rank"), entry.id() + point.at());
          assertEquals(
              rank + fact(point, "zero"), fact(point, "dimension"), entry.id() + point.at());
        }
      }
    }
  }

  @Test
  void unknownKeysAreRefused() {
    String entry = "- {id: a, source: b, tier: 1, spec: 'family: a', points: [%s]}";
    assertEquals(3, parse(entry.formatted("{at: {}, rank: 3, plus: 1, zero: 0}")).get(0).values());
    assertThrows(IllegalArgumentException.class, () -> parse(entry.formatted("{at: {}, rnak: 3}")));
    assertThrows(
        IllegalArgumentException.class,
        () -> parse(entry.formatted("{at: {}, rank: 3, error: pole}")));
    assertThrows(IllegalArgumentException.class, () -> parse(entry.formatted("{at: {}}")));
    assertThrows(
        IllegalArgumentException.class,
        () -> parse("- {id: a, source: b, tier: 1, spec: c, killling: {}}"));
  }

  private static List<PublishedEntry> parse(String text) {
    return PublishedTables.parse(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)));
  }

  private static int fact(Point point, String name) {
    return Integer.parseInt(point.facts().get(name));
  }
}
