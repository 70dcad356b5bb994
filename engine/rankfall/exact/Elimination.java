package rankfall.exact;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * Row reduction without division: a row is replaced by a combination of itself and the pivot row,
 * then freed of a common factor.
 *
 * <p>Pivots are preferred constant, then monomial, then short (fraction-free elimination as in
 * Bareiss 1968; departs: no exact division by the previous pivot, the content of the row is removed
 * instead, which serves sparse matrices and rings modulo equations).
 *
 * @param <E> the elements
 */
public final class Elimination<E> {
  private final Domain<E> domain;
  private final int columns;
  private final int pivotColumns;
  private final boolean inOrder;
  private final List<Row<E>> open = new ArrayList<>();
  private final List<Row<E>> done = new ArrayList<>();

  private Elimination(Domain<E> domain, int columns, int pivotColumns, boolean inOrder) {
    this.domain = domain;
    this.columns = columns;
    this.pivotColumns = pivotColumns;
    this.inOrder = inOrder;
  }

  /** A row on its way; mutable, never handed out. */
  private static final class Row<E> {
    SortedMap<Integer, E> entries;
    SortedMap<Integer, Integer> weights = new TreeMap<>();
    final List<E> contents = new ArrayList<>();
    int pivot = -1;

    Row(SortedMap<Integer, E> entries) {
      this.entries = entries;
    }
  }

  /**
   * Reduces a matrix, pivots wherever they are cheapest.
   *
   * @param domain the entries' ring
   * @param rows sparse rows: non-zero entries by column
   * @param columns number of columns
   */
  public static <E> Echelon<E> of(
      Domain<E> domain, List<? extends SortedMap<Integer, E>> rows, int columns) {
    return new Elimination<>(domain, columns, columns, false).run(rows);
  }

  /**
   * Reduces a matrix with pivots in its first columns only.
   *
   * @param pivotColumns pivots stand in columns below this one
   * @param inOrder whether a column gets a pivot whenever it is independent of the columns before
   */
  public static <E> Echelon<E> of(
      Domain<E> domain,
      List<? extends SortedMap<Integer, E>> rows,
      int columns,
      int pivotColumns,
      boolean inOrder) {
    return new Elimination<>(domain, columns, pivotColumns, inOrder).run(rows);
  }

  private Echelon<E> run(List<? extends SortedMap<Integer, E>> rows) {
    for (SortedMap<Integer, E> r : rows) {
      Row<E> row = new Row<>(r);
      normalise(row);
      if (!row.entries.isEmpty()) {
        open.add(row);
      }
    }
    for (int from = 0; from < pivotColumns; from++) {
      int column = from;
      Row<E> best = choose(column);
      if (best == null) {
        if (inOrder) {
          continue;
        }
        break;
      }
      open.remove(best);
      List<Row<E>> rest = new ArrayList<>();
      for (Row<E> row : open) {
        clear(row, best);
        if (!row.entries.isEmpty()) {
          rest.add(row);
        }
      }
      open.clear();
      open.addAll(rest);
      done.add(best);
    }
    return echelon();
  }

  /** The row with the cheapest pivot, marked; null where none is left. */
  private Row<E> choose(int column) {
    Row<E> best = null;
    long bestCost = Long.MAX_VALUE;
    for (Row<E> row : open) {
      SortedMap<Integer, Integer> candidates =
          inOrder ? row.weights.subMap(column, column + 1) : row.weights.headMap(pivotColumns);
      for (var e : candidates.entrySet()) {
        long cost = 1000L * e.getValue() + row.entries.size();
        if (cost < bestCost) {
          bestCost = cost;
          best = row;
          row.pivot = e.getKey();
        }
      }
    }
    return best;
  }

  private void clear(Row<E> row, Row<E> by) {
    E q = row.entries.get(by.pivot);
    if (q == null) {
      return;
    }
    List<E> factors = domain.cofactors(by.entries.get(by.pivot), q);
    E minus = domain.negate(factors.get(1));
    SortedMap<Integer, E> out = new TreeMap<>();
    row.entries.forEach((k, v) -> out.put(k, domain.times(factors.get(0), v)));
    by.entries.forEach((k, v) -> out.merge(k, domain.times(minus, v), domain::plus));
    out.remove(by.pivot);
    row.entries = out;
    normalise(row);
  }

  private void normalise(Row<E> row) {
    List<Integer> keys = new ArrayList<>(row.entries.keySet());
    Domain.Normal<E> n = domain.normal(new ArrayList<>(row.entries.values()));
    SortedMap<Integer, E> out = new TreeMap<>();
    for (int k = 0; k < keys.size(); k++) {
      if (!domain.isZero(n.entries().get(k))) {
        out.put(keys.get(k), n.entries().get(k));
      }
    }
    row.entries = out;
    row.weights = new TreeMap<>();
    out.headMap(pivotColumns).forEach((k, v) -> row.weights.put(k, domain.weight(v)));
    if (!out.isEmpty()) {
      row.contents.add(n.content());
    }
  }

  private Echelon<E> echelon() {
    List<E> nonVanishing = new ArrayList<>();
    for (Row<E> row : done) {
      row.contents.stream().filter(c -> domain.weight(c) > 0).forEach(nonVanishing::add);
      E p = row.entries.get(row.pivot);
      if (domain.weight(p) > 0) {
        nonVanishing.add(p);
      }
    }
    for (int k = done.size() - 1; k > 0; k--) {
      for (int j = 0; j < k; j++) {
        clear(done.get(j), done.get(k));
      }
    }
    done.sort(Comparator.comparingInt((Row<E> r) -> r.pivot));
    return new Echelon<>(
        domain,
        columns,
        done.stream().map(r -> r.pivot).toList(),
        done.stream().map(r -> r.entries).toList(),
        open.stream().map(r -> r.entries).toList(),
        nonVanishing);
  }
}
