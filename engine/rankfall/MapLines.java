package rankfall;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import rankfall.RegionMap.Spot;

/** Clips polygonal lines to a horizontal band and drops corners that nobody sees. */
final class MapLines {
  /** Share of the window's sides below which a bend is not seen. */
  private static final double UNSEEN = 0.0006;

  private final double width;
  private final double bottom;
  private final double top;

  MapLines(double width, double bottom, double top) {
    this.width = width;
    this.bottom = bottom;
    this.top = top;
  }

  /** The polygon between two lines over the same abscissae; empty where it has no size. */
  List<Spot> between(List<Spot> floor, List<Spot> ceiling) {
    double most = 0;
    List<Spot> low = new ArrayList<>();
    List<Spot> high = new ArrayList<>();
    for (int k = 0; k < floor.size(); k++) {
      low.add(clamped(floor.get(k)));
      high.add(clamped(ceiling.get(k)));
      most = Math.max(most, high.get(k).y() - low.get(k).y());
    }
    if (most <= UNSEEN * (top - bottom)) {
      return List.of();
    }
    List<Spot> out = new ArrayList<>(simplified(low));
    List<Spot> back = new ArrayList<>(simplified(high));
    Collections.reverse(back);
    out.addAll(back);
    return withoutRepeats(out);
  }

  private Spot clamped(Spot p) {
    return new Spot(p.x(), Math.max(bottom, Math.min(top, p.y())));
  }

  private static List<Spot> withoutRepeats(List<Spot> polygon) {
    List<Spot> out = new ArrayList<>();
    for (Spot p : polygon) {
      if (out.isEmpty() || !out.get(out.size() - 1).equals(p)) {
        out.add(p);
      }
    }
    if (out.size() > 1 && out.get(0).equals(out.get(out.size() - 1))) {
      out.remove(out.size() - 1);
    }
    return out;
  }

  /** The pieces of a line inside the band. */
  List<List<Spot>> inside(List<Spot> line) {
    List<List<Spot>> out = new ArrayList<>();
    List<Spot> piece = new ArrayList<>();
    for (int k = 1; k < line.size(); k++) {
      Spot a = line.get(k - 1);
      Spot b = line.get(k);
      Spot from = isInside(a) ? a : cut(a, b);
      Spot to = isInside(b) ? b : cut(b, a);
      boolean seen = isInside(from) && isInside(to) && !from.equals(to);
      if (seen) {
        if (piece.isEmpty()) {
          piece.add(from);
        }
        piece.add(to);
      }
      if ((!seen || !isInside(b)) && !piece.isEmpty()) {
        out.add(simplified(piece));
        piece = new ArrayList<>();
      }
    }
    if (!piece.isEmpty()) {
      out.add(simplified(piece));
    }
    return out;
  }

  private boolean isInside(Spot p) {
    return p.y() >= bottom && p.y() <= top;
  }

  /** Where the way from a point outside to another one meets the nearer edge. */
  private Spot cut(Spot outside, Spot other) {
    double edge = outside.y() > top ? top : bottom;
    double t = (edge - outside.y()) / (other.y() - outside.y());
    return t >= 0 && t <= 1 ? new Spot(outside.x() + t * (other.x() - outside.x()), edge) : outside;
  }

  /** Corners near the straight way are dropped (Douglas and Peucker 1973). */
  private List<Spot> simplified(List<Spot> line) {
    if (line.size() < 3) {
      return List.copyOf(line);
    }
    Spot a = line.get(0);
    Spot b = line.get(line.size() - 1);
    int farthest = 0;
    double most = 0;
    for (int k = 1; k < line.size() - 1; k++) {
      double d = distance(line.get(k), a, b);
      if (d > most) {
        most = d;
        farthest = k;
      }
    }
    if (most <= UNSEEN * UNSEEN) {
      return List.of(a, b);
    }
    List<Spot> out = new ArrayList<>(simplified(line.subList(0, farthest + 1)));
    out.remove(out.size() - 1);
    out.addAll(simplified(line.subList(farthest, line.size())));
    return out;
  }

  /** The square of the distance from a stretch, in shares of the window. */
  private double distance(Spot p, Spot a, Spot b) {
    double ux = (b.x() - a.x()) / width;
    double uy = (b.y() - a.y()) / (top - bottom);
    double px = (p.x() - a.x()) / width;
    double py = (p.y() - a.y()) / (top - bottom);
    double length = ux * ux + uy * uy;
    double t = length == 0 ? 0 : Math.max(0, Math.min(1, (px * ux + py * uy) / length));
    double dx = px - t * ux;
    double dy = py - t * uy;
    return dx * dx + dy * dy;
  }
}
