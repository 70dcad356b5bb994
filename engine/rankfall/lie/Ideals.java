package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/** Ideals that every Lie algebra has. */
public final class Ideals {
  private Ideals() {}

  /** The span of all [x, y] with x in one subspace and y in another. */
  public static <E> Subspace<E> bracket(LieBracket<E> bracket, Subspace<E> u, Subspace<E> v) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (SortedMap<Integer, E> x : u.basis()) {
      for (SortedMap<Integer, E> y : v.basis()) {
        out.add(bracket.of(x, y));
      }
    }
    return Subspace.span(bracket.domain(), bracket.dimension(), out);
  }

  /** The derived algebra [g, g]. */
  public static <E> Subspace<E> derived(LieBracket<E> bracket) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int i = 0; i < bracket.dimension(); i++) {
      for (int j = i + 1; j < bracket.dimension(); j++) {
        out.add(bracket.of(i, j));
      }
    }
    return Subspace.span(bracket.domain(), bracket.dimension(), out);
  }

  /** The elements that commute with everything. */
  public static <E> Subspace<E> centre(LieBracket<E> bracket) {
    int n = bracket.dimension();
    List<SortedMap<Integer, E>> functions = new ArrayList<>();
    for (int j = 0; j < n; j++) {
      SortedMap<Integer, SortedMap<Integer, E>> byTarget = new TreeMap<>();
      for (int i = 0; i < n; i++) {
        int source = i;
        bracket
            .of(i, j)
            .forEach((k, v) -> byTarget.computeIfAbsent(k, t -> new TreeMap<>()).put(source, v));
      }
      functions.addAll(byTarget.values());
    }
    return Subspace.kernel(bracket.domain(), n, functions);
  }

  /**
   * The radical, the largest solvable ideal: the orthogonal complement of [g, g] under the Killing
   * form (Bourbaki, Lie Groups and Lie Algebras, chapter I, section 5.5, proposition 5).
   *
   * @param kappa the Killing matrix of the same constants
   * @param derived [g, g]
   */
  public static <E> Subspace<E> radical(
      LieBracket<E> bracket, List<List<E>> kappa, Subspace<E> derived) {
    Vectors<E> vectors = new Vectors<>(bracket.domain());
    return Subspace.kernel(
            bracket.domain(),
            bracket.dimension(),
            derived.basis().stream().map(x -> vectors.times(x, kappa)).toList())
        .assuming(derived.nonVanishing());
  }
}
