package rankfall.exact;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * A matrix after row reduction: each pivot column has one non-zero entry.
 *
 * @param domain the entries' ring
 * @param columns number of columns
 * @param pivots the pivot columns, ascending; their number is the rank (within the pivot columns)
 * @param rows one a pivot, in the same order; non-zero entries by column
 * @param rest non-zero rows without a pivot, where pivots were confined to some columns
 * @param nonVanishing elements such that the rank is the same wherever none of them vanishes; those
 *     that are constant are left out
 * @param <E> the elements
 */
public record Echelon<E>(
    Domain<E> domain,
    int columns,
    List<Integer> pivots,
    List<SortedMap<Integer, E>> rows,
    List<SortedMap<Integer, E>> rest,
    List<E> nonVanishing) {
  /** Copies the lists. */
  public Echelon {
    pivots = List.copyOf(pivots);
    rows = rows.stream().map(Collections::unmodifiableSortedMap).toList();
    rest = rest.stream().map(Collections::unmodifiableSortedMap).toList();
    nonVanishing = List.copyOf(nonVanishing);
  }

  /** The rank. */
  public int rank() {
    return pivots.size();
  }

  /**
   * A basis of the vectors x with (matrix) x = 0, one for each column without a pivot.
   *
   * @return sparse vectors: non-zero entries by column, freed of a common factor
   */
  public List<SortedMap<Integer, E>> kernel() {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int c = 0; c < columns; c++) {
      if (!pivots.contains(c)) {
        out.add(kernelVector(c));
      }
    }
    return out;
  }

  private SortedMap<Integer, E> kernelVector(int free) {
    SortedMap<Integer, E> x = new TreeMap<>();
    x.put(free, domain.one());
    for (int k = 0; k < rows.size(); k++) {
      E r = rows.get(k).get(free);
      if (r != null) {
        E above = x.get(free);
        List<E> c = domain.cofactors(rows.get(k).get(pivots.get(k)), r);
        E scale = c.get(0);
        x.replaceAll((i, v) -> domain.times(scale, v));
        x.put(pivots.get(k), domain.negate(domain.times(c.get(1), above)));
      }
    }
    return normal(x);
  }

  private SortedMap<Integer, E> normal(SortedMap<Integer, E> x) {
    List<E> entries = domain.normal(new ArrayList<>(x.values())).entries();
    SortedMap<Integer, E> out = new TreeMap<>();
    int k = 0;
    for (Integer i : x.keySet()) {
      E v = entries.get(k++);
      if (!domain.isZero(v)) {
        out.put(i, v);
      }
    }
    return Collections.unmodifiableSortedMap(out);
  }
}
