package rankfall.spec;

/**
 * Lays a diagnostic out for a person: the headline, the line of the file, and carets below what is
 * at fault.
 */
public final class DiagnosticText {
  /** A longer line is shown in part. */
  private static final int WIDTH = 100;

  private static final int BEFORE = 40;
  private static final String GAP = "...";

  private DiagnosticText() {}

  /**
   * The text of a diagnostic.
   *
   * @param diagnostic the fault
   * @return three lines, or the headline alone where the file has no text to show; each ends with a
   *     line feed
   */
  public static String of(Diagnostic diagnostic) {
    if (diagnostic.sourceLine().isEmpty()) {
      return diagnostic.headline() + "\n";
    }
    int[] line = diagnostic.sourceLine().codePoints().map(c -> c == '\t' ? ' ' : c).toArray();
    int from = diagnostic.place().column() - 1;
    int first = line.length <= WIDTH || from <= BEFORE ? 0 : from - BEFORE;
    int last = Math.min(line.length, first + WIDTH);
    String shown =
        (first > 0 ? GAP : "")
            + new String(line, first, last - first)
            + (last < line.length ? GAP : "");
    int carets =
        Math.max(1, Math.min(from + diagnostic.place().length(), Math.max(last, from + 1)) - from);
    String number = Integer.toString(diagnostic.place().line());
    int indent = from - first + (first > 0 ? GAP.length() : 0);
    return diagnostic.headline()
        + "\n  "
        + number
        + " | "
        + shown
        + "\n  "
        + " ".repeat(number.length())
        + " | "
        + " ".repeat(indent)
        + "^".repeat(carets)
        + "\n";
  }
}
