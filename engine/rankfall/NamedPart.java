package rankfall;

import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import rankfall.identify.AlgebraNames;
import rankfall.identify.ExactAlgebra;
import rankfall.identify.TypeLoci;
import rankfall.identify.TypeName;
import rankfall.lie.Family;
import rankfall.locus.Cell;
import rankfall.locus.Cells;
import rankfall.locus.Meter;
import rankfall.locus.Regions;
import rankfall.locus.Strata;

/**
 * The points of a stratum at which the name of the algebra depends on signs and continuous
 * parameters only, cut into cells.
 *
 * <p>Names are found when they are asked for and remembered; one object serves one thread.
 */
final class NamedPart {
  private final Family family;
  private final Strata.Stratum points;
  private final TypeLoci.Locus locus;
  private final Cells cells;
  private final Meter meter;
  private final Map<List<Object>, Optional<TypeName>> known = new HashMap<>();

  private NamedPart(
      Family family, Strata.Stratum points, TypeLoci.Locus locus, Cells cells, Meter meter) {
    this.family = family;
    this.points = points;
    this.locus = locus;
    this.cells = cells;
    this.meter = meter;
  }

  /**
   * Cuts a part into cells.
   *
   * @param stratum the stratum in which the locus lies
   * @throws Meter.Exhausted if the budget is used up
   */
  static NamedPart of(Family family, Strata.Stratum stratum, TypeLoci.Locus locus, Meter meter) {
    Strata.Stratum points = locus.within(stratum);
    Cells cells = Cells.of(family, points, locus.walls(), meter);
    return new NamedPart(family, points, locus, cells, meter);
  }

  /** Where it lies in its stratum. */
  TypeLoci.Locus locus() {
    return locus;
  }

  /** Whether no real point was found, and there is none if the search was exact. */
  boolean isEmpty() {
    return cells.cells().isEmpty();
  }

  /** The equations of its closure. */
  List<rankfall.exact.Polynomial> equations() {
    return points.equations();
  }

  /** Its rows by signature and name. */
  Regions regions() {
    return Regions.of(family, points, cells, this::label, meter);
  }

  /** The name, if all cells have the same one. */
  Optional<String> onlyName() {
    List<String> all = cells.cells().stream().map(this::label).distinct().toList();
    return all.size() == 1 ? Optional.of(all.get(0)) : Optional.empty();
  }

  /** The algebra of a row. */
  Optional<AlgebraType> type(Regions.Row row) {
    List<TypeName> all = row.cells().stream().flatMap(c -> name(c).stream()).toList();
    if (all.size() < row.cells().size()) {
      return Optional.empty();
    }
    Set<String> others = new LinkedHashSet<>(all.get(0).otherNames());
    all.forEach(n -> others.retainAll(n.otherNames()));
    boolean everywhere = locus.proved() && cells.exact();
    return Optional.of(new AlgebraType(row.label(), List.copyOf(others), everywhere));
  }

  private String label(Cell cell) {
    return name(cell).map(TypeName::name).orElse("");
  }

  private Optional<TypeName> name(Cell cell) {
    meter.check();
    return known.computeIfAbsent(
        key(cell), c -> AlgebraNames.of(ExactAlgebra.of(cell.algebra())).map(locus::onCell));
  }

  /** The same constants at conjugate points are different real algebras. */
  private static List<Object> key(Cell cell) {
    boolean rational = cell.point().rationalCoordinates().isPresent();
    return List.of(cell.algebra().constants(), rational ? "" : cell.point().toString());
  }
}
