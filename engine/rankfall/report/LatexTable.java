package rankfall.report;

import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/** A table over several pages, as wide as the text, whose cells are paragraphs. */
final class LatexTable {
  private final StringBuilder out = new StringBuilder();

  /**
   * Opens a table.
   *
   * @param caption plain text without special characters
   * @param widths of the columns as shares of the line, together 1
   */
  LatexTable(String caption, List<Double> widths) {
    out.append("\\begin{longtable}{@{}");
    for (double w : widths) {
      out.append(String.format(Locale.ROOT, "p{\\dimexpr%.3f\\linewidth-2\\tabcolsep\\relax}", w));
    }
    out.append("@{}}\n\\caption{").append(caption).append("}\\\\\n\\toprule\n");
  }

  /** The titles of the columns, repeated on every page. */
  void head(String... titles) {
    String cells = cells(List.of(titles));
    out.append(cells)
        .append("\\midrule\n\\endfirsthead\n\\toprule\n")
        .append(cells)
        .append("\\midrule\n\\endhead\n\\bottomrule\n\\endfoot\n");
  }

  /** A row, one piece of LaTeX a cell. */
  void row(String... cells) {
    out.append(cells(List.of(cells)));
  }

  /** A little room between two rows. */
  void space() {
    out.append("\\addlinespace\n");
  }

  private static String cells(List<String> cells) {
    return cells.stream()
        .map(c -> "\\raggedright " + c)
        .collect(Collectors.joining(" &\n", "", " \\tabularnewline\n"));
  }

  /** The closed table. */
  String text() {
    return out + "\\end{longtable}\n";
  }
}
