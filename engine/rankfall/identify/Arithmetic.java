package rankfall.identify;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;

/**
 * Arithmetic in a ring whose elements need not be in normal form.
 *
 * @param domain the ring
 * @param <E> the elements
 */
record Arithmetic<E>(Domain<E> domain) {
  E minus(E a, E b) {
    return domain.plus(a, domain.negate(b));
  }

  E square(E a) {
    return domain.times(a, a);
  }

  /** An integer multiple. */
  E times(int k, E a) {
    E sum = domain.zero();
    E power = a;
    for (int rest = Math.abs(k); rest > 0; rest >>= 1) {
      if ((rest & 1) == 1) {
        sum = domain.plus(sum, power);
      }
      power = domain.plus(power, power);
    }
    return k < 0 ? domain.negate(sum) : sum;
  }

  E product(List<E> factors) {
    return factors.stream().reduce(domain.one(), domain::times);
  }

  E sum(List<E> terms) {
    return terms.stream().reduce(domain.zero(), domain::plus);
  }

  /** Whether an element is 0. */
  boolean vanishes(E a) {
    return domain.isZero(domain.normal(List.of(a)).entries().get(0));
  }

  /** The square matrix with 1 on the diagonal. */
  List<List<E>> unit(int size) {
    List<List<E>> out = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      List<E> row = new ArrayList<>();
      for (int j = 0; j < size; j++) {
        row.add(i == j ? domain.one() : domain.zero());
      }
      out.add(row);
    }
    return out;
  }

  /** The square matrix of zeros. */
  List<List<E>> zero(int size) {
    return Collections.nCopies(size, Collections.nCopies(size, domain.zero()));
  }

  /** The product of two square matrices. */
  List<List<E>> product(List<List<E>> a, List<List<E>> b) {
    List<List<E>> out = new ArrayList<>();
    for (int i = 0; i < a.size(); i++) {
      List<E> row = new ArrayList<>();
      for (int j = 0; j < a.size(); j++) {
        E sum = domain.zero();
        for (int k = 0; k < a.size(); k++) {
          sum = domain.plus(sum, domain.times(a.get(i).get(k), b.get(k).get(j)));
        }
        row.add(sum);
      }
      out.add(row);
    }
    return out;
  }

  /** The sum of two matrices, the first multiplied. */
  List<List<E>> combination(E factor, List<List<E>> a, List<List<E>> b) {
    List<List<E>> out = new ArrayList<>();
    for (int i = 0; i < a.size(); i++) {
      List<E> row = new ArrayList<>();
      for (int j = 0; j < a.size(); j++) {
        row.add(domain.plus(domain.times(factor, a.get(i).get(j)), b.get(i).get(j)));
      }
      out.add(row);
    }
    return out;
  }

  E trace(List<List<E>> a) {
    E sum = domain.zero();
    for (int i = 0; i < a.size(); i++) {
      sum = domain.plus(sum, a.get(i).get(i));
    }
    return sum;
  }

  /** The entries of a matrix, row after row, as one sparse vector. */
  SortedMap<Integer, E> flat(List<List<E>> a) {
    SortedMap<Integer, E> out = new TreeMap<>();
    for (int i = 0; i < a.size(); i++) {
      for (int j = 0; j < a.size(); j++) {
        out.put(i * a.size() + j, a.get(i).get(j));
      }
    }
    return out;
  }
}
