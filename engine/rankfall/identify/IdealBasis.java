package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import rankfall.exact.Domain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;
import rankfall.lie.LieBracket;
import rankfall.lie.Subspace;

/**
 * A basis of an ideal in which coordinates can be read off.
 *
 * @param domain the ring of the coordinates
 * @param echelon the basis; each pivot column has one entry
 * @param <E> the coordinates
 */
record IdealBasis<E>(Domain<E> domain, Echelon<E> echelon) {

  static <E> IdealBasis<E> of(LieBracket<E> bracket, Subspace<E> ideal) {
    return new IdealBasis<>(
        bracket.domain(), Elimination.of(bracket.domain(), ideal.basis(), bracket.dimension()));
  }

  private E pivot(int i) {
    return echelon.rows().get(i).get(echelon.pivots().get(i));
  }

  /** The product of all pivots, not 0. */
  E factor() {
    List<E> pivots = new ArrayList<>();
    for (int i = 0; i < echelon.rank(); i++) {
      pivots.add(pivot(i));
    }
    return new Arithmetic<>(domain).product(pivots);
  }

  /** The coordinates of a vector of the ideal, times {@link #factor}. */
  private List<E> coordinates(SortedMap<Integer, E> v) {
    Arithmetic<E> ring = new Arithmetic<>(domain);
    List<E> out = new ArrayList<>();
    for (int i = 0; i < echelon.rank(); i++) {
      List<E> factors = new ArrayList<>();
      factors.add(v.getOrDefault(echelon.pivots().get(i), domain.zero()));
      for (int k = 0; k < echelon.rank(); k++) {
        if (k != i) {
          factors.add(pivot(k));
        }
      }
      out.add(ring.product(factors));
    }
    return out;
  }

  /**
   * The matrix of ad x on the ideal, times {@link #factor}.
   *
   * @param x any element of the algebra
   */
  List<List<E>> action(LieBracket<E> bracket, SortedMap<Integer, E> x) {
    List<List<E>> columns = new ArrayList<>();
    for (SortedMap<Integer, E> u : echelon.rows()) {
      columns.add(coordinates(bracket.of(x, u)));
    }
    List<List<E>> out = new ArrayList<>();
    for (int i = 0; i < columns.size(); i++) {
      List<E> row = new ArrayList<>();
      for (List<E> column : columns) {
        row.add(column.get(i));
      }
      out.add(row);
    }
    return out;
  }
}
