package rankfall.report;

import java.util.List;

/**
 * Fills that tell areas apart: colours on a screen, patterns on paper.
 *
 * <p>The colours are those of Okabe and Ito, Color Universal Design (2008), without black: people
 * with any kind of colour vision tell them apart. Beyond seven areas the colours come back with a
 * pattern over them.
 */
final class Palette {
  /** Sky blue, orange, bluish green, yellow, reddish purple, vermilion, blue. */
  static final List<String> COLOURS =
      List.of("#56B4E9", "#E69F00", "#009E73", "#F0E442", "#CC79A7", "#D55E00", "#0072B2");

  /** What fills a tile of 12 by 12; the first is dotted, so that no area stays white. */
  private static final List<String> TILES =
      List.of(
          "<circle cx=\"3\" cy=\"3\" r=\"1\"></circle><circle cx=\"9\" cy=\"9\" r=\"1\"></circle>",
          "<path d=\"M-3 3L3 -3M0 12L12 0M9 15L15 9\"></path>",
          "<path d=\"M-3 9L3 15M0 0L12 12M9 -3L15 3\"></path>",
          "<path d=\"M0 3H12M0 9H12\"></path>",
          "<path d=\"M3 0V12M9 0V12\"></path>",
          "<path d=\"M0 0L12 12M0 12L12 0\"></path>",
          "<path d=\"M0 6H12M6 0V12\"></path>",
          "<circle cx=\"6\" cy=\"6\" r=\"2.5\"></circle>",
          "<path d=\"M-3 3L3 -3M0 12L12 0M9 15L15 9M-3 9L9 -3M3 15L15 3\"></path>",
          "<path d=\"M-3 9L3 15M0 0L12 12M9 -3L15 3M-3 3L9 15M3 -3L15 9\"></path>",
          "<path d=\"M0 2H12M0 6H12M0 10H12\"></path>",
          "<path d=\"M2 0V12M6 0V12M10 0V12\"></path>",
          "<path d=\"M0 6L6 0L12 6L6 12Z\"></path>",
          "<path d=\"M0 9L3 3L6 9L9 3L12 9\"></path>");

  private Palette() {}

  /** Number of fills that differ in colour or pattern. */
  static int size() {
    return TILES.size();
  }

  /** The class of an area or chip, for a number from 0. */
  static String fill(int number) {
    return "fill-" + number % size();
  }

  /** One invisible picture that holds the patterns; a page needs it once. */
  static String patterns() {
    StringBuilder out = new StringBuilder();
    out.append(
        "<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"tiles\" width=\"0\" height=\"0\""
            + " aria-hidden=\"true\"><defs>\n");
    for (int k = 0; k < size(); k++) {
      out.append(tile("tile-" + k, "tile", "", TILES.get(k)));
      if (k >= COLOURS.size()) {
        String ground = "<rect width=\"12\" height=\"12\" fill=\"" + colour(k) + "\"></rect>";
        out.append(tile("tint-" + k, "tile", ground, TILES.get(k)));
      }
    }
    out.append(
        tile("tile-none", "tile none", "", "<path d=\"M-3 3L3 -3M0 12L12 0M9 15L15 9\"></path>"));
    return out.append("</defs></svg>\n").toString();
  }

  private static String tile(String id, String style, String ground, String lines) {
    return "<pattern id=\""
        + id
        + "\" class=\""
        + style
        + "\" width=\"12\" height=\"12\" patternUnits=\"userSpaceOnUse\">"
        + ground
        + lines
        + "</pattern>\n";
  }

  /** Rules of style for the fills, for a screen and for paper. */
  static String style() {
    StringBuilder screen = new StringBuilder();
    StringBuilder paper = new StringBuilder("@media print {\n");
    for (int k = 0; k < size(); k++) {
      String fill = k < COLOURS.size() ? colour(k) : "url(#tint-" + k + ")";
      screen.append("." + fill(k) + " { fill: " + fill + "; }\n");
      paper.append("  ." + fill(k) + " { fill: url(#tile-" + k + "); }\n");
    }
    return screen.append(paper).append("}\n").toString();
  }

  private static String colour(int number) {
    return COLOURS.get(number % COLOURS.size());
  }
}
