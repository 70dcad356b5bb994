package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.lie.LieBracket;
import rankfall.lie.Subspace;

/**
 * What elements of an algebra do to an abelian ideal.
 *
 * @param dimension of the ideal
 * @param factor the matrices are those of ad times this
 * @param matrices one an element; columns are images: column j, as a sparse vector, at position j
 */
record Action<E>(int dimension, E factor, List<List<SortedMap<Integer, E>>> matrices) {
  Action {
    matrices = matrices.stream().map(List::copyOf).toList();
  }

  /**
   * The action by ad.
   *
   * @param elements of the algebra
   * @param ideal spans the ideal
   */
  static <E> Action<E> of(
      Ground<E> ground,
      LieBracket<E> bracket,
      List<SortedMap<Integer, E>> elements,
      List<SortedMap<Integer, E>> ideal) {
    Section<E> section = Section.subalgebra(ground, bracket, ideal);
    List<List<SortedMap<Integer, E>>> matrices = new ArrayList<>();
    for (SortedMap<Integer, E> x : elements) {
      matrices.add(
          section.representatives().stream()
              .map(v -> section.coordinates().apply(bracket.of(x, v)))
              .toList());
    }
    return new Action<>(section.dimension(), section.factor(), matrices);
  }

  /** All vectors. */
  List<SortedMap<Integer, E>> everything(Ground<E> ground) {
    return Subspace.whole(ground.domain(), dimension).basis();
  }

  /** The image of a vector under a matrix given by columns. */
  static <E> SortedMap<Integer, E> times(
      Ground<E> ground, List<SortedMap<Integer, E>> columns, SortedMap<Integer, E> x) {
    return ground.combination(x, columns);
  }

  /** The rows of a matrix given by columns. */
  static <E> List<SortedMap<Integer, E>> transposed(List<SortedMap<Integer, E>> columns, int rows) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int i = 0; i < rows; i++) {
      out.add(new TreeMap<>());
    }
    for (int j = 0; j < columns.size(); j++) {
      int column = j;
      columns.get(j).forEach((i, v) -> out.get(i).put(column, v));
    }
    return out;
  }

  /** The matrix of a combination of the elements. */
  List<SortedMap<Integer, E>> matrix(Ground<E> ground, SortedMap<Integer, E> x) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int j = 0; j < dimension; j++) {
      SortedMap<Integer, E> column = new TreeMap<>();
      for (var e : x.entrySet()) {
        ground.add(column, e.getValue(), matrices.get(e.getKey()).get(j));
      }
      out.add(column);
    }
    return out;
  }

  /**
   * The Casimir element of an ideal of the semisimple algebra whose basis acts.
   *
   * @param killing the Killing matrix of the scaled basis
   * @param scale the basis times this has that Killing matrix
   * @param ideal a basis of the ideal
   * @return the columns of a multiple of the Casimir element, then, at position 0 of one more
   *     column, what the number 1 becomes by the same multiple
   */
  List<SortedMap<Integer, E>> casimir(
      Ground<E> ground, List<List<E>> killing, E scale, List<SortedMap<Integer, E>> ideal) {
    List<SortedMap<Integer, E>> rows = killing.stream().map(ground::sparse).toList();
    List<SortedMap<Integer, E>> gram = new ArrayList<>();
    for (SortedMap<Integer, E> x : ideal) {
      SortedMap<Integer, E> function = ground.combination(x, rows);
      gram.add(ground.sparse(ideal.stream().map(y -> ground.pair(function, y)).toList()));
    }
    int m = ideal.size();
    Ground.Quotient<E> inverse = ground.solve(gram, Subspace.whole(ground.domain(), m).basis(), m);
    List<List<SortedMap<Integer, E>>> acting = ideal.stream().map(x -> matrix(ground, x)).toList();
    E squared = ground.domain().times(scale, scale);
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int j = 0; j < dimension; j++) {
      SortedMap<Integer, E> sum = new TreeMap<>();
      for (int k = 0; k < m; k++) {
        SortedMap<Integer, E> inner = new TreeMap<>();
        for (var e : inverse.rows().get(k).entrySet()) {
          ground.add(inner, e.getValue(), acting.get(e.getKey()).get(j));
        }
        ground.add(sum, squared, times(ground, acting.get(k), inner));
      }
      out.add(ground.sparse(ground.shorter().apply(dense(ground, sum))));
    }
    SortedMap<Integer, E> unit = new TreeMap<>();
    E own = ground.domain().times(factor, factor);
    unit.put(0, ground.domain().times(own, inverse.denominator()));
    out.add(unit);
    return out;
  }

  private List<E> dense(Ground<E> ground, SortedMap<Integer, E> x) {
    List<E> out = new ArrayList<>();
    for (int i = 0; i < dimension; i++) {
      out.add(x.getOrDefault(i, ground.domain().zero()));
    }
    return out;
  }
}
