package rankfall.identify;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;
import rankfall.lie.CharacteristicPolynomial;
import rankfall.lie.LieBracket;
import rankfall.lie.Subspace;

/**
 * How an element acts on an ideal.
 *
 * @param domain the ring of the entries
 * @param matrix the matrix of ad z in a basis of the ideal, times some factor that is not 0; exact,
 *     not in normal form
 * @param assumed elements such that the matrix is this one wherever none of them vanishes
 * @param <E> the entries
 */
record IdealAction<E>(Domain<E> domain, List<List<E>> matrix, List<E> assumed) {
  IdealAction {
    matrix = matrix.stream().map(List::copyOf).toList();
    assumed = List.copyOf(assumed);
  }

  /**
   * The action of the first basis element of the algebra that lies outside an ideal and inside a
   * larger subspace.
   *
   * @param ideal smaller than the algebra
   * @param within a subspace that is larger than the ideal
   */
  static <E> IdealAction<E> of(LieBracket<E> bracket, Subspace<E> ideal, Subspace<E> within) {
    IdealBasis<E> basis = IdealBasis.of(bracket, ideal);
    List<E> assumed = new ArrayList<>(ideal.nonVanishing());
    assumed.addAll(within.nonVanishing());
    assumed.addAll(basis.echelon().nonVanishing());
    SortedMap<Integer, E> z = outside(ideal, within, assumed);
    return normal(bracket.domain(), basis.action(bracket, z), assumed);
  }

  private static <E> SortedMap<Integer, E> outside(
      Subspace<E> ideal, Subspace<E> within, List<E> assumed) {
    for (SortedMap<Integer, E> x : within.basis()) {
      List<SortedMap<Integer, E>> more = new ArrayList<>(ideal.basis());
      more.add(x);
      Echelon<E> echelon = Elimination.of(ideal.domain(), more, ideal.ambient());
      if (echelon.rank() > ideal.dimension()) {
        assumed.addAll(echelon.nonVanishing());
        return x;
      }
    }
    throw new IllegalArgumentException("the ideal is not smaller");
  }

  /** The matrix, all entries freed of a common factor. */
  private static <E> IdealAction<E> normal(
      Domain<E> domain, List<List<E>> matrix, List<E> assumed) {
    List<E> all = new ArrayList<>();
    matrix.forEach(all::addAll);
    Domain.Normal<E> normal = domain.normal(all);
    boolean zero = normal.entries().stream().allMatch(domain::isZero);
    if (!zero && domain.weight(normal.content()) > 0) {
      assumed.add(normal.content());
    }
    int n = matrix.size();
    List<List<E>> rows = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      rows.add(normal.entries().subList(i * n, (i + 1) * n));
    }
    return new IdealAction<>(domain, rows, assumed);
  }

  /**
   * The elementary symmetric functions of the eigenvalues: the trace first, the determinant last.
   */
  List<E> symmetric() {
    List<E> p = CharacteristicPolynomial.of(domain, matrix);
    List<E> out = new ArrayList<>();
    for (int k = 1; k < p.size(); k++) {
      out.add(k % 2 == 0 ? p.get(k) : domain.negate(p.get(k)));
    }
    return out;
  }

  /**
   * The powers of the matrix after row reduction: the rank is the degree of the minimal polynomial.
   */
  Echelon<E> powers() {
    Arithmetic<E> ring = new Arithmetic<>(domain);
    List<SortedMap<Integer, E>> rows = new ArrayList<>();
    List<List<E>> power = ring.unit(matrix.size());
    for (int k = 0; k < matrix.size(); k++) {
      rows.add(Collections.unmodifiableSortedMap(new TreeMap<>(ring.flat(power))));
      power = ring.product(power, matrix);
    }
    return Elimination.of(domain, rows, matrix.size() * matrix.size());
  }
}
