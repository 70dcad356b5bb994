package rankfall.report;

import io.pebbletemplates.pebble.extension.escaper.SafeString;
import java.util.List;

/**
 * What the page shows of the default grid.
 *
 * @param axes each name with its values, a sentence
 * @param patterns the invisible picture that holds the patterns; empty where the page has it
 *     already
 * @param style rules of style for the fills; empty where the page has them already
 * @param picture the grid as coloured cells; empty unless two names have more than one value
 * @param rows what was found how often
 * @param total how many points
 */
record ScanView(
    SafeString axes,
    List<SafeString> patterns,
    List<SafeString> style,
    List<SafeString> picture,
    List<RowView> rows,
    String total) {

  /**
   * A row of the table of counts.
   *
   * @param chips how the picture shows it; empty without a picture
   * @param name stratum and region, or why there is no algebra
   * @param target the row of a table that tells more; may be empty
   * @param dimension of the algebra; may be empty
   * @param rank of the form; may be empty
   * @param signature of the form; may be empty
   * @param type of the algebra; may be empty
   * @param points how many
   */
  record RowView(
      List<SafeString> chips,
      String name,
      String target,
      String dimension,
      String rank,
      String signature,
      SafeString type,
      String points) {}
}
