package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import rankfall.Analysis;

class ReportWriterTest {
  @TempDir private Path out;

  private static List<String> names(Path folder) throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(f -> f.getFileName().toString()).sorted().toList();
    }
  }

  @Test
  void stratifiedFamilyGetsAllTables() throws IOException {
    ReportWriter.write(SampleAnalyses.stratified(), out);
    assertEquals(
        List.of(
            "appendix.tex",
            "conditions.csv",
            "killing.csv",
            "regions.csv",
            "report.html",
            "result.json",
            "strata.csv",
            "structure.csv"),
        names(out.resolve("stretched-rotor")));
  }

  @Test
  void strataThatWereNotComputedGetNoTable() throws IOException {
    ReportWriter.write(SampleAnalyses.scaled(), out);
    assertEquals(
        List.of(
            "appendix.tex",
            "conditions.csv",
            "dual.csv",
            "killing.csv",
            "report.html",
            "result.json",
            "structure.csv"),
        names(out.resolve("scaled-sl2")));
  }

  @Test
  void varietyThatWasNotDecomposedGetsNoEmptyTables() throws IOException {
    ReportWriter.write(SampleAnalyses.undecomposed(), out);
    assertEquals(
        List.of("appendix.tex", "report.html", "result.json"),
        names(out.resolve("stretched-rotor")));
  }

  @Test
  void whatAnEarlierRunLeftIsRemovedButForeignFilesStay() throws IOException {
    Analysis before = SampleAnalyses.stratified();
    ReportWriter.write(before, out);
    Path folder = out.resolve("stretched-rotor");
    Files.writeString(folder.resolve("notes.csv"), "a\r\n");
    Analysis failed =
        new Analysis(
            before.spec(),
            before.version(),
            Analysis.Status.FAILED,
            "no",
            List.of(),
            List.of(),
            Optional.empty());
    ReportWriter.write(failed, out);
    assertEquals(List.of("notes.csv", "report.html", "result.json"), names(folder));
  }

  @Test
  void sameAnalysisGivesSameBytes() throws IOException {
    for (String run : List.of("one", "two")) {
      ReportWriter.write(LargeAnalyses.manyStrata(25), out.resolve(run));
    }
    Path one = out.resolve("one/stretched-rotor");
    for (String name : names(one)) {
      assertArrayEquals(
          Files.readAllBytes(one.resolve(name)),
          Files.readAllBytes(out.resolve("two/stretched-rotor").resolve(name)),
          name);
    }
  }

  @Test
  void fileThatCannotBePutInPlaceLeavesNothingBehind() throws IOException {
    Path folder = out.resolve("scaled-sl2");
    Files.createDirectories(folder.resolve("result.json/occupied"));
    assertThrows(IOException.class, () -> ReportWriter.write(SampleAnalyses.scaled(), out));
    assertTrue(names(folder).stream().noneMatch(n -> n.endsWith(".part")));
  }

  @Test
  void summaryStandsOverTheFamilies() throws IOException {
    ReportWriter.writeSummary(List.of(SummaryRow.of(SampleAnalyses.scaled())), out);
    assertEquals(
        "scaled-sl2,complete,3,3,2,1,3,2,1,1,,,,",
        Files.readAllLines(out.resolve("summary.csv")).get(1));
  }

  @Test
  void rowNeedsACellAColumn() {
    assertThrows(IllegalArgumentException.class, () -> new SummaryRow(List.of("a", "b")));
  }
}
