package rankfall.lie;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;

/**
 * The symmetric bilinear forms B with B([x,y],z) + B(y,[x,z]) = 0.
 *
 * @param dimension of the algebra
 * @param forms a basis; a form is a vector with the entry in row i, column j not before i, at
 *     position i*n - i*(i-1)/2 + (j - i)
 * @param <E> the entries
 */
public record InvariantForms<E>(int dimension, Subspace<E> forms) {

  /** All invariant forms of an algebra. */
  public static <E> InvariantForms<E> of(LieBracket<E> bracket) {
    int n = bracket.dimension();
    Set<SortedMap<Integer, E>> rows = new LinkedHashSet<>();
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        for (int k = j; k < n; k++) {
          SortedMap<Integer, E> row = condition(bracket, i, j, k);
          if (!row.isEmpty()) {
            rows.add(row);
          }
        }
      }
    }
    List<SortedMap<Integer, E>> system = withoutForcedZeros(new Vectors<>(bracket.domain()), rows);
    return new InvariantForms<>(n, solutions(bracket.domain(), n * (n + 1) / 2, system));
  }

  /**
   * The solutions of a system with far more rows than unknowns, a batch of rows at a time: each
   * batch is asked only of the solutions of the batches before.
   */
  private static <E> Subspace<E> solutions(
      Domain<E> domain, int unknowns, List<SortedMap<Integer, E>> rows) {
    Vectors<E> vectors = new Vectors<>(domain);
    int batch = Math.min(unknowns, Math.max(1, rows.size()));
    Subspace<E> out =
        Subspace.kernel(domain, unknowns, rows.subList(0, Math.min(batch, rows.size())));
    for (int from = batch; from < rows.size() && out.dimension() > 0; from += batch) {
      List<SortedMap<Integer, E>> basis = out.basis();
      List<SortedMap<Integer, E>> asked = new ArrayList<>();
      for (SortedMap<Integer, E> row : rows.subList(from, Math.min(from + batch, rows.size()))) {
        asked.add(vectors.sparse(basis.stream().map(x -> vectors.pair(row, x)).toList()));
      }
      Subspace<E> weights = Subspace.kernel(domain, basis.size(), asked);
      if (weights.dimension() < basis.size()) {
        out =
            new Subspace<>(
                    domain,
                    unknowns,
                    vectors.combinations(weights.basis(), basis),
                    weights.nonVanishing())
                .assuming(out.nonVanishing());
      }
    }
    return out;
  }

  private static <E> SortedMap<Integer, E> condition(LieBracket<E> bracket, int i, int j, int k) {
    Vectors<E> vectors = new Vectors<>(bracket.domain());
    int n = bracket.dimension();
    SortedMap<Integer, E> row = new TreeMap<>();
    bracket.of(i, j).forEach((l, c) -> vectors.add(row, position(n, l, k), c));
    bracket.of(i, k).forEach((l, c) -> vectors.add(row, position(n, j, l), c));
    return row;
  }

  /**
   * An equivalent system: an unknown that stands alone in some row is 0, so it is struck out of all
   * other rows, until nothing changes. The lone rows stay, with the assumptions they bring.
   */
  private static <E> List<SortedMap<Integer, E>> withoutForcedZeros(
      Vectors<E> vectors, Set<SortedMap<Integer, E>> rows) {
    SortedMap<Integer, SortedMap<Integer, E>> alone = new TreeMap<>();
    Set<SortedMap<Integer, E>> open = rows;
    int before;
    do {
      before = alone.size();
      Set<SortedMap<Integer, E>> rest = new LinkedHashSet<>();
      for (SortedMap<Integer, E> row : open) {
        SortedMap<Integer, E> kept = new TreeMap<>(row);
        kept.keySet().removeAll(alone.keySet());
        if (kept.size() == 1 && !vectors.vanishes(kept.get(kept.firstKey()))) {
          alone.put(kept.firstKey(), kept);
        } else if (!kept.isEmpty()) {
          rest.add(kept);
        }
      }
      open = rest;
    } while (alone.size() > before);
    List<SortedMap<Integer, E>> out = new ArrayList<>(alone.values());
    out.addAll(open);
    return out;
  }

  private static int position(int n, int i, int j) {
    int low = Math.min(i, j);
    return low * n - low * (low - 1) / 2 + Math.abs(i - j);
  }

  /** The number of independent invariant forms. */
  public int count() {
    return forms.dimension();
  }

  /**
   * The basis as matrices.
   *
   * @return symmetric matrices of n sparse rows
   */
  public List<List<SortedMap<Integer, E>>> matrices() {
    return forms.basis().stream().map(this::matrix).toList();
  }

  private List<SortedMap<Integer, E>> matrix(SortedMap<Integer, E> form) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int i = 0; i < dimension; i++) {
      SortedMap<Integer, E> row = new TreeMap<>();
      for (int j = 0; j < dimension; j++) {
        E e = form.get(position(dimension, i, j));
        if (e != null) {
          row.put(j, e);
        }
      }
      out.add(row);
    }
    return out;
  }

  /** The greatest rank that an invariant form has. */
  public MaximalRank maximalRank() {
    Domain<E> domain = forms.domain();
    return MaximalRank.of(domain, dimension, matrices());
  }
}
