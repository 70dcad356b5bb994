package rankfall.report;

import io.pebbletemplates.pebble.extension.escaper.SafeString;
import java.util.List;

/**
 * What the page shows of the region maps.
 *
 * @param patterns the invisible picture that holds the patterns
 * @param style rules of style for the fills
 * @param planes the pictures
 * @param notes why there is no picture, or not more, a sentence each
 */
record MapView(SafeString patterns, SafeString style, List<PlaneView> planes, List<String> notes) {

  /**
   * A picture.
   *
   * @param id an identifier for links
   * @param label the names of its axes
   * @param component which component it lies in; empty if there is only one
   * @param held values of the other coordinates; empty where there are none
   * @param picture the picture
   * @param legend what is seen in it
   */
  record PlaneView(
      String id,
      SafeString label,
      String component,
      List<SafeString> held,
      SafeString picture,
      List<EntryView> legend) {}

  /**
   * What one place is.
   *
   * @param chips small pictures of how it is drawn
   * @param name its short name
   * @param target the row of a table that tells more; may be empty
   * @param formulas where it is; several are alternatives
   * @param words signature and type, or rank and class
   */
  record EntryView(
      List<SafeString> chips,
      String name,
      String target,
      List<SafeString> formulas,
      SafeString words) {}
}
