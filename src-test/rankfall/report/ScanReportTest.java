package rankfall.report;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.InputFormat;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import rankfall.Analysis;
import rankfall.Analysis.Signature;
import rankfall.ScanAxis;
import rankfall.ScanCount;
import rankfall.ScanCounts;

/** A default grid in every form of the report. */
final class ScanReportTest {
  @TempDir private Path out;

  /** A grid of 2 by 3 points by hand: one outside, one on the locus S2, four in S1. */
  private static Analysis scanned() {
    Analysis a = SampleAnalyses.stratified();
    ScanCounts scan =
        new ScanCounts(
            List.of(
                new ScanAxis("a", List.of(BigFraction.ONE, BigFraction.of(-1, 2))),
                new ScanAxis(
                    "b", List.of(BigFraction.ZERO, BigFraction.of(1, 3), BigFraction.of(2, 3)))),
            List.of(
                count("ok", "S1", OptionalInt.of(3), Optional.of(new Signature(2, 1, 0)), 4),
                count("ok", "S2", OptionalInt.of(1), Optional.of(new Signature(0, 1, 2)), 1),
                count("outside", "", OptionalInt.empty(), Optional.empty(), 1)),
            List.of(1, 0, 0, 0, 0, 2));
    return new Analysis(
        a.spec(),
        a.version(),
        a.status(),
        a.message(),
        a.remarks(),
        a.undecided(),
        a.findings().map(f -> f.with(scan)));
  }

  private static ScanCount count(
      String status, String stratum, OptionalInt rank, Optional<Signature> signature, long points) {
    return new ScanCount(
        status,
        stratum,
        "",
        rank.isPresent() ? OptionalInt.of(3) : OptionalInt.empty(),
        rank,
        signature,
        "",
        points);
  }

  @Test
  void theTableHasARowForEachPoint() throws IOException {
    ReportWriter.write(scanned(), out);
    assertEquals(
        String.join(
            "\r\n",
            "a,b,a_decimal,b_decimal,status,dimension,rank,plus,minus,zero,stratum,region,type",
            "1,0,1,0,ok,3,1,0,1,2,S2,,",
            "1,1/3,1,0.333333333333333,ok,3,3,2,1,0,S1,,",
            "1,2/3,1,0.666666666666667,ok,3,3,2,1,0,S1,,",
            "-1/2,0,-0.5,0,ok,3,3,2,1,0,S1,,",
            "-1/2,1/3,-0.5,0.333333333333333,ok,3,3,2,1,0,S1,,",
            "-1/2,2/3,-0.5,0.666666666666667,outside,,,,,,,,",
            ""),
        Files.readString(out.resolve("stretched-rotor/scan.csv")));
  }

  @Test
  void theResultKeepsItsSchema() throws IOException {
    try (InputStream in = JsonFile.class.getResourceAsStream("result-schema.json")) {
      String json = JsonFile.of(scanned());
      assertTrue(json.contains("\"points\""), json);
      assertEquals(
          "[]",
          SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
              .getSchema(new String(in.readAllBytes(), UTF_8))
              .validate(json, InputFormat.JSON)
              .toString());
    }
  }

  /** Columns of equal cells are drawn as one; a = -1/2 stands left of a = 1. */
  @Test
  void thePageDrawsTwoParameters() throws Exception {
    String page = HtmlPage.of(scanned());
    Xml.parse(page);
    int begin = page.indexOf("<section id=\"grid\">");
    String grid = page.substring(begin, page.indexOf("</section>", begin));
    assertTrue(grid.contains("S1, in no region"), grid);
    assertTrue(grid.contains("outside the conditions of the spec"), grid);
    int picture = grid.indexOf("<title id=\"grid-title\">");
    String drawn = grid.substring(picture, grid.indexOf("</svg>", picture));
    assertEquals(3, drawn.split("class=\"area ").length - 1, "one path for each count");
    assertEquals(4, drawn.split("Z").length - 1, "runs of equal cells: 2 and 2 on the columns");
  }

  @Test
  void withoutAGridThereIsNoSection() {
    assertFalse(HtmlPage.of(SampleAnalyses.stratified()).contains("id=\"grid\""));
  }
}
