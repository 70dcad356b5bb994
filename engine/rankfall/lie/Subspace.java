package rankfall.lie;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import rankfall.exact.Domain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;

/**
 * A linear subspace of an algebra.
 *
 * @param domain the ring of the coordinates
 * @param ambient the dimension of the algebra
 * @param basis independent sparse vectors, as many as the dimension
 * @param nonVanishing elements such that the dimension is the same wherever none of them vanishes;
 *     constants are left out
 * @param <E> the coordinates
 */
public record Subspace<E>(
    Domain<E> domain, int ambient, List<SortedMap<Integer, E>> basis, List<E> nonVanishing) {
  /** Copies the lists. */
  public Subspace {
    basis = basis.stream().map(Collections::unmodifiableSortedMap).toList();
    nonVanishing = List.copyOf(nonVanishing);
  }

  /**
   * The vectors' linear span.
   *
   * @param vectors sparse, in any number
   */
  public static <E> Subspace<E> span(
      Domain<E> domain, int ambient, List<SortedMap<Integer, E>> vectors) {
    Echelon<E> echelon = Elimination.of(domain, vectors, ambient);
    return new Subspace<>(domain, ambient, echelon.rows(), echelon.nonVanishing());
  }

  /**
   * The vectors on which all given linear functions vanish.
   *
   * @param functions sparse rows, in any number
   */
  public static <E> Subspace<E> kernel(
      Domain<E> domain, int ambient, List<SortedMap<Integer, E>> functions) {
    Echelon<E> echelon = Elimination.of(domain, functions, ambient);
    return new Subspace<>(domain, ambient, echelon.kernel(), echelon.nonVanishing());
  }

  /** The whole algebra, its basis the given one. */
  public static <E> Subspace<E> whole(Domain<E> domain, int ambient) {
    return new Subspace<>(domain, ambient, new Vectors<>(domain).units(ambient), List.of());
  }

  /** The number of basis vectors. */
  public int dimension() {
    return basis.size();
  }

  /** Whether a vector lies in the subspace. */
  public boolean contains(SortedMap<Integer, E> x) {
    List<SortedMap<Integer, E>> more = new ArrayList<>(basis);
    more.add(x);
    return Elimination.of(domain, more, ambient).rank() == dimension();
  }

  /** Whether another subspace lies in this one. */
  public boolean contains(Subspace<E> other) {
    List<SortedMap<Integer, E>> more = new ArrayList<>(basis);
    more.addAll(other.basis);
    return Elimination.of(domain, more, ambient).rank() == dimension();
  }

  /** The same subspace, found under further assumptions. */
  Subspace<E> assuming(List<E> further) {
    List<E> all = new ArrayList<>(further);
    nonVanishing.stream().filter(p -> !all.contains(p)).forEach(all::add);
    return new Subspace<>(domain, ambient, basis, all);
  }
}
