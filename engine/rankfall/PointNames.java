package rankfall;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import rankfall.exact.Chain;
import rankfall.lie.FamilyRing;

/**
 * The names under which values of a point are given.
 *
 * @param all parameters, then functions of parameters such as {@code cos(t)}, in order
 * @param coordinates those that determine the point
 * @param functions what a parameter that is an argument of functions stands for, by parameter
 */
record PointNames(List<String> all, List<String> coordinates, Map<String, List<String>> functions) {
  static PointNames of(FamilyRing ring) {
    List<String> coordinates = new ArrayList<>(ring.variables().names());
    for (Chain.Rule r : ring.constants().rules()) {
      coordinates.remove(ring.variables().names().get(r.variable()));
    }
    Map<String, List<String>> functions = new java.util.TreeMap<>();
    for (String argument : ring.arguments().keySet()) {
      String inside = "(" + argument + ")";
      functions.put(argument, coordinates.stream().filter(c -> c.endsWith(inside)).toList());
    }
    List<String> all = new ArrayList<>(ring.parameters());
    coordinates.stream().filter(c -> !all.contains(c)).forEach(all::add);
    return new PointNames(List.copyOf(all), List.copyOf(coordinates), functions);
  }

  /** Why values under these names determine no point; empty if they do. */
  Optional<String> misfit(Collection<String> given) {
    Set<String> determined = new HashSet<>();
    for (String name : given) {
      if (!all.contains(name)) {
        return Optional.of(
            "'"
                + name
                + "' is no parameter of the family; it has "
                + (all.isEmpty() ? "none" : String.join(", ", all)));
      }
      determined.add(name);
      determined.addAll(functions.getOrDefault(name, List.of()));
    }
    return coordinates.stream()
        .filter(c -> !determined.contains(c))
        .findFirst()
        .map(c -> "no value for the parameter '" + c + "'");
  }
}
