package rankfall.lie;

import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;

/**
 * The brackets of a basis e_1 .. e_n, kept free of fractions.
 *
 * <p>With y_i = scale_i * e_i the brackets are {@code [y_i, y_j] = (1/denominator) * sum_k C_ij^k
 * y_k}. The C alone are the structure constants of an isomorphic algebra (basis denominator * y_i),
 * so every question that does not depend on the basis may be asked of the C.
 *
 * @param domain the ring of the C
 * @param dimension n, 0 or more
 * @param brackets C_ij^k: the non-zero ones, for i less than j only, indices from 0
 * @param denominator not 0
 * @param scale n elements, none 0
 * @param <E> the elements
 */
public record StructureConstants<E>(
    Domain<E> domain,
    int dimension,
    SortedMap<Pair, SortedMap<Integer, E>> brackets,
    E denominator,
    List<E> scale) {

  /** Copies what it is given. */
  public StructureConstants {
    SortedMap<Pair, SortedMap<Integer, E>> copy = new TreeMap<>();
    brackets.forEach(
        (p, v) -> {
          if (p.left() >= p.right()) {
            throw new IllegalArgumentException("left before right, not " + p);
          }
          if (!v.isEmpty()) {
            copy.put(p, Collections.unmodifiableSortedMap(new TreeMap<>(v)));
          }
        });
    brackets = Collections.unmodifiableSortedMap(copy);
    scale = List.copyOf(scale);
  }

  /**
   * Two generators.
   *
   * @param left position from 0
   * @param right position from 0
   */
  public record Pair(int left, int right) implements Comparable<Pair> {
    @Override
    public int compareTo(Pair o) {
      return left != o.left ? Integer.compare(left, o.left) : Integer.compare(right, o.right);
    }
  }

  /**
   * The combination C_ij, for any i and j.
   *
   * @return C_ij^k by k, without zeros; unmodifiable
   */
  public SortedMap<Integer, E> bracket(int i, int j) {
    if (i == j) {
      return Collections.emptySortedMap();
    }
    SortedMap<Integer, E> c =
        brackets.getOrDefault(
            new Pair(Math.min(i, j), Math.max(i, j)), Collections.emptySortedMap());
    if (i < j) {
      return c;
    }
    SortedMap<Integer, E> negative = new TreeMap<>();
    c.forEach((k, v) -> negative.put(k, domain.negate(v)));
    return Collections.unmodifiableSortedMap(negative);
  }
}
