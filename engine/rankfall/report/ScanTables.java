package rankfall.report;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.stream.Collectors;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Region;
import rankfall.Analysis.Stratum;
import rankfall.ScanAxis;
import rankfall.ScanCount;
import rankfall.ScanCounts;
import rankfall.SignCondition;
import rankfall.exact.Rationals;
import rankfall.scan.Columns;
import rankfall.scan.DecimalText;
import rankfall.scan.Finding;
import rankfall.scan.Tally;

/** What a scan writes: cells of {@code scan.csv}, and the table of its counts. */
public final class ScanTables {
  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180.builder().setRecordSeparator("\r\n").get();

  private ScanTables() {}

  /**
   * Cells as a part of a row.
   *
   * @param cells any texts
   * @return joined by commas, quoted where they need it, without line end
   */
  public static String cells(List<String> cells) {
    StringBuilder out = new StringBuilder();
    try (CSVPrinter printer = new CSVPrinter(out, FORMAT)) {
      for (String c : cells) {
        printer.print(c);
      }
    } catch (IOException e) {
      throw new UncheckedIOException("a string cannot be written", e);
    }
    return out.toString();
  }

  /**
   * The table of counts as CSV: a row for each region and locus that points fell on, in the order
   * of the strata, then a row for each kind of point without an algebra.
   *
   * @param analysis that was scanned
   * @param tally of the points
   */
  public static String counts(Analysis analysis, Tally tally) {
    StringBuilder out = new StringBuilder();
    out.append(
        cells(
            List.of(
                "status",
                "stratum",
                "equations",
                "region",
                "conditions",
                "dimension",
                "rank",
                "plus",
                "minus",
                "zero",
                "type",
                "direct",
                "points")));
    out.append("\r\n");
    for (List<String> row : rows(analysis, tally)) {
      out.append(cells(row)).append("\r\n");
    }
    return out.toString();
  }

  /**
   * {@code scan.csv} of a default grid.
   *
   * @param scan whose points are listed
   */
  static String points(ScanCounts scan) {
    List<String> names = scan.axes().stream().map(ScanAxis::name).toList();
    StringBuilder out = new StringBuilder();
    out.append(cells(Columns.all(names).header())).append("\r\n");
    int[] at = new int[names.size()];
    for (int place : scan.points()) {
      List<BigFraction> values = new ArrayList<>();
      for (int v = 0; v < at.length; v++) {
        values.add(scan.axes().get(v).values().get(at[v]));
      }
      List<String> row = new ArrayList<>();
      values.forEach(v -> row.add(Rationals.text(v)));
      values.forEach(v -> row.add(DecimalText.of(v)));
      row.addAll(facts(scan.counts().get(place)));
      out.append(cells(row)).append("\r\n");
      for (int v = at.length - 1; v >= 0; v--) {
        at[v] = (at[v] + 1) % scan.axes().get(v).values().size();
        if (at[v] > 0) {
          break;
        }
      }
    }
    return out.toString();
  }

  private static List<String> facts(ScanCount c) {
    return List.of(
        c.status(),
        number(c.dimension()),
        number(c.rank()),
        c.signature().map(s -> Integer.toString(s.plus())).orElse(""),
        c.signature().map(s -> Integer.toString(s.minus())).orElse(""),
        c.signature().map(s -> Integer.toString(s.zero())).orElse(""),
        c.stratum(),
        c.region(),
        c.type());
  }

  private static String number(OptionalInt n) {
    return n.isPresent() ? Integer.toString(n.getAsInt()) : "";
  }

  private static List<List<String>> rows(Analysis analysis, Tally tally) {
    Map<String, String> equations = new HashMap<>();
    Map<String, String> conditions = new HashMap<>();
    Map<String, Integer> order = new HashMap<>();
    analysis.findings().ifPresent(f -> texts(f, equations, conditions, order));
    List<List<String>> out = new ArrayList<>();
    tally.points().entrySet().stream()
        .sorted(Map.Entry.comparingByKey(order(order)))
        .forEach(
            e -> {
              Finding f = e.getKey();
              out.add(
                  List.of(
                      Columns.Fact.STATUS.cell(f),
                      f.stratum(),
                      equations.getOrDefault(f.stratum(), ""),
                      f.region(),
                      conditions.getOrDefault(key(f.stratum(), f.region()), ""),
                      Columns.Fact.DIMENSION.cell(f),
                      Columns.Fact.RANK.cell(f),
                      Columns.Fact.PLUS.cell(f),
                      Columns.Fact.MINUS.cell(f),
                      Columns.Fact.ZERO.cell(f),
                      f.type(),
                      f.direct() ? "yes" : "no",
                      Long.toString(e.getValue())));
            });
    return out;
  }

  private static void texts(
      Findings f,
      Map<String, String> equations,
      Map<String, String> conditions,
      Map<String, Integer> order) {
    for (Stratum s : f.strata()) {
      equations.put(s.name(), CsvFiles.equations(s.equations()));
      for (Region r : f.regions()) {
        if (r.stratum().equals(s.name())) {
          order.put(key(s.name(), r.name()), order.size());
          conditions.put(
              key(s.name(), r.name()),
              r.conditions().stream()
                  .map(SignCondition::toString)
                  .collect(Collectors.joining("; ")));
        }
      }
      order.put(key(s.name(), ""), order.size());
    }
  }

  private static String key(String stratum, String region) {
    return stratum + " " + region;
  }

  private static Comparator<Finding> order(Map<String, Integer> order) {
    return Comparator.comparing(Finding::status)
        .thenComparing(f -> order.getOrDefault(key(f.stratum(), f.region()), -1))
        .thenComparing(f -> f.dimension().orElse(-1), Comparator.reverseOrder())
        .thenComparing(f -> f.rank().orElse(-1), Comparator.reverseOrder())
        .thenComparing(f -> f.signature().map(Analysis.Signature::plus).orElse(-1))
        .thenComparing(Finding::type)
        .thenComparing(Finding::direct);
  }
}
