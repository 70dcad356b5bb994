package rankfall.lie;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;

/**
 * The bracket of arbitrary elements, bilinear in the constants C of {@link StructureConstants}.
 *
 * <p>The constants are laid out once for both orders of a pair.
 *
 * @param <E> the coordinates
 */
public final class LieBracket<E> {
  private final Domain<E> domain;
  private final Vectors<E> vectors;
  private final List<List<SortedMap<Integer, E>>> table;

  private LieBracket(Domain<E> domain, List<List<SortedMap<Integer, E>>> table) {
    this.domain = domain;
    this.vectors = new Vectors<>(domain);
    this.table = table;
  }

  /** The bracket that the constants C describe; denominator and scale play no part. */
  public static <E> LieBracket<E> of(StructureConstants<E> constants) {
    Vectors<E> vectors = new Vectors<>(constants.domain());
    List<List<SortedMap<Integer, E>>> table = new ArrayList<>();
    for (int i = 0; i < constants.dimension(); i++) {
      List<SortedMap<Integer, E>> row = new ArrayList<>();
      for (int j = 0; j < constants.dimension(); j++) {
        SortedMap<Integer, E> kept = new TreeMap<>();
        constants
            .bracket(i, j)
            .forEach(
                (k, v) -> {
                  if (!vectors.vanishes(v)) {
                    kept.put(k, v);
                  }
                });
        row.add(Collections.unmodifiableSortedMap(kept));
      }
      table.add(Collections.unmodifiableList(row));
    }
    return new LieBracket<>(constants.domain(), Collections.unmodifiableList(table));
  }

  /** The ring of the constants. */
  public Domain<E> domain() {
    return domain;
  }

  /**
   * The dimension of the algebra.
   *
   * @return n, 0 or more
   */
  public int dimension() {
    return table.size();
  }

  /**
   * The bracket of two basis elements.
   *
   * @return its non-zero coordinates; unmodifiable
   */
  public SortedMap<Integer, E> of(int i, int j) {
    return table.get(i).get(j);
  }

  /**
   * The bracket [x, y].
   *
   * @param x sparse coordinates
   * @param y sparse coordinates
   * @return sparse coordinates
   */
  public SortedMap<Integer, E> of(SortedMap<Integer, E> x, SortedMap<Integer, E> y) {
    SortedMap<Integer, E> out = new TreeMap<>();
    x.forEach(
        (i, a) ->
            y.forEach(
                (j, b) -> {
                  SortedMap<Integer, E> c = of(i, j);
                  if (!c.isEmpty()) {
                    vectors.add(out, domain.times(a, b), c);
                  }
                }));
    return out;
  }

  /**
   * The matrix of ad x, transposed: row j holds the coordinates of [x, e_j].
   *
   * @param x sparse coordinates
   * @return n sparse rows
   */
  public List<SortedMap<Integer, E>> adjoint(SortedMap<Integer, E> x) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int j = 0; j < dimension(); j++) {
      SortedMap<Integer, E> row = new TreeMap<>();
      for (var e : x.entrySet()) {
        vectors.add(row, e.getValue(), of(e.getKey(), j));
      }
      out.add(row);
    }
    return out;
  }
}
