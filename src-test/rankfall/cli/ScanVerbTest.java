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
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.PointSpecs;

/**
 * The verb with the rooms of the program itself. Of the rotor [X, Y] = Z, [Y, Z] = a*X, [Z, X] =
 * b*Y the form is diag(-2 b, -2 a, -2 a b) up to order (Milnor 1976).
 */
final class ScanVerbTest {
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

  private int scan(String family, String... options) {
    List<String> call = new java.util.ArrayList<>(List.of("scan", spec, "--family", family));
    call.addAll(List.of(options));
    return Rankfall.commandLine(
            new Program(), new PrintWriter(out, true), new PrintWriter(err, true))
        .execute(call.toArray(new String[0]));
  }

  @Test
  void countsAreATable() {
    assertEquals(
        0, scan("stretched-rotor", "--count", "--grid", "a=-1;0;1,b=-1;0;1"), err::toString);
    List<String> rows = out.toString().lines().toList();
    assertEquals(
        "status,stratum,equations,region,conditions,dimension,rank,plus,minus,zero,type,direct,points",
        rows.get(0));
    long points =
        rows.stream().skip(1).mapToLong(r -> Long.parseLong(r.replaceAll(".*,", ""))).sum();
    assertEquals(9, points);
    assertTrue(rows.stream().anyMatch(r -> r.contains(",3,3,0,3,0,") && r.endsWith(",1")), "so(3)");
    assertTrue(err.toString().startsWith("stretched-rotor: 9 points, "), err.toString());
  }

  @Test
  void listedPointsKeepTheirOrderAndBadOnesAreSaidSo() throws IOException {
    Path table = Files.writeString(folder.resolve("p.csv"), "b,a\n1,1\n1/0,1\n-2,0.5\n3\n");
    Path written = folder.resolve("x.csv");
    assertEquals(
        1,
        scan(
            "stretched-rotor",
            "--from",
            table.toString(),
            "--out",
            written.toString(),
            "--columns",
            "status,a,b,plus,minus"));
    assertEquals(
        "status,a,b,plus,minus\r\nok,1,1,0,3\r\nunreadable,1,1/0,,\r\nok,1/2,-2,2,1\r\n"
            + "unreadable,,3,,\r\n",
        Files.readString(written));
    assertTrue(err.toString().contains("2 unreadable"), err.toString());
    assertEquals("", out.toString());
  }

  @Test
  void functionsOfAParameterAreCoordinates() throws IOException {
    Path table = Files.writeString(folder.resolve("p.csv"), "cos(t),sin(t)\n3/5,4/5\n1,1\n");
    Path written = folder.resolve("x.csv");
    assertEquals(
        0,
        scan(
            "turned-plane",
            "--from",
            table.toString(),
            "--out",
            written.toString(),
            "--columns",
            "cos(t),status,rank"));
    assertEquals("cos(t),status,rank\r\n3/5,ok,1\r\n1,off,\r\n", Files.readString(written));
    assertEquals(0, scan("turned-plane", "--count", "--grid", "t=0"));
    assertTrue(out.toString().contains("ok,"), out.toString());
  }

  @ParameterizedTest
  @CsvSource({
    "stretched-rotor, a=1, no value for the parameter 'b'",
    "stretched-rotor, 'a=1,b=1,c=1', 'c' is no parameter of the family",
    "stretched-rotor, 'a=1,b=1:1:3', a step of 0",
    "stretched-rotor, 'a=1,b=1:-1:3', reversed",
    "turned-plane, t=0;1, functions of 't' are irrational but at 0",
    "turned-plane, 't=0,cos(t)=1,sin(t)=0', are both given"
  })
  void pointsThatDoNotFitAreAWrongCall(String family, String grid, String message) {
    Path written = folder.resolve("x.csv");
    assertEquals(2, scan(family, "--grid", grid, "--out", written.toString()));
    assertTrue(err.toString().contains(message), err.toString());
    assertFalse(Files.exists(written));
  }

  @Test
  void withoutPointsOrAScanInTheSpecItIsAWrongCall() {
    assertEquals(2, scan("stretched-rotor", "--count"));
    assertTrue(err.toString().contains("the spec has no 'scan'"), err.toString());
  }

  @Test
  void anotherSpecIsNotGoneOnWith() throws IOException {
    String written = folder.resolve("x.csv").toString();
    assertEquals(0, scan("stretched-rotor", "--grid", "a=0;1,b=1", "--out", written));
    byte[] before = Files.readAllBytes(Path.of(written));
    assertEquals(0, scan("stretched-rotor", "--grid", "a=0;1,b=1", "--out", written, "--resume"));
    assertTrue(err.toString().contains("all points are there already"), err.toString());
    assertEquals(2, scan("stretched-rotor", "--grid", "a=0;2,b=1", "--out", written, "--resume"));
    assertTrue(err.toString().contains("the log of another scan"), err.toString());
    Files.writeString(Path.of(spec), "\n# another text", java.nio.file.StandardOpenOption.APPEND);
    assertEquals(2, scan("stretched-rotor", "--grid", "a=0;1,b=1", "--out", written, "--resume"));
    assertTrue(err.toString().contains("it says 'spec "), err.toString());
    assertEquals(-1, java.util.Arrays.mismatch(before, Files.readAllBytes(Path.of(written))));
  }
}
