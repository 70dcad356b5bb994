package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;

/**
 * The nilradical, the largest nilpotent ideal: the x in the radical with ad x nilpotent.
 *
 * <p>By Lie's theorem ad of the radical is triangular over the algebraic closure; its diagonal
 * entries are linear functions, the weights, and x is in the nilradical exactly if all of them
 * vanish on x (Jacobson, Lie Algebras, chapter II). So tr(ad x (ad y)^k), the sum of weight(x)
 * weight(y)^k, vanishes for each x in the nilradical and y in the radical; this is the trace
 * condition of Beck, Kolman and Stewart 1977 for some elements of their associative algebra.
 * Starting from the radical the subspace V is cut down by these conditions for y in V. If they all
 * vanish at x = y for k up to n - 1, then all power sums of the eigenvalues of ad y are 0 and ad y
 * is nilpotent; otherwise y leaves V. When every y of a basis of V has ad y nilpotent, all weights
 * vanish on V, so V is the nilradical. Only y outside [g, radical] need be asked, which lies in the
 * nilradical.
 */
public final class Nilradical {
  private Nilradical() {}

  /**
   * The nilradical.
   *
   * @param radical of the same algebra
   */
  public static <E> Subspace<E> of(LieBracket<E> bracket, Subspace<E> radical) {
    Domain<E> domain = bracket.domain();
    Vectors<E> vectors = new Vectors<>(domain);
    int n = bracket.dimension();
    Subspace<E> lower = Ideals.bracket(bracket, Subspace.whole(domain, n), radical);
    List<E> assumed = new ArrayList<>(lower.nonVanishing());
    assumed.addAll(radical.nonVanishing());
    List<SortedMap<Integer, E>> v = radical.basis();
    while (v.size() > lower.dimension()) {
      List<SortedMap<Integer, E>> conditions = new ArrayList<>();
      for (SortedMap<Integer, E> y : beyond(lower, v, assumed)) {
        conditions.addAll(traces(bracket, y, v, assumed));
      }
      Echelon<E> cut = Elimination.of(domain, conditions, v.size());
      if (cut.rank() == 0) {
        break;
      }
      assumed.addAll(cut.nonVanishing());
      v = vectors.combinations(cut.kernel(), v);
    }
    return new Subspace<>(domain, n, v, List.of()).assuming(assumed.stream().distinct().toList());
  }

  /** The vectors of v that are independent of the subspace and of the ones before. */
  private static <E> List<SortedMap<Integer, E>> beyond(
      Subspace<E> lower, List<SortedMap<Integer, E>> v, List<E> assumed) {
    List<SortedMap<Integer, E>> columns = new ArrayList<>(lower.basis());
    columns.addAll(v);
    List<SortedMap<Integer, E>> rows = new ArrayList<>();
    for (int i = 0; i < lower.ambient(); i++) {
      rows.add(new TreeMap<>());
    }
    for (int c = 0; c < columns.size(); c++) {
      int column = c;
      columns.get(c).forEach((i, e) -> rows.get(i).put(column, e));
    }
    Echelon<E> echelon = Elimination.of(lower.domain(), rows, columns.size(), columns.size(), true);
    assumed.addAll(echelon.nonVanishing());
    return echelon.pivots().stream().filter(c -> c >= lower.dimension()).map(columns::get).toList();
  }

  /** For each k below n the row of tr(ad x (ad y)^k), x running over v; up to factors, kept. */
  private static <E> List<SortedMap<Integer, E>> traces(
      LieBracket<E> bracket,
      SortedMap<Integer, E> y,
      List<SortedMap<Integer, E>> v,
      List<E> assumed) {
    Domain<E> domain = bracket.domain();
    Vectors<E> vectors = new Vectors<>(domain);
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    List<SortedMap<Integer, E>> ad = bracket.adjoint(y);
    List<SortedMap<Integer, E>> power = vectors.units(bracket.dimension());
    for (int k = 0; k < bracket.dimension(); k++) {
      List<E> onBasis = traceWithEach(bracket, power);
      List<E> row = new ArrayList<>();
      for (SortedMap<Integer, E> x : v) {
        row.add(vectors.pair(x, vectors.sparse(onBasis)));
      }
      out.add(vectors.sparse(row));
      power = normal(domain, product(vectors, power, ad), assumed);
      if (power.stream().allMatch(SortedMap::isEmpty)) {
        break;
      }
    }
    return out;
  }

  /** tr(ad e_i M) for each i, M given by rows as {@link LieBracket#adjoint} gives them. */
  private static <E> List<E> traceWithEach(LieBracket<E> bracket, List<SortedMap<Integer, E>> m) {
    Domain<E> domain = bracket.domain();
    List<E> out = new ArrayList<>();
    for (int i = 0; i < bracket.dimension(); i++) {
      E sum = domain.zero();
      for (int j = 0; j < bracket.dimension(); j++) {
        for (var e : bracket.of(i, j).entrySet()) {
          E back = m.get(e.getKey()).get(j);
          if (back != null) {
            sum = domain.plus(sum, domain.times(e.getValue(), back));
          }
        }
      }
      out.add(sum);
    }
    return out;
  }

  private static <E> List<SortedMap<Integer, E>> product(
      Vectors<E> vectors, List<SortedMap<Integer, E>> a, List<SortedMap<Integer, E>> b) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (SortedMap<Integer, E> row : a) {
      SortedMap<Integer, E> sum = new TreeMap<>();
      row.forEach((j, v) -> vectors.add(sum, v, b.get(j)));
      out.add(sum);
    }
    return out;
  }

  /** The matrix freed of a common factor, which is assumed not to vanish. */
  private static <E> List<SortedMap<Integer, E>> normal(
      Domain<E> domain, List<SortedMap<Integer, E>> matrix, List<E> assumed) {
    List<E> all = new ArrayList<>();
    matrix.forEach(row -> all.addAll(row.values()));
    if (all.isEmpty()) {
      return matrix;
    }
    Domain.Normal<E> normal = domain.normal(all);
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    int at = 0;
    for (SortedMap<Integer, E> row : matrix) {
      SortedMap<Integer, E> kept = new TreeMap<>();
      for (Integer column : row.keySet()) {
        E e = normal.entries().get(at++);
        if (!domain.isZero(e)) {
          kept.put(column, e);
        }
      }
      out.add(kept);
    }
    if (out.stream().anyMatch(row -> !row.isEmpty()) && domain.weight(normal.content()) > 0) {
      assumed.add(normal.content());
    }
    return out;
  }
}
