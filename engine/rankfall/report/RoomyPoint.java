package rankfall.report;

import java.util.List;
import rankfall.RegionMap.Spot;

/**
 * The place in a polygon that is farthest from its outline, among those of a grid.
 *
 * @param x across
 * @param y down
 * @param room the distance from the outline; negative if no place of the grid lies inside
 */
record RoomyPoint(double x, double y, double room) {
  private static final int GRID = 24;

  /** The roomiest place. */
  static RoomyPoint in(List<Spot> polygon) {
    double left = polygon.stream().mapToDouble(Spot::x).min().orElse(0);
    double right = polygon.stream().mapToDouble(Spot::x).max().orElse(0);
    double top = polygon.stream().mapToDouble(Spot::y).min().orElse(0);
    double bottom = polygon.stream().mapToDouble(Spot::y).max().orElse(0);
    RoomyPoint best = new RoomyPoint(left, top, -1);
    for (int i = 1; i < GRID; i++) {
      for (int j = 1; j < GRID; j++) {
        Spot p = new Spot(left + (right - left) * i / GRID, top + (bottom - top) * j / GRID);
        if (contains(polygon, p)) {
          double room = room(polygon, p);
          if (room > best.room + 1e-9) {
            best = new RoomyPoint(p.x(), p.y(), room);
          }
        }
      }
    }
    return best;
  }

  /** By counting the crossings of a ray to the left. */
  private static boolean contains(List<Spot> polygon, Spot p) {
    boolean inside = false;
    for (int k = 0; k < polygon.size(); k++) {
      Spot a = polygon.get(k);
      Spot b = polygon.get((k + 1) % polygon.size());
      if ((a.y() > p.y()) != (b.y() > p.y())
          && p.x() > a.x() + (p.y() - a.y()) / (b.y() - a.y()) * (b.x() - a.x())) {
        inside = !inside;
      }
    }
    return inside;
  }

  private static double room(List<Spot> polygon, Spot p) {
    double least = Double.MAX_VALUE;
    for (int k = 0; k < polygon.size(); k++) {
      Spot a = polygon.get(k);
      Spot b = polygon.get((k + 1) % polygon.size());
      double ux = b.x() - a.x();
      double uy = b.y() - a.y();
      double length = ux * ux + uy * uy;
      double t =
          length == 0
              ? 0
              : Math.max(0, Math.min(1, ((p.x() - a.x()) * ux + (p.y() - a.y()) * uy) / length));
      double dx = p.x() - a.x() - t * ux;
      double dy = p.y() - a.y() - t * uy;
      least = Math.min(least, Math.sqrt(dx * dx + dy * dy));
    }
    return least;
  }
}
