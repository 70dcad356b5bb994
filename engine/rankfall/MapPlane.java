package rankfall;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.RegionMap.Arc;
import rankfall.RegionMap.Area;
import rankfall.RegionMap.Axis;
import rankfall.RegionMap.Mark;
import rankfall.RegionMap.Place;
import rankfall.RegionMap.Spot;
import rankfall.exact.PlaneCells;
import rankfall.exact.PlaneCells.Branch;
import rankfall.exact.PlaneCells.Column;
import rankfall.exact.PlaneCells.Node;
import rankfall.exact.PlaneCells.Wall;
import rankfall.exact.PlanePoint;
import rankfall.exact.Polynomial;

/**
 * Draws the cells of a plane: areas, the curves and vertical lines that differ from the areas
 * beside them, and the points that differ from all around them.
 */
final class MapPlane {
  private static final BigFraction FINE = BigFraction.of(1, 1 << 16);
  private final MapPlaces places;
  private final PlaneCells cells;
  private final int x;
  private final int y;
  private final List<Strip> strips = new ArrayList<>();
  private final List<Area> areas = new ArrayList<>();
  private final List<Arc> arcs = new ArrayList<>();
  private final List<Mark> marks = new ArrayList<>();

  /**
   * What lies between two walls at which something happens.
   *
   * @param first its first column; columns that follow differ in nothing
   * @param last its last column
   * @param left the wall on the left, where there is one
   * @param right the wall on the right, where there is one
   * @param cells places of the cells, ascending
   * @param graphs places of the graphs between them, ascending
   */
  record Strip(
      Column first,
      Column last,
      Optional<Wall> left,
      Optional<Wall> right,
      List<Place> cells,
      List<Place> graphs) {}

  private MapPlane(MapPlaces places, PlaneCells cells) {
    this.places = places;
    this.cells = cells;
    this.x = cells.plane().x();
    this.y = cells.plane().y();
    Optional<Wall> left = Optional.empty();
    Column first = cells.columns().get(0);
    for (int k = 0; k < cells.columns().size(); k++) {
      boolean end = k == cells.walls().size();
      if (end || !cells.walls().get(k).plain()) {
        Optional<Wall> right = end ? Optional.empty() : Optional.of(cells.walls().get(k));
        strips.add(
            new Strip(
                first,
                cells.columns().get(k),
                left,
                right,
                first.cells().stream().map(places::of).toList(),
                first.branches().stream().map(b -> places.of(b.sample())).toList()));
        left = right;
        first = end ? first : cells.columns().get(k + 1);
      }
    }
  }

  /**
   * The picture of a plane.
   *
   * @param slice what it shows
   * @param names names of the coordinates
   * @param places tells what lies where
   * @param cells the plane, cut by the sets of the places
   * @param point a point that the picture must show
   */
  static RegionMap.Plane of(
      RegionMap.Slice slice,
      List<String> names,
      MapPlaces places,
      PlaneCells cells,
      List<BigFraction> point) {
    MapPlane plane = new MapPlane(places, cells);
    List<Axis> axes = plane.window(names, point);
    MapPencil pencil = new MapPencil(cells, axes.get(0), axes.get(1));
    for (int k = 0; k < plane.strips.size(); k++) {
      plane.strip(plane.strips.get(k), pencil);
      if (k > 0) {
        plane.wall(plane.strips.get(k - 1), plane.strips.get(k), pencil);
      }
    }
    return new RegionMap.Plane(
        slice, axes.get(0), axes.get(1), plane.areas, plane.arcs, plane.marks);
  }

  private List<Axis> window(List<String> names, List<BigFraction> point) {
    List<BigFraction> across = new ArrayList<>(List.of(BigFraction.ZERO, point.get(0)));
    List<BigFraction> up = new ArrayList<>(List.of(BigFraction.ZERO, point.get(1)));
    for (int k = 1; k < strips.size(); k++) {
      Strip before = strips.get(k - 1);
      Strip after = strips.get(k);
      Wall w = after.left.orElseThrow();
      across.add(about(w.at(), x));
      for (int n = 0; n < w.nodes().size(); n++) {
        if (!passes(w, before, after, n)) {
          up.add(about(w.nodes().get(n).at(), y));
        }
      }
    }
    if (strips.size() == 1) {
      strips.get(0).first.branches().forEach(b -> up.add(about(b.sample(), y)));
    }
    return MapWindow.axes(names.get(x), across, names.get(y), up);
  }

  /** Whether just one graph runs through a node. */
  private static boolean passes(Wall w, Strip before, Strip after, int node) {
    return w.nodes().get(node).curves().size() == 1
        && !w.vertical()
        && before.last.branches().stream().filter(b -> b.right() == node).count() == 1
        && after.first.branches().stream().filter(b -> b.left() == node).count() == 1;
  }

  private static BigFraction about(PlanePoint p, int variable) {
    return p.rational(variable).orElseGet(() -> p.within(variable, FINE).middle());
  }

  private void strip(Strip s, MapPencil pencil) {
    List<List<Spot>> graphs = pencil.graphs(s);
    List<Spot> floor = pencil.level(graphs, s, false);
    for (int k = 0; k <= graphs.size(); k++) {
      boolean top = k == graphs.size();
      List<Spot> ceiling = top ? pencil.level(graphs, s, true) : graphs.get(k);
      List<Spot> outline = pencil.between(floor, ceiling);
      if (!outline.isEmpty()) {
        areas.add(new Area(s.cells.get(k), outline));
      }
      floor = ceiling;
      if (!top && differs(s.graphs.get(k), s.cells.get(k), s.cells.get(k + 1))) {
        Polynomial equation = cells.curves().get(s.first.branches().get(k).curve());
        for (List<Spot> line : pencil.inside(ceiling)) {
          arcs.add(new Arc(s.graphs.get(k), equation, line));
        }
      }
    }
  }

  private static boolean differs(Place place, Place below, Place above) {
    return !place.equals(below) || !place.equals(above);
  }

  private void wall(Strip before, Strip after, MapPencil pencil) {
    Wall w = after.left.orElseThrow();
    List<Place> gaps = new ArrayList<>();
    if (w.vertical()) {
      Polynomial line =
          cells.curves().stream()
              .filter(f -> !f.contains(y) && w.at().sign(f) == 0)
              .findFirst()
              .orElseThrow();
      for (int g = 0; g < w.gaps().size(); g++) {
        Place place = places.of(w.gaps().get(g));
        gaps.add(place);
        if (differs(place, beside(before, false, g), beside(after, true, g))) {
          List<Spot> ends = pencil.upright(w, g);
          if (!ends.isEmpty()) {
            arcs.add(new Arc(place, line, ends));
          }
        }
      }
    }
    for (int n = 0; n < w.nodes().size(); n++) {
      Node node = w.nodes().get(n);
      Place place = places.of(node.at());
      if (stands(place, around(before, after, gaps, n))) {
        marks.add(new Mark(place, pencil.spot(w, n), exact(node.at())));
      }
    }
  }

  /** Whether a point is no part of anything around it. */
  private static boolean stands(Place place, Set<Place> around) {
    return !around.contains(place)
        && (place.region().isPresent()
            || around.stream().noneMatch(p -> p.stratum().equals(place.stratum()))
            || place.stratum().isEmpty());
  }

  /** The place of the cell beside a gap of a wall. */
  private static Place beside(Strip s, boolean wallIsLeft, int gap) {
    return s.cells.get(below(s, wallIsLeft, gap));
  }

  /** How many graphs of a strip run to nodes of the wall below a number. */
  private static int below(Strip s, boolean wallIsLeft, int node) {
    List<Branch> branches = wallIsLeft ? s.first.branches() : s.last.branches();
    return (int) branches.stream().filter(b -> end(b, wallIsLeft) < node).count();
  }

  private static int end(Branch b, boolean wallIsLeft) {
    return wallIsLeft ? b.left() : b.right();
  }

  private static Set<Place> around(Strip before, Strip after, List<Place> gaps, int node) {
    Set<Place> out = new LinkedHashSet<>();
    for (boolean wallIsLeft : new boolean[] {false, true}) {
      Strip s = wallIsLeft ? after : before;
      int from = below(s, wallIsLeft, node);
      int to = below(s, wallIsLeft, node + 1);
      out.addAll(s.graphs.subList(from, to));
      out.addAll(s.cells.subList(from, to + 1));
    }
    if (!gaps.isEmpty()) {
      out.addAll(gaps.subList(node, node + 2));
    }
    return out;
  }

  private List<BigFraction> exact(PlanePoint p) {
    Optional<BigFraction> a = p.rational(x);
    Optional<BigFraction> b = p.rational(y);
    return a.isPresent() && b.isPresent() ? List.of(a.get(), b.get()) : List.of();
  }
}
