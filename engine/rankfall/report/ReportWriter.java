package rankfall.report;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Findings;

/**
 * Writes the report folder of a family and the table over all families. Every file appears whole or
 * not at all; the same analysis gives the same bytes.
 */
public final class ReportWriter {
  /** The files of a family that this writer owns; any other file of the folder is left alone. */
  private static final List<String> OWN =
      List.of(
          "result.json",
          "structure.csv",
          "killing.csv",
          "dual.csv",
          "conditions.csv",
          "strata.csv",
          "regions.csv",
          "scan.csv",
          "appendix.tex",
          "report.html");

  private ReportWriter() {}

  /**
   * Writes the folder of one family, named after it. A file that this analysis does not give, but
   * an earlier one left, is removed. A failed family gets {@code result.json} and {@code
   * report.html}; tables hold the first component where they have no column for it.
   *
   * @param analysis of any status
   * @param output the folder over all families; made if it does not exist
   * @throws IOException if a file cannot be written
   */
  public static void write(Analysis analysis, Path output) throws IOException {
    Map<String, String> files = files(analysis);
    AtomicFolder folder = new AtomicFolder(output.resolve(analysis.spec().family()));
    for (String name : OWN) {
      if (files.containsKey(name)) {
        folder.put(name, files.get(name));
      } else {
        folder.remove(name);
      }
    }
  }

  /**
   * Writes {@code summary.csv}.
   *
   * @param rows a row a family, in their order
   * @param output the folder over all families; made if it does not exist
   * @throws IOException if the file cannot be written
   */
  public static void writeSummary(List<SummaryRow> rows, Path output) throws IOException {
    new AtomicFolder(output).put("summary.csv", CsvFiles.summary(rows));
  }

  private static Map<String, String> files(Analysis a) {
    Map<String, String> out = new TreeMap<>();
    out.put("result.json", JsonFile.of(a));
    out.put("report.html", HtmlPage.of(a));
    a.findings().ifPresent(f -> out.putAll(tables(a, f)));
    return out;
  }

  private static Map<String, String> tables(Analysis a, Findings f) {
    Map<String, String> out = new TreeMap<>();
    Contents contents = Contents.of(a);
    out.put("appendix.tex", LatexAppendix.of(a));
    if (contents.hasComponents()) {
      Component first = f.components().get(0);
      out.put("structure.csv", CsvFiles.structure(first));
      out.put("killing.csv", CsvFiles.matrix(first.basis(), first.killing().entries()));
      out.put("conditions.csv", CsvFiles.conditions(f.components()));
      first.dual().ifPresent(d -> out.put("dual.csv", CsvFiles.matrix(first.basis(), d)));
    }
    if (contents.hasStrata()) {
      out.put("strata.csv", CsvFiles.strata(f));
    }
    if (contents.hasRegions()) {
      out.put("regions.csv", CsvFiles.regions(f));
    }
    f.scan()
        .filter(s -> !s.points().isEmpty())
        .ifPresent(s -> out.put("scan.csv", ScanTables.points(s)));
    return out;
  }
}
