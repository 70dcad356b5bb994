package rankfall.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.ScanAxis;
import rankfall.ScanCounts;
import rankfall.exact.Rationals;

/** Draws a grid over two names as coloured cells, one a point. */
final class ScanPicture {
  private static final double SIDE = 440;
  private static final double LEFT = 58;
  private static final double TOP = 30;
  private static final double RIGHT = 16;
  private static final double BOTTOM = 48;

  private final ScanCounts scan;
  private final Edges across;
  private final Edges up;
  private final ScanAxis first;
  private final ScanAxis second;

  private ScanPicture(ScanCounts scan) {
    List<Integer> varying = varying(scan);
    this.scan = scan;
    this.first = scan.axes().get(varying.get(0));
    this.second = scan.axes().get(varying.get(1));
    this.across = Edges.of(first);
    this.up = Edges.of(second);
  }

  /** The axes of a grid with more than one value, by their places. */
  static List<Integer> varying(ScanCounts scan) {
    List<Integer> out = new ArrayList<>();
    for (int v = 0; v < scan.axes().size(); v++) {
      if (scan.axes().get(v).values().size() > 1) {
        out.add(v);
      }
    }
    return out;
  }

  /**
   * Where the cells of an axis lie.
   *
   * @param ranks for each value its place in ascending order
   * @param borders one more than values, ascending: halfway between neighbours, and as far beyond
   *     the ends
   */
  private record Edges(List<Integer> ranks, List<BigFraction> borders) {
    static Edges of(ScanAxis axis) {
      List<BigFraction> sorted = axis.values().stream().sorted(Rationals::compare).toList();
      List<BigFraction> borders = new ArrayList<>();
      int last = sorted.size() - 1;
      borders.add(sorted.get(0).subtract(half(sorted.get(0), sorted.get(1))));
      for (int k = 0; k < last; k++) {
        borders.add(sorted.get(k).add(half(sorted.get(k), sorted.get(k + 1))));
      }
      borders.add(sorted.get(last).add(half(sorted.get(last - 1), sorted.get(last))));
      return new Edges(axis.values().stream().map(sorted::indexOf).toList(), borders);
    }

    private static BigFraction half(BigFraction low, BigFraction high) {
      return high.subtract(low).divide(2);
    }

    BigFraction from() {
      return borders.get(0);
    }

    BigFraction to() {
      return borders.get(borders.size() - 1);
    }
  }

  /**
   * One {@code svg} element.
   *
   * @param scan with two axes of more than one value, its points listed
   * @param fills the class of each count
   * @param names what each count is, in words
   */
  static String of(ScanCounts scan, List<String> fills, List<String> names, Formulas formulas) {
    return new ScanPicture(scan).drawn(fills, names, formulas);
  }

  private String drawn(List<String> fills, List<String> names, Formulas formulas) {
    Axes axes =
        new Axes(
            LEFT,
            TOP,
            SIDE,
            SIDE,
            new Axes.Scale(SvgText.of(formulas.text(first.name())), across.from(), across.to()),
            new Axes.Scale(SvgText.of(formulas.text(second.name())), up.from(), up.to()));
    StringBuilder out = new StringBuilder();
    out.append(
        String.format(
            Locale.ROOT,
            "<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"map\" role=\"img\""
                + " aria-labelledby=\"grid-title\" viewBox=\"0 0 %.0f %.0f\">\n"
                + "<title id=\"grid-title\">%s</title>\n",
            LEFT + SIDE + RIGHT,
            TOP + SIDE + BOTTOM,
            Markup.escape(
                "The points of the default grid over "
                    + first.name()
                    + " and "
                    + second.name()
                    + ", each a cell")));
    Map<Integer, StringBuilder> paths = new TreeMap<>();
    for (int i = 0; i < first.values().size(); i++) {
      int[] column = column(i);
      int place = across.ranks.get(i);
      int from = 0;
      for (int j = 1; j <= column.length; j++) {
        if (j == column.length || column[j] != column[from]) {
          paths
              .computeIfAbsent(column[from], k -> new StringBuilder())
              .append(cells(axes, place, from, j));
          from = j;
        }
      }
    }
    paths.forEach(
        (k, d) ->
            out.append("<path class=\"area ")
                .append(fills.get(k))
                .append("\" d=\"")
                .append(d)
                .append("\"><title>")
                .append(Markup.escape(names.get(k)))
                .append("</title></path>\n"));
    return out.append(axes.markup()).append("</svg>\n").toString();
  }

  /** What was found on a column, from the bottom up. */
  private int[] column(int i) {
    int[] out = new int[second.values().size()];
    for (int j = 0; j < out.length; j++) {
      out[up.ranks.get(j)] = scan.points().get(i * out.length + j);
    }
    return out;
  }

  /** Cells on one another, from one to before another one. */
  private String cells(Axes axes, int column, int from, int to) {
    double left = axes.x(across.borders.get(column).doubleValue());
    return String.format(
        Locale.ROOT,
        "M%.1f %.1fH%.1fV%.1fH%.1fZ",
        left,
        axes.y(up.borders.get(from).doubleValue()),
        axes.x(across.borders.get(column + 1).doubleValue()),
        axes.y(up.borders.get(to).doubleValue()),
        left);
  }
}
