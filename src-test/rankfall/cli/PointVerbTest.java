package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
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
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.PointSpecs;

/** The verb with the rooms of the program itself. */
final class PointVerbTest {
  @TempDir private Path folder;

  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();
  private String spec;

  @BeforeEach
  void layOutTwoFamilies() throws IOException {
    spec =
        Files.writeString(folder.resolve("s.yaml"), PointSpecs.ROTOR + "---\n" + PointSpecs.ANGLE)
            .toString();
  }

  @ParameterizedTest
  @CsvSource({
    "stretched-rotor a=1 b=-3/2, 0, 'rank 3: 2 positive, 1 negative, 0 zero'",
    "stretched-rotor a=1 b=1 --json, 0, '\"compact\": true'",
    "turned-plane cos(t)=3/5 sin(t)=-4/5, 0, 'rank 1: 1 positive'",
    "turned-plane t=0, 0, rank 0",
    "turned-plane cos(t)=1 sin(t)=1 --json, 1, '\"error\": \"the point is off the relation'",
    "turned-plane t=1, 1, give values of cos(t) and sin(t) instead of t"
  })
  void aPointIsAnswered(String call, int status, String part) {
    assertEquals(status, run(("point " + spec + " --family " + call).split(" ")));
    assertTrue(out.toString().contains(part), out.toString());
    assertEquals("", err.toString());
  }

  @ParameterizedTest
  @CsvSource({
    "stretched-rotor a=1, no value for the parameter 'b'",
    "stretched-rotor a=1 b=1 c=1, 'c' is no parameter of the family",
    "turned-plane sin(t)=1, no value for the parameter 'cos(t)'"
  })
  void valuesThatDoNotFitAreAWrongCall(String call, String message) {
    assertEquals(2, run(("point " + spec + " --family " + call).split(" ")));
    assertTrue(err.toString().contains(message), err.toString());
    assertEquals("", out.toString());
  }

  @Test
  void badRowsEndWithOneAndTheOthersAreAnswered() throws IOException {
    assertEquals(1, table("a,b\n1,1\nx,1\n1,-1\n"));
    List<String> lines = out.toString().lines().toList();
    assertEquals(3, lines.size());
    assertTrue(lines.get(0).contains("\"compact\": true"), lines.get(0));
    assertTrue(lines.get(1).contains("\"error\": \"line 3: 'x' is no rational"), lines.get(1));
    assertTrue(lines.get(2).contains("\"plus\": 2, \"minus\": 1"), lines.get(2));
  }

  @Test
  void goodRowsEndWithZero() throws IOException {
    assertEquals(0, table("b,a\n1,1\n0,0\n"));
    assertEquals(2, out.toString().lines().count());
  }

  @Test
  void aHeaderThatDoesNotFitIsAWrongCall() throws IOException {
    assertEquals(2, table("a,z\n1,1\n"));
    assertTrue(err.toString().contains("'z' is no parameter of the family; it has a, b"));
    assertEquals("", out.toString());
  }

  private int table(String text) throws IOException {
    String table = Files.writeString(folder.resolve("p.csv"), text).toString();
    return run("point", spec, "--family", "stretched-rotor", "--from", table, "--json");
  }

  private int run(String... arguments) {
    return Rankfall.commandLine(
            new Program(), new PrintWriter(out, true), new PrintWriter(err, true))
        .execute(arguments);
  }
}
