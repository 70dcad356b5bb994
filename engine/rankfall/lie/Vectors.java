package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;

/**
 * Sums, multiples and pairings of sparse vectors.
 *
 * @param domain the ring of the coordinates
 * @param <E> the coordinates
 */
record Vectors<E>(Domain<E> domain) {
  /** The vector with a single 1. */
  SortedMap<Integer, E> unit(int at) {
    SortedMap<Integer, E> x = new TreeMap<>();
    x.put(at, domain.one());
    return x;
  }

  /** All unit vectors. */
  List<SortedMap<Integer, E>> units(int dimension) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int i = 0; i < dimension; i++) {
      out.add(unit(i));
    }
    return out;
  }

  /** Adds a multiple of one vector to another, which is changed. */
  void add(SortedMap<Integer, E> sum, E factor, SortedMap<Integer, E> x) {
    x.forEach((k, v) -> add(sum, k, domain.times(factor, v)));
  }

  /** Adds to one coordinate of a vector, which is changed. */
  void add(SortedMap<Integer, E> sum, int at, E value) {
    E old = sum.get(at);
    E now = old == null ? value : domain.plus(old, value);
    if (domain.isZero(now)) {
      sum.remove(at);
    } else {
      sum.put(at, now);
    }
  }

  /** The product of a row vector and a matrix. */
  SortedMap<Integer, E> times(SortedMap<Integer, E> x, List<List<E>> matrix) {
    SortedMap<Integer, E> out = new TreeMap<>();
    x.forEach((i, v) -> add(out, v, sparse(matrix.get(i))));
    return out;
  }

  /** The sum of products of coordinates. */
  E pair(SortedMap<Integer, E> x, SortedMap<Integer, E> y) {
    E sum = domain.zero();
    for (var e : x.entrySet()) {
      E other = y.get(e.getKey());
      if (other != null) {
        sum = domain.plus(sum, domain.times(e.getValue(), other));
      }
    }
    return sum;
  }

  /** The entries of a dense row that are not plainly 0. */
  SortedMap<Integer, E> sparse(List<E> row) {
    SortedMap<Integer, E> out = new TreeMap<>();
    for (int k = 0; k < row.size(); k++) {
      if (!domain.isZero(row.get(k))) {
        out.put(k, row.get(k));
      }
    }
    return out;
  }

  /** The rows of a dense matrix. */
  List<SortedMap<Integer, E>> rows(List<List<E>> matrix) {
    return matrix.stream().map(this::sparse).toList();
  }

  /** Sums of multiples of vectors, each freed of a common factor. */
  List<SortedMap<Integer, E>> combinations(
      List<SortedMap<Integer, E>> weights, List<SortedMap<Integer, E>> of) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (SortedMap<Integer, E> w : weights) {
      SortedMap<Integer, E> sum = new TreeMap<>();
      w.forEach((j, factor) -> add(sum, factor, of.get(j)));
      out.add(normal(sum));
    }
    return out;
  }

  /** A proportional vector in normal form. */
  SortedMap<Integer, E> normal(SortedMap<Integer, E> x) {
    List<E> entries = domain.normal(new ArrayList<>(x.values())).entries();
    SortedMap<Integer, E> out = new TreeMap<>();
    int at = 0;
    for (Integer k : x.keySet()) {
      E e = entries.get(at++);
      if (!domain.isZero(e)) {
        out.put(k, e);
      }
    }
    return out;
  }

  /** Whether a value is 0, in normal form or not. */
  boolean vanishes(E value) {
    return domain.isZero(value) || domain.isZero(domain.normal(List.of(value)).entries().get(0));
  }

  /** An integer as an element of the ring. */
  E integer(int value) {
    E sum = domain.zero();
    E power = domain.one();
    for (int k = Math.abs(value); k > 0; k >>= 1) {
      if ((k & 1) == 1) {
        sum = domain.plus(sum, power);
      }
      power = domain.plus(power, power);
    }
    return value < 0 ? domain.negate(sum) : sum;
  }
}
