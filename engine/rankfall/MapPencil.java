package rankfall;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.MapPlane.Strip;
import rankfall.RegionMap.Axis;
import rankfall.RegionMap.Spot;
import rankfall.exact.Interval;
import rankfall.exact.PlaneCells;
import rankfall.exact.PlaneCells.Branch;
import rankfall.exact.PlaneCells.Wall;
import rankfall.exact.PlaneGraphs;
import rankfall.exact.Rationals;

/** Turns graphs into polygonal lines inside a window; nothing is decided here. */
final class MapPencil {
  /** Steps of the grid on which abscissae lie, and of the accuracy of heights. */
  private static final int GRID = 1 << 14;

  /** Pieces of a curve across the whole window. */
  private static final int PIECES = 40;

  private static final int FEWEST_PIECES = 8;

  private final PlaneCells cells;
  private final PlaneGraphs graphs;
  private final BigFraction left;
  private final BigFraction right;
  private final BigFraction grid;
  private final double bottom;
  private final double top;
  private final MapLines lines;
  private final BigFraction accuracy;
  private final List<BigFraction> crossings;

  MapPencil(PlaneCells cells, Axis across, Axis up) {
    this.cells = cells;
    this.left = across.from();
    this.right = across.to();
    this.grid = right.subtract(left).divide(GRID);
    this.bottom = up.from().doubleValue();
    this.top = up.to().doubleValue();
    this.lines = new MapLines(right.subtract(left).doubleValue(), bottom, top);
    this.accuracy = up.to().subtract(up.from()).divide(GRID);
    this.graphs = new PlaneGraphs(cells, Rationals.min(accuracy, grid));
    this.crossings = new ArrayList<>(graphs.crossings(up.from()));
    crossings.addAll(graphs.crossings(up.to()));
  }

  /** The graphs of a strip from end to end, all over the same abscissae; heights may be outside. */
  List<List<Spot>> graphs(Strip s) {
    List<List<Spot>> out = new ArrayList<>();
    List<Branch> branches = s.first().branches();
    branches.forEach(b -> out.add(new ArrayList<>()));
    List<BigFraction> xs = abscissae(s);
    for (int k = 0; k < xs.size(); k++) {
      boolean wall =
          (k == 0 && s.left().isPresent()) || (k == xs.size() - 1 && s.right().isPresent());
      List<BigFraction> heights = wall ? List.of() : graphs.heights(s.first(), xs.get(k));
      double x = xs.get(k).doubleValue();
      for (int b = 0; b < branches.size(); b++) {
        double y =
            !wall
                ? heights.get(b).doubleValue()
                : k == 0
                    ? height(s.left().get(), branches.get(b).left())
                    : height(s.right().get(), s.last().branches().get(b).right());
        out.get(b).add(new Spot(x, y));
      }
    }
    return out;
  }

  private double height(Wall w, int end) {
    if (end < 0) {
      return bottom - (top - bottom);
    }
    return end == w.nodes().size()
        ? top + (top - bottom)
        : w.nodes().get(end).at().within(cells.plane().y(), accuracy).middle().doubleValue();
  }

  /** From one end of a strip in the window to the other; the ends may be walls. */
  private List<BigFraction> abscissae(Strip s) {
    Interval from = end(s.left(), left);
    Interval to = end(s.right(), right);
    TreeSet<BigFraction> inner = new TreeSet<>(Rationals::compare);
    BigFraction length = to.lower().subtract(from.upper());
    boolean curved =
        s.first().branches().stream()
            .anyMatch(b -> cells.curves().get(b.curve()).totalDegree() > 1);
    if (curved) {
      int pieces =
          Math.max(
              FEWEST_PIECES,
              (int) Math.ceil(length.doubleValue() / right.subtract(left).doubleValue() * PIECES));
      for (int k = 1; k < pieces; k++) {
        inner.add(onGrid(from.upper().add(length.multiply(eased(k, pieces)))));
      }
    }
    inner.addAll(crossings);
    List<BigFraction> out = new ArrayList<>(List.of(from.middle()));
    for (BigFraction x : inner) {
      if (Rationals.compare(x, from.upper()) > 0 && Rationals.compare(x, to.lower()) < 0) {
        out.add(x);
      }
    }
    out.add(to.middle());
    return out;
  }

  private Interval end(Optional<Wall> wall, BigFraction edge) {
    return wall.map(w -> w.at().within(cells.plane().x(), grid)).orElseGet(() -> Interval.of(edge));
  }

  /** From 0 to 1, slow at both ends, where curves may be steep: {@code 3t^2 - 2t^3}. */
  private static BigFraction eased(int k, int n) {
    BigFraction t = BigFraction.of(k, n);
    return t.multiply(t).multiply(BigFraction.of(3).subtract(t.multiply(2)));
  }

  private BigFraction onGrid(BigFraction x) {
    BigInteger steps = Rationals.floor(x.subtract(left).divide(grid));
    return left.add(grid.multiply(steps));
  }

  /** The lower or upper edge of the window over the abscissae of a strip. */
  List<Spot> level(List<List<Spot>> graphs, Strip s, boolean atTop) {
    double y = atTop ? top : bottom;
    if (!graphs.isEmpty()) {
      return graphs.get(0).stream().map(p -> new Spot(p.x(), y)).toList();
    }
    return List.of(
        new Spot(end(s.left(), left).middle().doubleValue(), y),
        new Spot(end(s.right(), right).middle().doubleValue(), y));
  }

  /** The polygon between two lines over the same abscissae; empty where it has no size. */
  List<Spot> between(List<Spot> floor, List<Spot> ceiling) {
    return lines.between(floor, ceiling);
  }

  /** The pieces of a line inside the window. */
  List<List<Spot>> inside(List<Spot> line) {
    return lines.inside(line);
  }

  /** The piece of a wall between two nodes; empty outside the window. */
  List<Spot> upright(Wall w, int gap) {
    double x = end(Optional.of(w), left).middle().doubleValue();
    double low = Math.max(bottom, gap == 0 ? bottom : height(w, gap - 1));
    double high = Math.min(top, gap == w.nodes().size() ? top : height(w, gap));
    return low < high ? List.of(new Spot(x, low), new Spot(x, high)) : List.of();
  }

  /** The position of a node. */
  Spot spot(Wall w, int node) {
    return new Spot(end(Optional.of(w), left).middle().doubleValue(), height(w, node));
  }
}
