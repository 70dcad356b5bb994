package rankfall.lie;

import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Polynomial;

/**
 * What an expression says: a number plus a combination of basis vectors (matrix units by position,
 * or generators by number).
 *
 * @param number the part without vectors
 * @param vector non-zero coefficients
 * @param divisors by what was divided on the way
 */
record FamilyValue(Gaussian number, SortedMap<Integer, Gaussian> vector, Set<Polynomial> divisors) {
  FamilyValue {
    vector = Collections.unmodifiableSortedMap(new TreeMap<>(vector));
    divisors = Collections.unmodifiableSet(new LinkedHashSet<>(divisors));
  }

  static FamilyValue of(Gaussian number) {
    return new FamilyValue(number, Collections.emptySortedMap(), Set.of());
  }

  boolean isNumber() {
    return vector.isEmpty();
  }

  /** Both sets of divisors. */
  Set<Polynomial> divisorsWith(FamilyValue other) {
    Set<Polynomial> all = new LinkedHashSet<>(divisors);
    all.addAll(other.divisors);
    return all;
  }
}
