package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;

/** Sparse rows over a domain. */
final class SpanRows {
  private SpanRows() {}

  /** The row in normal form, without zeros; no common factor is taken out. */
  static <E> SortedMap<Integer, E> kept(Domain<E> domain, SortedMap<Integer, E> row) {
    return scaled(domain, row, domain.one()).row();
  }

  /**
   * A row with the number by which it was multiplied.
   *
   * @param row non-zero entries
   * @param scale not 0
   */
  record Scaled<E>(SortedMap<Integer, E> row, E scale) {}

  /** Row and scale in normal form, both freed of a common factor of all of them. */
  static <E> Scaled<E> scaled(Domain<E> domain, SortedMap<Integer, E> row, E scale) {
    List<E> entries = new ArrayList<>(row.values());
    entries.add(scale);
    List<E> normal = domain.normal(entries).entries();
    SortedMap<Integer, E> out = new TreeMap<>();
    int at = 0;
    for (Integer k : row.keySet()) {
      E v = normal.get(at++);
      if (!domain.isZero(v)) {
        out.put(k, v);
      }
    }
    return new Scaled<>(out, normal.get(at));
  }

  /** The matrix with these columns, as rows; empty rows are left out. */
  static <E> List<SortedMap<Integer, E>> transposed(List<SortedMap<Integer, E>> columns) {
    SortedMap<Integer, SortedMap<Integer, E>> rows = new TreeMap<>();
    for (int c = 0; c < columns.size(); c++) {
      int column = c;
      columns
          .get(c)
          .forEach((r, v) -> rows.computeIfAbsent(r, x -> new TreeMap<>()).put(column, v));
    }
    return new ArrayList<>(rows.values());
  }

  /**
   * An element freed of every factor that it shares with one of the others.
   *
   * @param e in normal form, not 0
   */
  static <E> E without(Domain<E> domain, E e, List<E> others) {
    E out = e;
    for (E o : others) {
      E before = null;
      while (!out.equals(before)) {
        before = out;
        out = domain.cofactors(out, o).get(0);
      }
    }
    return out;
  }
}
