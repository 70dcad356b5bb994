package rankfall.report;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import rankfall.RegionMap;
import rankfall.RegionMap.Arc;
import rankfall.RegionMap.Area;
import rankfall.RegionMap.Axis;
import rankfall.RegionMap.Mark;
import rankfall.RegionMap.Place;
import rankfall.RegionMap.Spot;
import rankfall.RegionMap.Stretch;
import rankfall.exact.Polynomial;

/** Draws a region map as SVG. */
final class MapPicture {
  private static final double SIDE = 440;
  private static final double LEFT = 58;
  private static final double TOP = 30;
  private static final double RIGHT = 16;
  private static final double BOTTOM = 48;
  private static final double BAND = 56;

  /** Room that a name in an area needs about its middle. */
  private static final double ROOM = 15;

  private final MapKey key;
  private final Formulas formulas;
  private final String id;
  private Axes axes;
  private final StringBuilder out = new StringBuilder();

  private MapPicture(MapKey key, Formulas formulas, String id) {
    this.key = key;
    this.formulas = formulas;
    this.id = id;
  }

  /** One {@code svg} element; its ids begin with the given one. */
  static String of(RegionMap.Plane plane, MapKey key, Formulas formulas, String id) {
    MapPicture p = new MapPicture(key, formulas, id);
    p.axes = new Axes(LEFT, TOP, SIDE, SIDE, p.scale(plane.across()), p.scale(plane.up()));
    p.open(
        "Map of regions in the plane of "
            + plane.across().variable()
            + " and "
            + plane.up().variable(),
        p.described(plane),
        TOP + SIDE + BOTTOM);
    p.areas(plane.areas());
    p.arcs(plane.arcs());
    p.out.append(p.axes.markup());
    p.marks(plane.marks());
    p.areaNames(plane.areas());
    p.arcNames(plane.arcs());
    return p.out.append("</svg>\n").toString();
  }

  /** One {@code svg} element; its ids begin with the given one. */
  static String of(RegionMap.Line line, MapKey key, Formulas formulas, String id) {
    MapPicture p = new MapPicture(key, formulas, id);
    Axes.Scale none = new Axes.Scale("", line.across().from(), line.across().to());
    p.axes = new Axes(LEFT, TOP, SIDE, BAND, p.scale(line.across()), none);
    p.open(
        "Map of regions on the line of " + line.across().variable(),
        p.described(line),
        TOP + BAND + BOTTOM);
    line.stretches().forEach(p::stretch);
    p.out.append(p.axes.markup());
    line.marks().forEach(p::post);
    return p.out.append("</svg>\n").toString();
  }

  private Axes.Scale scale(Axis axis) {
    return new Axes.Scale(SvgText.of(formulas.text(axis.variable())), axis.from(), axis.to());
  }

  private void open(String title, String description, double height) {
    double width = LEFT + SIDE + RIGHT;
    out.append(
        String.format(
            Locale.ROOT,
            "<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"map\" role=\"img\""
                + " aria-labelledby=\"%s-title %s-desc\" viewBox=\"0 0 %.0f %.0f\">\n"
                + "<title id=\"%s-title\">%s</title>\n<desc id=\"%s-desc\">%s</desc>\n",
            id,
            id,
            width,
            height,
            id,
            Markup.escape(title),
            id,
            Markup.escape(description)));
  }

  private String described(RegionMap map) {
    List<String> parts = new ArrayList<>();
    parts.add(listed("Areas", MapKey.areas(map).distinct().sorted(key.order()).toList()));
    parts.add(listed("Curves", MapKey.lines(map).distinct().sorted(key.order()).toList()));
    parts.add(listed("Points", MapKey.marks(map).distinct().sorted(key.order()).toList()));
    parts.removeIf(String::isEmpty);
    return String.join(" ", parts);
  }

  private String listed(String what, List<Place> places) {
    return places.isEmpty()
        ? ""
        : what + ": " + String.join("; ", places.stream().map(p -> titled(p)).toList()) + ".";
  }

  private String titled(Place p) {
    return key.name(p) + ": " + TypeText.signs(key.words(p));
  }

  private String title(Place p) {
    return "<title>" + Markup.escape(titled(p)) + "</title>";
  }

  /** All areas of one place are one path, so that no seams are seen between them. */
  private void areas(List<Area> areas) {
    Map<Place, StringBuilder> paths = new LinkedHashMap<>();
    for (Area a : areas) {
      paths
          .computeIfAbsent(a.place(), p -> new StringBuilder())
          .append(path(a.outline()))
          .append('Z');
    }
    paths.forEach(
        (place, d) ->
            out.append("<path class=\"area ")
                .append(key.fill(place))
                .append("\" d=\"")
                .append(d)
                .append("\">")
                .append(title(place))
                .append("</path>\n"));
  }

  private String path(List<Spot> line) {
    StringBuilder d = new StringBuilder();
    for (Spot s : line) {
      d.append(d.length() == 0 ? "M" : "L").append(number(axes.x(s.x())));
      d.append(' ').append(number(axes.y(s.y())));
    }
    return d.toString();
  }

  private static String number(double value) {
    String text = String.format(Locale.ROOT, "%.1f", value);
    return text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
  }

  private void arcs(List<Arc> arcs) {
    Map<Place, StringBuilder> paths = new LinkedHashMap<>();
    for (Arc a : arcs) {
      paths.computeIfAbsent(a.place(), p -> new StringBuilder()).append(path(a.line()));
    }
    paths.forEach(
        (place, d) -> {
          out.append("<path class=\"halo\" d=\"").append(d).append("\"></path>\n");
          out.append("<path class=\"line ")
              .append(key.line(place))
              .append("\" d=\"")
              .append(d)
              .append("\">")
              .append(title(place))
              .append("</path>\n");
        });
  }

  private void marks(List<Mark> marks) {
    for (Mark m : marks) {
      double x = axes.x(m.spot().x());
      double y = axes.y(m.spot().y());
      dot(m, x, y);
      boolean last = x > LEFT + SIDE - 40;
      out.append(
          Axes.text(
              last ? "name end" : "name start",
              x + (last ? -8 : 8),
              y < TOP + 24 ? y + 19 : y - 8,
              Markup.escape(key.name(m.place()))));
    }
  }

  private void dot(Mark m, double x, double y) {
    out.append(
        String.format(
            Locale.ROOT,
            "<circle class=\"%s\" cx=\"%.1f\" cy=\"%.1f\" r=\"5\"><title>%s</title></circle>\n",
            m.place().stratum().isPresent() ? "dot" : "dot open",
            x,
            y,
            Markup.escape(titled(m.place()) + at(m))));
  }

  private static String at(Mark m) {
    return m.exact().isEmpty()
        ? ""
        : ", at "
            + (m.exact().size() == 1
                ? Axes.number(m.exact().get(0))
                : "(" + Axes.number(m.exact().get(0)) + ", " + Axes.number(m.exact().get(1)) + ")");
  }

  /** The name of each place once, where there is most room for it. */
  private void areaNames(List<Area> areas) {
    Map<Place, RoomyPoint> best = new LinkedHashMap<>();
    for (Area a : areas) {
      List<Spot> outline =
          a.outline().stream().map(s -> new Spot(axes.x(s.x()), axes.y(s.y()))).toList();
      RoomyPoint p = RoomyPoint.in(outline);
      RoomyPoint known = best.get(a.place());
      if (known == null || p.room() > known.room() + 0.5) {
        best.put(a.place(), p);
      }
    }
    best.forEach(
        (place, p) -> {
          if (p.room() >= ROOM && place.stratum().isPresent()) {
            out.append(Axes.text("name", p.x(), p.y() + 5, Markup.escape(key.name(place))));
          }
        });
  }

  private record Named(Place place, Polynomial equation) {}

  /** The name of each curve once, beside the middle of its longest piece. */
  private void arcNames(List<Arc> arcs) {
    Map<Named, Arc> longest = new LinkedHashMap<>();
    for (Arc a : arcs) {
      if (!key.line(a.place()).equals("line-border")) {
        Named n = new Named(a.place(), a.equation());
        Arc known = longest.get(n);
        if (known == null || length(a.line()) > length(known.line()) + 0.5) {
          longest.put(n, a);
        }
      }
    }
    Set<String> taken = new HashSet<>();
    longest.values().forEach(a -> arcName(a, taken));
  }

  private double length(List<Spot> line) {
    double sum = 0;
    for (int k = 1; k < line.size(); k++) {
      sum += distance(line.get(k - 1), line.get(k));
    }
    return sum;
  }

  private double distance(Spot a, Spot b) {
    double dx = axes.x(a.x()) - axes.x(b.x());
    double dy = axes.y(a.y()) - axes.y(b.y());
    return Math.sqrt(dx * dx + dy * dy);
  }

  private void arcName(Arc a, Set<String> taken) {
    double half = length(a.line()) * 0.6;
    for (int k = 1; k < a.line().size(); k++) {
      Spot p = a.line().get(k - 1);
      Spot q = a.line().get(k);
      double step = distance(p, q);
      if (half <= step && step > 0) {
        double t = half / step;
        double x1 = axes.x(p.x());
        double y1 = axes.y(p.y());
        double dx = axes.x(q.x()) - x1;
        double dy = axes.y(q.y()) - y1;
        boolean flat = Math.abs(dx) >= Math.abs(dy);
        double x = x1 + t * dx + (flat ? 0 : 9);
        double y = y1 + t * dy + (flat ? -8 : 5);
        if (taken.add(Math.round(x / 24) + "," + Math.round(y / 16))) {
          out.append(
              Axes.text(
                  flat ? "name line-name" : "name start line-name",
                  x,
                  Math.max(y, TOP + 14),
                  Markup.escape(key.name(a.place()))));
        }
        return;
      }
      half -= step;
    }
  }

  private void stretch(Stretch s) {
    double from = axes.x(s.from());
    double to = axes.x(s.to());
    out.append(
        String.format(
            Locale.ROOT,
            "<path class=\"area %s\" d=\"M%.1f %.1fH%.1fV%.1fH%.1fZ\">%s</path>\n",
            key.fill(s.place()),
            from,
            TOP,
            to,
            TOP + BAND,
            from,
            title(s.place())));
    String name = key.name(s.place());
    if (to - from > 9.0 * name.length() && s.place().stratum().isPresent()) {
      out.append(Axes.text("name", (from + to) / 2, TOP + BAND / 2 + 5, Markup.escape(name)));
    }
  }

  private void post(Mark m) {
    double x = axes.x(m.spot().x());
    out.append(
        String.format(
            Locale.ROOT,
            "<path class=\"line %s\" d=\"M%.1f %.1fV%.1f\"></path>\n",
            key.line(m.place()),
            x,
            TOP,
            TOP + BAND));
    dot(m, x, TOP + BAND / 2);
    String value = m.exact().isEmpty() ? "" : " (" + Axes.number(m.exact().get(0)) + ")";
    out.append(Axes.text("name", x, TOP - 9, Markup.escape(key.name(m.place()) + value)));
  }

  /** A small picture of an area, a curve or a point, for lists. */
  static String chip(MapKey key, Place place, String sort) {
    String shape =
        switch (sort) {
          case "curve" -> "<path class=\"line " + key.line(place) + "\" d=\"M1 8H27\"></path>";
          case "point" ->
              "<circle class=\""
                  + (place.stratum().isPresent() ? "dot" : "dot open")
                  + "\" cx=\"14\" cy=\"8\" r=\"4.5\"></circle>";
          default ->
              "<rect class=\"area chip-edge "
                  + key.fill(place)
                  + "\" x=\"1\" y=\"1\" width=\"26\" height=\"14\" rx=\"2\"></rect>";
        };
    return "<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"map chip\" width=\"28\" height=\"16\""
        + " aria-hidden=\"true\">"
        + shape
        + "</svg>";
  }
}
