package rankfall.published;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeSet;
import rankfall.published.PublishedEntry.Cell;
import rankfall.published.PublishedEntry.Condition;
import rankfall.published.PublishedEntry.Point;

/**
 * Holds what the program says against the published tables; a difference is a sentence, and no
 * difference is an empty list.
 */
final class PublishedComparison {
  private PublishedComparison() {}

  /**
   * Compares the facts at a point that are numbers or truth values.
   *
   * @param published what is due; {@code generators} defaults to {@code dimension}
   * @param observed what the program says
   * @return a sentence for each difference
   */
  static List<String> point(Point published, ObservedPoint observed) {
    if (published.fault().isPresent() || observed.fault().isPresent()) {
      return published.fault().equals(observed.fault())
          ? List.of()
          : List.of(
              "at "
                  + published.at()
                  + ": fault due "
                  + published.fault()
                  + ", found "
                  + observed.fault());
    }
    List<String> differences = new ArrayList<>();
    for (String name : new TreeSet<>(PublishedTables.PLAIN_FACTS)) {
      String due = published.facts().get(name);
      if (due == null && name.equals("generators")) {
        due = published.facts().get("dimension");
      }
      String found = observed.facts().get(name);
      if (due != null && !due.equals(found)) {
        differences.add("at " + published.at() + ": " + name + " due " + due + ", found " + found);
      }
    }
    return differences;
  }

  /**
   * Compares formulas as functions on the relations, and conditions as text.
   *
   * @param published what is due
   * @param observed what the program says
   * @return a sentence for each difference
   */
  static List<String> family(PublishedEntry published, ObservedFamily observed) {
    List<String> differences = new ArrayList<>();
    List<Map<String, Quantity>> points = FormulaPoints.of(published);
    published
        .killing()
        .ifPresent(due -> differences.addAll(cells("killing", due, observed.killing(), points)));
    published
        .restricted()
        .ifPresent(
            due -> differences.addAll(cells("restricted", due, observed.restricted(), points)));
    published.dual().ifPresent(due -> differences.addAll(dual(due, observed.dual(), points)));
    published
        .determinant()
        .ifPresent(
            due -> differences.addAll(formula("determinant", due, observed.determinant(), points)));
    published
        .conditions()
        .ifPresent(due -> differences.addAll(conditions(due, observed.conditions())));
    PublishedSets sets = PublishedSets.of(published);
    published.strata().ifPresent(due -> differences.addAll(sets.strata(due, observed.strata())));
    published
        .loci()
        .forEach((key, due) -> differences.addAll(sets.union(key, due, observed.components())));
    return differences;
  }

  private static List<String> dual(
      SortedMap<Cell, String> due,
      Optional<SortedMap<Cell, String>> found,
      List<Map<String, Quantity>> points) {
    return found.map(f -> cells("dual", due, f, points)).orElse(List.of("dual due, none found"));
  }

  private static List<String> cells(
      String what,
      SortedMap<Cell, String> due,
      SortedMap<Cell, String> found,
      List<Map<String, Quantity>> points) {
    Set<Cell> all = new TreeSet<>(due.keySet());
    all.addAll(found.keySet());
    return all.stream()
        .flatMap(
            c ->
                formula(
                    what + " " + c, due.getOrDefault(c, "0"), found.getOrDefault(c, "0"), points)
                    .stream())
        .toList();
  }

  private static List<String> formula(
      String what, String due, String found, List<Map<String, Quantity>> points) {
    boolean same =
        points.stream()
            .allMatch(p -> ExactText.value(due, p).minus(ExactText.value(found, p)).isZero());
    return same ? List.of() : List.of(what + " due " + due + ", found " + found);
  }

  private static List<String> conditions(List<Condition> due, List<Condition> found) {
    List<String> a = due.stream().map(Condition::toString).sorted().toList();
    List<String> b = found.stream().map(Condition::toString).sorted().toList();
    return a.equals(b) ? List.of() : List.of("conditions due " + a + ", found " + b);
  }
}
