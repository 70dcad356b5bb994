package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.io.Reader;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.PointResult;
import rankfall.PointSpecs;
import rankfall.Points;
import rankfall.spec.SpecException;

final class PointFormsTest {
  @Test
  void jsonHasTheKeysOfTheContractInTheirOrder() throws SpecException {
    assertEquals(
        "{\"family\": \"stretched-rotor\", \"parameters\": {\"a\": \"1\", \"b\": \"-3/2\"},"
            + " \"generators\": 3, \"dimension\": 3, \"closed\": true, \"killing\": {\"rank\": 3,"
            + " \"plus\": 2, \"minus\": 1, \"zero\": 0, \"determinant\": \"-18\", \"matrix\":"
            + " [[\"3\", \"0\", \"0\"], [\"0\", \"-2\", \"0\"], [\"0\", \"0\", \"3\"]]},"
            + " \"derivedSeries\": [3], \"lowerCentralSeries\": [3], \"centre\": 0, \"radical\":"
            + " 0, \"nilradical\": 0, \"unimodular\": true, \"invariantForms\": {\"dimension\": 1,"
            + " \"maximalRank\": 3}, \"abelian\": false, \"nilpotent\": false, \"solvable\":"
            + " false, \"semisimple\": true, \"reductive\": true, \"compact\": false,"
            + " \"stratum\": null, \"type\": \"sl(2,R)\"}\n",
        text(new PointJson(), PointSpecs.ROTOR, "b=-3/2 a=1"));
  }

  @Test
  void jsonOfAFailureSaysWhy() throws SpecException {
    assertEquals(
        "{\"family\": \"half-open\", \"parameters\": {\"c\": \"1\", \"d\": \"1\"}, \"generators\":"
            + " 3, \"dimension\": 3, \"closed\": false, \"error\": \"the span is not closed: [X,"
            + " Z] leaves it\"}\n",
        text(new PointJson(), PointSpecs.OPEN, "c=1 d=1"));
    assertEquals(
        "{\"family\": \"half-open\", \"parameters\": {\"c\": \"1\", \"d\": \"0\"}, \"generators\":"
            + " 3, \"error\": \"entry has a pole: d = 0\"}\n",
        text(new PointJson(), PointSpecs.OPEN, "c=1 d=0"));
  }

  @Test
  void jsonOfAComplexAlgebraHasNoSignature() throws SpecException {
    String json = text(new PointJson(), PointSpecs.COMPLEX_ROTOR, "a=1 b=1");
    assertEquals(
        "\"rank\": 3, \"plus\": null, \"minus\": null, \"zero\": null,",
        json.substring(json.indexOf("\"rank\""), json.indexOf(" \"determinant\"")));
  }

  @Test
  void aRankThatIsNotProvedIsNoNumber() throws SpecException {
    PointResult.Facts f =
        (PointResult.Facts) PointSpecs.points(PointSpecs.ROTOR).at(PointSpecs.point("a=1 b=1"));
    PointResult.Facts open =
        new PointResult.Facts(
            f.family(),
            f.parameters(),
            f.generators(),
            f.dimension(),
            f.killing(),
            f.derivedSeries(),
            f.lowerCentralSeries(),
            f.centre(),
            f.radical(),
            f.nilradical(),
            f.unimodular(),
            new PointResult.InvariantForms(5, 2, false),
            f.abelian(),
            f.nilpotent(),
            f.solvable(),
            f.semisimple(),
            f.reductive(),
            f.compact(),
            f.stratum(),
            f.type());
    assertContains("{\"dimension\": 5, \"maximalRank\": null}", new PointJson().text(open));
    assertContains(",5,,false,", new PointCsv(List.of("a", "b")).text(open));
    assertContains("5, the greatest rank at least 2\n", new PointText().text(open));
  }

  @Test
  void csvHasAColumnAFact() throws SpecException {
    PointCsv csv = new PointCsv(List.of("a", "b"));
    assertEquals(
        "a,b,generators,dimension,closed,rank,plus,minus,zero,determinant,derived_series,"
            + "lower_central_series,centre,radical,nilradical,unimodular,invariant_forms,"
            + "invariant_forms_maximal_rank,abelian,nilpotent,solvable,semisimple,reductive,"
            + "compact,stratum,type,error\r\n",
        csv.head());
    assertEquals(
        "0,1,3,3,true,1,0,1,2,0,3; 2; 0,3; 2,0,3,2,true,1,1,"
            + "false,false,true,false,false,false,,Bianchi VII_0,\r\n",
        text(csv, PointSpecs.ROTOR, "a=0 b=1"));
    String bad = text(new PointCsv(List.of("c", "d")), PointSpecs.OPEN, "c=1 d=1");
    assertEquals(
        "1,1,3,3,false,,,,,,,,,,,,,,,,,,,,,,\"the span is not closed: [X, Z] leaves it\"\r\n", bad);
    assertEquals(csv.head().split(",").length, bad.replace("X, Z", "X Z").split(",").length);
  }

  @Test
  void textIsShortAndAligned() throws SpecException {
    assertEquals(
        """
        stretched-rotor at a = 1, b = -3/2
          dimension             3 from 3 generators
          Killing form          rank 3: 2 positive, 1 negative, 0 zero
          determinant           -18
          matrix                3   0  0
                                0  -2  0
                                0   0  3
          derived series        3
          lower central series  3
          centre                0
          radical               0
          nilradical            0
          invariant forms       1, the greatest rank 3
          properties            semisimple, reductive, unimodular
          type                  sl(2,R)
          also called           so(2,1), su(1,1), sp(2,R), Bianchi VIII, A_{3,8}

        """,
        text(new PointText(), PointSpecs.ROTOR, "a=1 b=-3/2"));
    assertEquals(
        "half-open at c = 0, d = 0\n  no answer: entry has a pole: d = 0\n\n",
        text(new PointText(), PointSpecs.OPEN, "c=0 d=0"));
  }

  @Test
  void badRowsAreAnsweredInTheirPlace() throws Exception {
    List<String> errors =
        errors("\uFEFFb, a\r\n1,0.5\r\n\r\nx,1\r\n1\r\n1,2,3\r\n\"1,1\r\n1e-1,1/0\r\n\"2\",-1\r\n");
    assertEquals(
        List.of(
            "",
            "line 4: 'x' is no rational number for 'b'; write for example 3/2",
            "line 5: 1 cells under a header of 2",
            "line 6: 3 cells under a header of 2",
            "line 7: broken quote",
            "line 8: '1/0' is no rational number for 'a'; write for example 3/2",
            ""),
        errors);
  }

  @Test
  void rowsAreReadWhenTheyAreAskedFor() throws Exception {
    Reader broken =
        new StringReader("a,b\n1,1\n") {
          private boolean first = true;

          @Override
          public int read(char[] to, int from, int length) throws IOException {
            if (!first) {
              throw new IOException("torn");
            }
            first = false;
            return super.read(to, from, length);
          }
        };
    Iterator<PointResult> rows = PointTable.answers(PointSpecs.points(PointSpecs.ROTOR), broken);
    assertThrows(UncheckedIOException.class, rows::next);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "`` | the table is empty; its first line names columns",
        "a | the header of the table: no value for the parameter 'b'",
        "a,b,c | the header of the table: 'c' is no parameter of the family; it has a, b",
        "a,b,a | the header of the table names 'a' twice",
        "a,\"b | the header of the table has a broken quote"
      })
  void aHeaderThatDoesNotFitIsExplained(String header, String message) throws SpecException {
    Points points = PointSpecs.points(PointSpecs.ROTOR);
    IllegalArgumentException wrong =
        assertThrows(
            IllegalArgumentException.class,
            () -> PointTable.answers(points, new StringReader(header)));
    assertEquals(message, wrong.getMessage());
  }

  private static List<String> errors(String table) throws SpecException, IOException {
    Iterator<PointResult> rows =
        PointTable.answers(PointSpecs.points(PointSpecs.ROTOR), new StringReader(table));
    List<String> out = new ArrayList<>();
    while (rows.hasNext()) {
      PointResult row = rows.next();
      out.add(row instanceof PointResult.Failure failure ? failure.error() : "");
    }
    return out;
  }

  private static String text(PointWriter writer, String spec, String point) throws SpecException {
    return writer.text(PointSpecs.points(spec).at(PointSpecs.point(point)));
  }

  private static void assertContains(String part, String whole) {
    assertEquals(part, whole.contains(part) ? part : whole);
  }
}
