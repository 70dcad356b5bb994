package rankfall.report;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import rankfall.AlgebraType;
import rankfall.Analysis.Component;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Findings;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.RealPoints;
import rankfall.SignCondition;
import rankfall.exact.Polynomial;

/**
 * The tables as CSV (RFC 4180: CRLF line ends, header first), polynomials in the text form of
 * {@link rankfall.exact.PolynomialText}.
 */
final class CsvFiles {
  private CsvFiles() {}

  /** {@code summary.csv}. */
  static String summary(List<SummaryRow> rows) {
    return table(SummaryRow.HEADER, rows.stream().map(SummaryRow::cells).toList());
  }

  /** {@code structure.csv} of a component. */
  static String structure(Component c) {
    return table(
        List.of("left", "right", "target", "coefficient"),
        c.structure().stream()
            .map(
                s ->
                    List.of(
                        c.basis().get(s.left()),
                        c.basis().get(s.right()),
                        c.basis().get(s.target()),
                        s.coefficient().toString()))
            .toList());
  }

  /** {@code killing.csv} and {@code dual.csv}: entries of a symmetric matrix, upper triangle. */
  static String matrix(List<String> basis, List<MatrixEntry> entries) {
    return table(
        List.of("row", "column", "entry"),
        entries.stream()
            .map(e -> List.of(basis.get(e.row()), basis.get(e.column()), e.value().toString()))
            .toList());
  }

  /** {@code conditions.csv} of all components. */
  static String conditions(List<Component> components) {
    List<List<String>> rows = new ArrayList<>();
    for (Component c : components) {
      for (Condition d : c.conditions()) {
        rows.add(
            List.of(
                Integer.toString(c.number()),
                equations(d.equations()),
                d.multiplicity().map(m -> Integer.toString(m)).orElse(""),
                d.rank().map(r -> Integer.toString(r)).orElse(""),
                d.kernelDimension().map(k -> Integer.toString(k)).orElse(""),
                realPoints(d.realPoints())));
      }
    }
    return table(
        List.of(
            "component", "condition", "multiplicity", "rank", "kernel_dimension", "real_points"),
        rows);
  }

  /** {@code strata.csv}. */
  static String strata(Findings f) {
    return table(
        List.of(
            "stratum",
            "equations",
            "exclusions",
            "codimension",
            "dimension",
            "rank",
            "kernel_dimension",
            "derived",
            "centre",
            "radical",
            "nilradical",
            "class",
            "type",
            "real_points",
            "witness"),
        f.strata().stream()
            .map(
                s ->
                    List.of(
                        s.name(),
                        equations(s.equations()),
                        exclusions(s.exclusions()),
                        Integer.toString(s.codimension()),
                        Integer.toString(s.dimension()),
                        Integer.toString(s.rank()),
                        Integer.toString(s.kernelDimension()),
                        Integer.toString(s.derived()),
                        Integer.toString(s.centre()),
                        Integer.toString(s.radical()),
                        Integer.toString(s.nilradical()),
                        s.kind(),
                        s.type().orElse(""),
                        realPoints(s.realPoints()),
                        witness(s.witness())))
            .toList());
  }

  /** {@code regions.csv}. */
  static String regions(Findings f) {
    return table(
        List.of(
            "stratum", "region", "conditions", "plus", "minus", "zero", "type", "proof", "witness"),
        f.regions().stream()
            .map(
                r ->
                    List.of(
                        r.stratum(),
                        r.name(),
                        r.conditions().stream()
                            .map(SignCondition::toString)
                            .collect(Collectors.joining("; ")),
                        Integer.toString(r.signature().plus()),
                        Integer.toString(r.signature().minus()),
                        Integer.toString(r.signature().zero()),
                        r.type().map(AlgebraType::text).orElse(""),
                        proof(r.exact()),
                        witness(r.witness())))
            .toList());
  }

  /** All vanish: joined with {@code ; }, {@code 0} for the whole space. */
  static String equations(List<Polynomial> equations) {
    return equations.isEmpty()
        ? "0"
        : equations.stream().map(Polynomial::toString).collect(Collectors.joining("; "));
  }

  /** Closed sets joined with {@code | }. */
  static String exclusions(List<List<Polynomial>> sets) {
    return sets.stream().map(CsvFiles::equations).collect(Collectors.joining(" | "));
  }

  /** A point as {@code a=1; b=-3/2}. */
  static String witness(List<Coordinate> point) {
    return point.stream()
        .map(c -> c.variable() + "=" + c.value())
        .collect(Collectors.joining("; "));
  }

  static String realPoints(RealPoints r) {
    return r.name().toLowerCase(Locale.ROOT);
  }

  static String proof(boolean exact) {
    return exact ? "exact" : "sampled";
  }

  private static String table(List<String> header, List<List<String>> rows) {
    StringBuilder out = new StringBuilder();
    CSVFormat format = CSVFormat.RFC4180.builder().setRecordSeparator("\r\n").get();
    try (CSVPrinter printer = new CSVPrinter(out, format)) {
      printer.printRecord(header);
      for (List<String> row : rows) {
        printer.printRecord(row);
      }
    } catch (IOException e) {
      throw new UncheckedIOException("a string cannot be written", e);
    }
    return out.toString();
  }
}
