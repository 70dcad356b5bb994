package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The reports that are shipped are those that the program writes of the shipped specs. */
class ShippedReportsTest {
  private static final Path SHIPPED = Path.of("reports");
  private static final Path ASIDE = Path.of("target", "reports-found");

  @TempDir private Path folder;

  /** A difference leaves the whole new folder under {@code target/reports-found}. */
  @Test
  void shippedReportsAreThoseOfTheShippedSpecs() throws IOException {
    String said = ReportFolders.analyse(folder, "specs");
    SortedMap<String, String> found = ReportFolders.read(folder);
    List<String> differences = ReportFolders.differences(ReportFolders.read(SHIPPED), found);
    if (!differences.isEmpty()) {
      for (Map.Entry<String, String> file : found.entrySet()) {
        Path aside = ASIDE.resolve(file.getKey());
        Files.createDirectories(aside.getParent());
        Files.writeString(aside, file.getValue(), StandardCharsets.UTF_8);
      }
    }
    assertEquals(List.of(), differences, said + "the new text is under " + ASIDE);
  }

  @Test
  void aChangedAMissingAndAForeignFileAreNoticed() {
    SortedMap<String, String> due = new TreeMap<>(Map.of("a", "1\n2\n", "b", ""));
    SortedMap<String, String> found = new TreeMap<>(Map.of("a", "1\n3\n", "c", ""));
    assertEquals(
        List.of(
            "a, line 2: due '2', found '3'", "b: is not written", "c: is written and was not due"),
        ReportFolders.differences(due, found));
    assertEquals(
        List.of("a, line 2: due '', found 'end'"),
        ReportFolders.differences(
            new TreeMap<>(Map.of("a", "1\n")), new TreeMap<>(Map.of("a", "1"))));
  }

  @Test
  void theNumberOfThreadsDoesNotShow() throws IOException {
    String[] specs = {
      "specs/metric-rotations-3.yaml",
      "specs/scaled-ladder.yaml",
      "specs/merging-frames.yaml",
      "specs/commuting-shears.yaml",
      "specs/octet-scale.yaml",
      "specs/lorentz-to-euclid.yaml",
      "specs/beam-of-spin-one.yaml"
    };
    SortedMap<String, String> first = with("1", specs);
    assertTrue(first.size() > 7 * 6, first.keySet().toString());
    for (String threads : List.of("1", "2", "7")) {
      assertEquals(List.of(), ReportFolders.differences(first, with(threads, specs)), threads);
    }
  }

  private SortedMap<String, String> with(String threads, String... specs) throws IOException {
    Path out = Files.createTempDirectory(folder, "run");
    String[] arguments = new String[specs.length + 2];
    System.arraycopy(specs, 0, arguments, 0, specs.length);
    arguments[specs.length] = "--threads";
    arguments[specs.length + 1] = threads;
    ReportFolders.analyse(out, arguments);
    return ReportFolders.read(out);
  }

  @Test
  void aBudgetThatEndsAtOnceLeavesAnIncompleteFamily() throws IOException {
    ReportFolders.analyse(folder, "specs/symplectic-two-modes.yaml", "--budget", "1ms");
    SortedMap<String, String> found = ReportFolders.read(folder);
    List<String> summary = found.get("summary.csv").lines().toList();
    assertEquals(2, summary.size());
    assertTrue(summary.get(1).startsWith("symplectic-two-modes,incomplete,10,"), summary.get(1));
    assertTrue(summary.get(1).contains("not decided (out of time)"), summary.get(1));
    String result = found.get("symplectic-two-modes/result.json");
    assertTrue(result.contains("\"status\" : \"incomplete\""), result);
    assertTrue(found.get("symplectic-two-modes/report.html").contains("not decided"));
    assertFalse(found.containsKey("symplectic-two-modes/strata.csv"), found.keySet().toString());
  }
}
