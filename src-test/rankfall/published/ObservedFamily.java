package rankfall.published;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.published.PublishedEntry.Cell;
import rankfall.published.PublishedEntry.Condition;

/**
 * What the program says about a family at its general point. Formulas are text in the names of the
 * spec; they need not be expanded.
 *
 * @param killing the non-zero entries of the Killing matrix, upper triangle
 * @param determinant of the Killing matrix; {@code 0} where the form is degenerate throughout
 * @param conditions the conditions as printed
 * @param restricted the non-zero entries of the form on the torus; empty without a torus
 * @param dual the non-zero entries of the inverse of that, where it exists
 */
record ObservedFamily(
    SortedMap<Cell, String> killing,
    String determinant,
    List<Condition> conditions,
    SortedMap<Cell, String> restricted,
    Optional<SortedMap<Cell, String>> dual) {
  ObservedFamily {
    killing = Collections.unmodifiableSortedMap(new TreeMap<>(killing));
    conditions = List.copyOf(conditions);
    restricted = Collections.unmodifiableSortedMap(new TreeMap<>(restricted));
    dual = dual.map(m -> Collections.unmodifiableSortedMap(new TreeMap<>(m)));
  }
}
