package rankfall;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.Component;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Region;
import rankfall.Analysis.Stratum;
import rankfall.RegionMap.Dependent;
import rankfall.RegionMap.Missing;
import rankfall.RegionMap.Slice;
import rankfall.exact.Chain;
import rankfall.exact.ConstantRoot;
import rankfall.exact.LineCells;
import rankfall.exact.PlaneCells;
import rankfall.exact.Rationals;
import rankfall.exact.TowerPoint;
import rankfall.exact.Variables;
import rankfall.lie.Family;
import rankfall.lie.FamilyRelation;
import rankfall.locus.Meter;

/**
 * The pictures of a family: of each component of one dimension its line, else the planes of two
 * coordinates through the point of its general stratum.
 */
record MapFindings(
    Family family,
    List<Component> components,
    List<Stratum> strata,
    List<Region> regions,
    Meter meter) {
  private static final int MOST_MAPS = 15;

  List<RegionMap> all() {
    Variables ring = family.ring().variables();
    if (strata.isEmpty() || ring.indeterminates() == 0) {
      return List.of();
    }
    Optional<String> obstacle = obstacle();
    if (obstacle.isPresent()) {
      return List.of(new Missing(obstacle.get()));
    }
    List<RegionMap> out = new ArrayList<>();
    List<String> leftOut = new ArrayList<>();
    for (Component c : components) {
      component(c, out, leftOut);
    }
    if (out.isEmpty() && leftOut.isEmpty()) {
      return List.of(
          new Missing(
              "No component of the parameter variety holds a line or a plane on which two parameters"
                  + " are free and the others keep their values or follow from linear equations."));
    }
    if (!leftOut.isEmpty()) {
      out.add(
          new Missing(
              "Not drawn, being more than "
                  + MOST_MAPS
                  + " or too large: the planes "
                  + String.join("; ", leftOut)
                  + "."));
    }
    return out;
  }

  private Optional<String> obstacle() {
    if (family.ring().variables().names().contains("i") && family.ring().complex()) {
      return Optional.of(
          "The imaginary unit occurs among the entries, so the real points are not drawn.");
    }
    boolean curved =
        family.relations().stream().anyMatch(r -> r.reason() == FamilyRelation.Reason.FUNCTION);
    boolean twice =
        family.ring().arguments().entrySet().stream()
            .anyMatch(
                a ->
                    a.getValue().size() > 1
                        || family.ring().variables().names().contains(a.getKey()));
    return curved || twice
        ? Optional.of(
            "Functions of one parameter are related by an equation that is not linear, so no plane of"
                + " parameters is drawn.")
        : Optional.empty();
  }

  private void component(Component c, List<RegionMap> out, List<String> leftOut) {
    Optional<List<BigFraction>> point = point(c);
    if (point.isEmpty()) {
      return;
    }
    int n = point.get().size();
    int dimension = c.parameterDimension();
    for (int x = 0; x < n; x++) {
      for (int y = x + 1; y < (dimension == 1 ? x + 2 : n); y++) {
        meter.check();
        List<Integer> free = dimension == 1 ? List.of(x) : List.of(x, y);
        Optional<MapSlice> slice =
            dimension < 1
                ? Optional.empty()
                : MapSlice.of(
                    family.ring().constants(), c.equations(), point.get(), free, n - dimension);
        if (slice.isPresent()) {
          Optional<RegionMap> map =
              out.size() < MOST_MAPS ? map(c, point.get(), slice.get()) : Optional.empty();
          if (map.isPresent()) {
            out.add(map.get());
          } else {
            leftOut.add(names(free, c));
          }
          if (dimension == 1) {
            return;
          }
        }
      }
    }
  }

  private String names(List<Integer> free, Component c) {
    List<String> names = family.ring().variables().names();
    String axes = free.stream().map(names::get).collect(Collectors.joining(", "));
    return "(" + axes + ")" + (components.size() > 1 ? " of component " + c.number() : "");
  }

  /** The rational point of the general stratum of a component. */
  private Optional<List<BigFraction>> point(Component c) {
    for (Stratum s : strata) {
      if (s.equations().equals(c.equations()) && s.realPoints() == Analysis.RealPoints.YES) {
        Optional<List<BigFraction>> point = rational(s.witness());
        if (point.isPresent()) {
          return point;
        }
      }
    }
    return Optional.empty();
  }

  private Optional<List<BigFraction>> rational(List<Coordinate> witness) {
    Map<String, String> values = new HashMap<>();
    witness.forEach(w -> values.put(w.variable(), w.value()));
    List<BigFraction> out = new ArrayList<>();
    Variables ring = family.ring().variables();
    for (String name : ring.names().subList(0, ring.indeterminates())) {
      String value = values.getOrDefault(name, "root");
      if (value.contains("root")) {
        return Optional.empty();
      }
      out.add(BigFraction.parse(value));
    }
    return Optional.of(out);
  }

  private Optional<RegionMap> map(Component c, List<BigFraction> point, MapSlice slice) {
    List<String> names = family.ring().variables().names();
    MapPlaces places = new MapPlaces(family, strata, regions, slice);
    Slice shown = shown(c, slice);
    TowerPoint constants = constants();
    int x = slice.free().get(0);
    if (slice.free().size() == 1) {
      LineCells cells = LineCells.of(constants, x, places.sets());
      return Optional.of(MapLine.of(shown, x, names.get(x), places, cells, point.get(x)));
    }
    int y = slice.free().get(1);
    return PlaneCells.of(new PlaneCells.Plane(constants, x, y), places.sets(), meter::check)
        .map(
            cells -> MapPlane.of(shown, names, places, cells, List.of(point.get(x), point.get(y))));
  }

  private Slice shown(Component c, MapSlice slice) {
    List<String> names = family.ring().variables().names();
    return new Slice(
        c.number(),
        slice.held().entrySet().stream()
            .map(e -> new Coordinate(names.get(e.getKey()), text(e.getValue())))
            .toList(),
        slice.solved().entrySet().stream()
            .map(e -> new Dependent(names.get(e.getKey()), e.getValue()))
            .toList());
  }

  private static String text(BigFraction value) {
    return Rationals.text(value);
  }

  /** The algebraic numbers of the family, each the root that is meant. */
  private TowerPoint constants() {
    Chain chain = family.ring().constants();
    List<ConstantRoot> roots = family.ring().tower().roots();
    Map<Integer, BigFraction> near = new HashMap<>();
    for (int k = 0; k < roots.size(); k++) {
      near.put(
          chain.rules().get(k).variable(), roots.get(k).low().add(roots.get(k).high()).divide(2));
    }
    return TowerPoint.of(chain, near);
  }
}
