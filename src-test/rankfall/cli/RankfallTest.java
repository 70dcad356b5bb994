package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import rankfall.Analysis.Status;

/** Exit status, and what stands on which stream, with rooms that answer from memory. */
final class RankfallTest {
  @TempDir private Path folder;

  private final RecordingDoors doors = new RecordingDoors();
  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();
  private String spec;

  @BeforeEach
  void layOutASpec() throws IOException {
    spec = Files.writeString(folder.resolve("s.yaml"), "").toString();
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "analyse", "analyze", "check", "point", "scan"})
  void everyVerbExplainsItselfAndItsVersion(String verb) {
    String[] help = verb.isEmpty() ? new String[] {"--help"} : new String[] {verb, "--help"};
    assertEquals(0, run(help));
    assertTrue(out.toString().contains("Exit status:"), out.toString());
    String[] version = verb.isEmpty() ? new String[] {"--version"} : new String[] {verb, "-V"};
    out.getBuffer().setLength(0);
    assertEquals(0, run(version));
    assertTrue(out.toString().matches("rankfall [0-9]+\\.[0-9]+\\.[0-9]+\\R"), out.toString());
    assertEquals("", err.toString());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "compute",
        "analyse",
        "analyse none.yaml",
        "analyse SPEC --threads 0",
        "analyse SPEC --threads two",
        "analyse SPEC --budget 5",
        "analyse SPEC --out SPEC",
        "analyse SPEC --unknown",
        "check",
        "check --schema SPEC",
        "point",
        "point SPEC",
        "point SPEC a=1 a=2",
        "point SPEC b=1",
        "point SPEC a=1 --json --csv",
        "point SPEC a=1 --from SPEC",
        "point SPEC a=1 --family none",
        "point SPEC --from none.csv",
        "scan",
        "scan SPEC",
        "scan SPEC --count --out x.csv",
        "scan SPEC --count --resume",
        "scan SPEC --count --columns a",
        "scan SPEC --count --threads 0",
        "scan SPEC --count --shard 0/3",
        "scan SPEC --count --shard 4/3",
        "scan SPEC --count --shard half",
        "scan SPEC --count --grid a=1 --from SPEC",
        "scan SPEC --count --grid misfit",
        "scan SPEC --count --sample 5",
        "scan SPEC --count --sample 0 --range a=1:2",
        "scan SPEC --count --seed 5",
        "scan SPEC --count --from none.csv",
        "scan SPEC --out none/x.csv",
        "scan SPEC --out /"
      })
  void aWrongCallEndsWithTwoAndDoesNothing(String call) {
    doors.documents.add(Specs.read("one", spec, 1, "a"));
    String[] arguments = call.isEmpty() ? new String[0] : call.replace("SPEC", spec).split(" ");
    assertEquals(2, run(arguments));
    assertEquals("", out.toString());
    assertTrue(err.toString().lines().count() == 2, err.toString());
    assertTrue(err.toString().contains("try 'rankfall"), err.toString());
    assertEquals(List.of(), doors.written);
  }

  @Test
  void aBatchGoesOnPastABadSpecAndKeepsItsOrder() {
    doors.documents.add(Specs.read("one", spec, 1));
    doors.documents.add(Specs.faulty("bad", spec));
    doors.documents.add(Specs.read("two", spec, 7));
    assertEquals(1, run("analyse", spec, "--threads", "1", "--out", folder + "/r"));
    assertEquals(List.of("one", "two", "summary of 3"), doors.written);
    assertTrue(err.toString().contains(":2:7: no title; write a title"), err.toString());
    assertTrue(err.toString().contains("3 families, 2 complete"), err.toString());
    assertEquals("", out.toString());
  }

  @Test
  void completeFamiliesEndWithZero() {
    doors.documents.add(Specs.read("one", spec, 1));
    assertEquals(0, run("analyze", spec));
  }

  @Test
  void anIncompleteFamilyEndsWithOneAndSaysWhy() {
    doors.documents.add(Specs.read("one", spec, 1));
    doors.status = Status.INCOMPLETE;
    assertEquals(1, run("analyse", spec));
    assertTrue(err.toString().contains("one: incomplete: time is up"), err.toString());
  }

  @Test
  void anUnexpectedExceptionBecomesOneLine() {
    doors.documents.add(Specs.read("one", spec, 1));
    doors.broken = true;
    assertEquals(1, run("analyse", spec));
    assertTrue(err.toString().contains("internal error in family one: "), err.toString());
    assertFalse(err.toString().contains("\tat "), err.toString());
  }

  @Test
  void checkComputesNothing() {
    doors.documents.add(Specs.read("one", spec, 1));
    doors.broken = true;
    assertEquals(0, run("check", spec));
    doors.documents.add(Specs.read("one", spec, 4));
    assertEquals(1, run("check", folder.toString()));
    assertTrue(err.toString().contains(":4:9: the family 'one' is described at "), err.toString());
  }

  @Test
  void theSchemaIsAResult() {
    assertEquals(0, run("check", "--schema"));
    assertEquals("{}\n", out.toString());
    assertEquals("", err.toString());
  }

  @Test
  void aPointIsAResultAndItsErrorEndsWithOne() {
    doors.documents.add(Specs.read("one", spec, 1, "a"));
    assertEquals(0, run("point", spec, "a=-3/2", "--json"));
    assertEquals("JSON {a=-3 / 2}\n", out.toString());
    assertEquals(1, run("point", spec, "a=0"));
  }

  @Test
  void rowsAreAnsweredInTheirOrder() throws IOException {
    doors.documents.add(Specs.read("one", spec, 1, "a"));
    Path table = Files.writeString(folder.resolve("p.csv"), "1\nx\n2\n");
    assertEquals(1, run("point", spec, "--from", table.toString(), "--csv"));
    assertEquals("CSV\n1\nerror\n2\n", out.toString());
  }

  @Test
  void countsAreAResultAndATableIsNot() {
    doors.documents.add(Specs.read("one", spec, 1, "a"));
    assertEquals(0, run("scan", spec, "--count", "--grid", "a=-1:1:3"));
    assertEquals("Axes[text=a=-1:1:3]\n", out.toString());
    assertEquals("one: done\n", err.toString());
    out.getBuffer().setLength(0);
    assertEquals(0, run("scan", spec, "--out", folder + "/x.csv"));
    assertEquals("", out.toString());
  }

  @Test
  void aScanThatCannotBeWrittenSaysSoAndEndsWithOne() {
    doors.documents.add(Specs.read("one", spec, 1, "a"));
    doors.broken = true;
    assertEquals(1, run("scan", spec, "--out", folder + "/x.csv"));
    assertTrue(err.toString().contains("no room left"), err.toString());
    assertTrue(err.toString().contains("--resume goes on"), err.toString());
  }

  private int run(String... arguments) {
    return Rankfall.commandLine(doors, new PrintWriter(out, true), new PrintWriter(err, true))
        .execute(arguments);
  }
}
