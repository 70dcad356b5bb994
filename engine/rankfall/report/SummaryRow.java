package rankfall.report;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Signature;

/**
 * A row of {@code summary.csv}.
 *
 * @param cells one text a column, in the order of {@link #HEADER}; empty where nothing is known
 */
public record SummaryRow(List<String> cells) {
  /** The columns. */
  public static final List<String> HEADER =
      List.of(
          "family",
          "status",
          "generators",
          "dimension",
          "parameters",
          "components",
          "generic_rank",
          "generic_plus",
          "generic_minus",
          "conditions",
          "strata",
          "regions",
          "type",
          "message");

  /**
   * Copies the cells and checks their number.
   *
   * @param cells one text a column
   */
  public SummaryRow {
    cells = List.copyOf(cells);
    if (cells.size() != HEADER.size()) {
      throw new IllegalArgumentException(cells.size() + " cells for " + HEADER.size() + " columns");
    }
  }

  /**
   * The row of a spec that could not be read.
   *
   * @param family its name, or the file where the name is unknown
   * @param message the first line of the fault
   * @return a row with status {@code failed}
   */
  public static SummaryRow failed(String family, String message) {
    return new SummaryRow(
        List.of(family, "failed", "", "", "", "", "", "", "", "", "", "", "", message));
  }

  /**
   * The row of an analysis; {@code generic_rank} and the signature are those of the first
   * component.
   *
   * @param analysis of any status
   * @return its row
   */
  public static SummaryRow of(Analysis analysis) {
    Optional<Findings> found = analysis.findings();
    Optional<Component> first = found.flatMap(f -> f.components().stream().findFirst());
    Optional<Signature> signature = first.flatMap(c -> c.killing().signature());
    Contents contents = Contents.of(analysis);
    return new SummaryRow(
        List.of(
            analysis.spec().family(),
            analysis.status().name().toLowerCase(Locale.ROOT),
            Integer.toString(analysis.spec().presentation().generators().size()),
            first.map(c -> Integer.toString(c.basis().size())).orElse(""),
            Integer.toString(analysis.spec().parameters().size()),
            count(contents.hasComponents(), found.map(f -> f.components().size())),
            first.map(c -> Integer.toString(c.killing().rank())).orElse(""),
            signature.map(s -> Integer.toString(s.plus())).orElse(""),
            signature.map(s -> Integer.toString(s.minus())).orElse(""),
            count(
                contents.hasComponents(),
                found.map(f -> f.components().stream().mapToInt(c -> c.conditions().size()).sum())),
            count(contents.hasStrata(), found.map(f -> f.strata().size())),
            count(contents.hasRegions(), found.map(f -> f.regions().size())),
            found.flatMap(f -> f.strata().stream().findFirst().flatMap(s -> s.type())).orElse(""),
            analysis.message()));
  }

  private static String count(boolean known, Optional<Integer> number) {
    return known ? number.map(n -> Integer.toString(n)).orElse("") : "";
  }
}
