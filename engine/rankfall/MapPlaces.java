package rankfall;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import rankfall.Analysis.Region;
import rankfall.Analysis.Stratum;
import rankfall.RegionMap.Kind;
import rankfall.RegionMap.Place;
import rankfall.exact.PlanePoint;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilyCondition;

/** Tells by exact signs to which stratum and region a point of a slice belongs. */
final class MapPlaces {
  private final List<Bound> domain = new ArrayList<>();
  private final List<Layer> layers = new ArrayList<>();

  /** A condition of the spec on the slice. */
  private record Bound(Polynomial polynomial, FamilyCondition condition) {}

  /** A stratum on the slice. */
  private record Layer(
      String name,
      List<Polynomial> equations,
      List<List<Polynomial>> exclusions,
      List<Zone> zones) {}

  /** A region on the slice. */
  private record Zone(String name, List<Sign> conditions) {}

  private record Sign(Polynomial polynomial, Comparison comparison) {}

  /** The strata and regions of a family as they are on a slice. */
  MapPlaces(Family family, List<Stratum> strata, List<Region> regions, MapSlice slice) {
    family.domain().forEach(c -> domain.add(new Bound(slice.on(c.polynomial()), c)));
    for (Stratum s : strata) {
      List<Polynomial> equations = s.equations().stream().map(slice::on).toList();
      if (equations.stream().anyMatch(p -> p.isConstant() && !p.isZero())) {
        continue;
      }
      layers.add(
          new Layer(
              s.name(),
              equations,
              s.exclusions().stream().map(e -> e.stream().map(slice::on).toList()).toList(),
              regions.stream()
                  .filter(r -> r.stratum().equals(s.name()))
                  .map(r -> zone(r, slice))
                  .toList()));
    }
  }

  private static Zone zone(Region r, MapSlice slice) {
    return new Zone(
        r.name(),
        r.conditions().stream()
            .map(c -> new Sign(slice.on(c.polynomial()), c.comparison()))
            .toList());
  }

  /** Closed sets off which, and on whose pieces, places do not change. */
  List<List<Polynomial>> sets() {
    Set<List<Polynomial>> out = new LinkedHashSet<>();
    domain.forEach(b -> add(out, List.of(b.polynomial)));
    for (Layer l : layers) {
      add(out, l.equations);
      l.exclusions.forEach(e -> add(out, e));
      for (Zone z : l.zones) {
        for (Sign s : z.conditions) {
          List<Polynomial> both = new ArrayList<>(l.equations);
          both.add(s.polynomial);
          add(out, both);
        }
      }
    }
    return List.copyOf(out);
  }

  private static void add(Set<List<Polynomial>> sets, List<Polynomial> equations) {
    List<Polynomial> proper = equations.stream().filter(p -> !p.isZero()).distinct().toList();
    if (!proper.isEmpty() && proper.stream().noneMatch(Polynomial::isConstant)) {
      sets.add(proper);
    }
  }

  /** Where a point belongs. */
  Place of(PlanePoint point) {
    Map<Polynomial, Integer> known = new HashMap<>();
    for (Bound b : domain) {
      if (!b.condition.allows(sign(point, b.polynomial, known))) {
        return Place.of(Kind.OUTSIDE);
      }
    }
    for (Layer l : layers) {
      if (vanish(point, l.equations, known)
          && l.exclusions.stream().noneMatch(e -> vanish(point, e, known))) {
        return Place.in(l.name, region(point, l, known));
      }
    }
    return Place.of(Kind.NOWHERE);
  }

  private static Optional<String> region(
      PlanePoint point, Layer layer, Map<Polynomial, Integer> known) {
    return layer.zones.stream()
        .filter(
            z ->
                z.conditions.stream()
                    .allMatch(c -> c.comparison.holds(sign(point, c.polynomial, known))))
        .map(Zone::name)
        .findFirst();
  }

  private static boolean vanish(
      PlanePoint point, List<Polynomial> equations, Map<Polynomial, Integer> known) {
    return equations.stream().allMatch(p -> sign(point, p, known) == 0);
  }

  private static int sign(PlanePoint point, Polynomial p, Map<Polynomial, Integer> known) {
    Integer s = known.get(p);
    if (s == null) {
      s = point.sign(p);
      known.put(p, s);
    }
    return s;
  }
}
