package rankfall.published;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.published.PublishedEntry.Cell;
import rankfall.published.PublishedEntry.Condition;
import rankfall.published.PublishedEntry.Stratum;

/**
 * What the program says about a family at its general point. Formulas are text in the names of the
 * spec; they need not be expanded.
 *
 * @param killing the non-zero entries of the Killing matrix, upper triangle
 * @param determinant of the Killing matrix; {@code 0} where the form is degenerate throughout
 * @param conditions the conditions as printed
 * @param restricted the non-zero entries of the form on the torus; empty without a torus
 * @param dual the non-zero entries of the inverse of that, where it exists
 * @param strata all strata
 * @param components the equations of each component, {@code 0} for the whole
 */
record ObservedFamily(
    SortedMap<Cell, String> killing,
    String determinant,
    List<Condition> conditions,
    SortedMap<Cell, String> restricted,
    Optional<SortedMap<Cell, String>> dual,
    List<Stratum> strata,
    List<String> components) {
  ObservedFamily {
    killing = Collections.unmodifiableSortedMap(new TreeMap<>(killing));
    conditions = List.copyOf(conditions);
    restricted = Collections.unmodifiableSortedMap(new TreeMap<>(restricted));
    strata = List.copyOf(strata);
    components = List.copyOf(components);
    dual = dual.map(m -> Collections.unmodifiableSortedMap(new TreeMap<>(m)));
  }

  /** Formulas alone, of a family whose strata were not asked. */
  ObservedFamily(
      SortedMap<Cell, String> killing,
      String determinant,
      List<Condition> conditions,
      SortedMap<Cell, String> restricted,
      Optional<SortedMap<Cell, String>> dual) {
    this(killing, determinant, conditions, restricted, dual, List.of(), List.of());
  }

  /** The same formulas with what is known of all points of the family. */
  ObservedFamily with(List<Stratum> allStrata, List<String> allComponents) {
    return new ObservedFamily(
        killing, determinant, conditions, restricted, dual, allStrata, allComponents);
  }
}
