package rankfall.report;

import io.pebbletemplates.pebble.extension.escaper.SafeString;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Region;
import rankfall.RegionMap;
import rankfall.RegionMap.Arc;
import rankfall.RegionMap.Dependent;
import rankfall.RegionMap.Mark;
import rankfall.RegionMap.Missing;
import rankfall.RegionMap.Place;
import rankfall.RegionMap.Slice;
import rankfall.exact.Polynomial;
import rankfall.exact.Rationals;

/** Turns region maps into what the page shows. */
final class MapParts {
  private final Findings findings;
  private final Formulas formulas;
  private final MapKey key;

  MapParts(Findings findings, Formulas formulas) {
    this.findings = findings;
    this.formulas = formulas;
    this.key = new MapKey(findings);
  }

  /** Empty where there is neither a picture nor a reason why. */
  List<MapView> all() {
    List<MapView.PlaneView> planes = new ArrayList<>();
    List<String> notes = new ArrayList<>();
    for (RegionMap m : findings.maps()) {
      String id = "map-" + (planes.size() + 1);
      if (m instanceof RegionMap.Plane p) {
        String picture = MapPicture.of(p, key, formulas, id);
        planes.add(
            plane(m, id, List.of(p.across().variable(), p.up().variable()), p.slice(), picture));
      } else if (m instanceof RegionMap.Line l) {
        String picture = MapPicture.of(l, key, formulas, id);
        planes.add(plane(m, id, List.of(l.across().variable()), l.slice(), picture));
      } else if (m instanceof Missing x) {
        notes.add(x.reason());
      }
    }
    return findings.maps().isEmpty()
        ? List.of()
        : List.of(
            new MapView(
                new SafeString(Palette.patterns()),
                new SafeString(Palette.style()),
                planes,
                notes));
  }

  private MapView.PlaneView plane(
      RegionMap map, String id, List<String> axes, Slice slice, String picture) {
    List<Formula> held = new ArrayList<>();
    for (Coordinate c : slice.held()) {
      held.add(Formulas.equal(formulas.text(c.variable()), formulas.text(c.value())));
    }
    for (Dependent d : slice.dependent()) {
      held.add(Formulas.equal(formulas.text(d.variable()), formulas.of(d.value())));
    }
    List<Formula> names = axes.stream().map(formulas::text).toList();
    return new MapView.PlaneView(
        id,
        math(Formulas.sequence(names)),
        findings.components().size() > 1 ? "component " + slice.component() : "",
        held.stream().map(MapParts::math).toList(),
        new SafeString(picture),
        legend(map));
  }

  /** How a region is drawn in the pictures; empty where it is in none. */
  List<SafeString> chips(Region r) {
    Place p = Place.in(r.stratum(), Optional.of(r.name()));
    return key.sorts(p).stream().map(s -> new SafeString(MapPicture.chip(key, p, s))).toList();
  }

  private static SafeString math(Formula f) {
    return new SafeString(MathMl.inline(f));
  }

  private List<MapView.EntryView> legend(RegionMap map) {
    List<Place> areas = MapKey.areas(map).distinct().sorted(key.order()).toList();
    List<Place> lines = MapKey.lines(map).distinct().sorted(key.order()).toList();
    List<Place> marks = MapKey.marks(map).distinct().sorted(key.order()).toList();
    List<MapView.EntryView> out = new ArrayList<>();
    areas.forEach(p -> out.add(entry(map, p, "area")));
    lines.forEach(p -> out.add(entry(map, p, "curve")));
    marks.forEach(p -> out.add(entry(map, p, "point")));
    return out;
  }

  private MapView.EntryView entry(RegionMap map, Place p, String sort) {
    List<SafeString> where = where(map, p, sort).stream().map(MapParts::math).toList();
    boolean border = sort.equals("curve") && key.line(p).equals("line-border");
    return new MapView.EntryView(
        List.of(new SafeString(MapPicture.chip(key, p, sort))),
        border ? "boundary in " + key.name(p) : key.name(p),
        key.target(p),
        where,
        new SafeString(border ? "" : TypeText.html(key.words(p))));
  }

  private List<Formula> where(RegionMap map, Place p, String sort) {
    if (sort.equals("area")) {
      return key.region(p)
          .filter(r -> !r.conditions().isEmpty())
          .map(r -> List.of(conditions(r)))
          .orElse(List.of());
    }
    if (map instanceof RegionMap.Plane plane && sort.equals("curve")) {
      return plane.arcs().stream()
          .filter(a -> a.place().equals(p))
          .map(Arc::equation)
          .distinct()
          .map((Polynomial f) -> formulas.vanishing(List.of(f)))
          .toList();
    }
    List<Mark> marks =
        map instanceof RegionMap.Plane q ? q.marks() : ((RegionMap.Line) map).marks();
    return marks.stream().filter(m -> m.place().equals(p)).map(this::position).toList();
  }

  private Formula conditions(Region r) {
    return Formulas.sequence(
        r.conditions().stream().map(c -> formulas.text(c.toString())).toList());
  }

  private Formula position(Mark m) {
    if (m.exact().isEmpty()) {
      return new Formula.Word("irrational");
    }
    List<Formula> values = m.exact().stream().map(q -> formulas.text(Rationals.text(q))).toList();
    return values.size() == 1 ? values.get(0) : new Formula.Group(Formulas.sequence(values), "");
  }
}
