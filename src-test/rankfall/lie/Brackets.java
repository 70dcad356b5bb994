package rankfall.lie;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Function;
import rankfall.exact.Domain;
import rankfall.exact.Integers;

/** Integer structure constants written as text: {@code "1 2 3"} is [e1, e2] = e3. */
record Brackets(int dimension, SortedMap<StructureConstants.Pair, SortedMap<Integer, Long>> table) {

  /** Lines {@code left right target [coefficient]}, separated by commas; positions from 1. */
  static Brackets of(int dimension, String text) {
    Brackets out = new Brackets(dimension, new TreeMap<>());
    if (!text.isBlank()) {
      Arrays.stream(text.split(",")).forEach(line -> out.put(line.trim().split("\\s+")));
    }
    return out;
  }

  private void put(String[] w) {
    int i = Integer.parseInt(w[0]) - 1;
    int j = Integer.parseInt(w[1]) - 1;
    long c = w.length > 3 ? Long.parseLong(w[3]) : 1;
    add(i, j, Integer.parseInt(w[2]) - 1, c);
  }

  private void add(int i, int j, int k, long c) {
    SortedMap<Integer, Long> row =
        table.computeIfAbsent(
            new StructureConstants.Pair(Math.min(i, j), Math.max(i, j)), p -> new TreeMap<>());
    row.merge(k, i < j ? c : -c, Long::sum);
    row.values().removeIf(v -> v == 0);
  }

  /** The algebra spanned by square integer matrices, which must be independent and closed. */
  static Brackets ofMatrices(List<long[][]> matrices) {
    int n = matrices.size();
    int size = matrices.get(0).length;
    Brackets out = new Brackets(n, new TreeMap<>());
    for (int i = 0; i < n; i++) {
      for (int j = i + 1; j < n; j++) {
        long[][] a = matrices.get(i);
        long[][] b = matrices.get(j);
        List<SortedMap<Integer, BigInteger>> rows = new ArrayList<>();
        for (int r = 0; r < size; r++) {
          for (int c = 0; c < size; c++) {
            long sum = 0;
            for (int k = 0; k < size; k++) {
              sum += a[r][k] * b[k][c] - b[r][k] * a[k][c];
            }
            SortedMap<Integer, BigInteger> row = new TreeMap<>();
            for (int m = 0; m < n; m++) {
              if (matrices.get(m)[r][c] != 0) {
                row.put(m, BigInteger.valueOf(matrices.get(m)[r][c]));
              }
            }
            if (sum != 0) {
              row.put(n, BigInteger.valueOf(-sum));
            }
            rows.add(row);
          }
        }
        SortedMap<Integer, BigInteger> solution =
            Subspace.kernel(new Integers(), n + 1, rows).basis().get(0);
        BigInteger last = solution.get(n);
        for (var e : solution.entrySet()) {
          if (e.getKey() < n) {
            out.add(i, j, e.getKey(), e.getValue().divide(last).longValueExact());
          }
        }
      }
    }
    return out;
  }

  /** The direct sum. */
  Brackets plus(Brackets b) {
    Brackets out = new Brackets(dimension + b.dimension, new TreeMap<>());
    table.forEach((p, row) -> row.forEach((k, c) -> out.add(p.left(), p.right(), k, c)));
    int n = dimension;
    b.table.forEach(
        (p, row) -> row.forEach((k, c) -> out.add(p.left() + n, p.right() + n, k + n, c)));
    return out;
  }

  /** The same algebra in a basis reached by random steps f_i = e_i + c e_j. */
  Brackets inRandomBasis(long seed, int steps) {
    Brackets out = this;
    Random random = new Random(seed);
    for (int s = 0; s < steps && dimension > 1; s++) {
      int i = random.nextInt(dimension);
      int j = (i + 1 + random.nextInt(dimension - 1)) % dimension;
      out = out.sheared(i, j, random.nextBoolean() ? 1 : -1);
    }
    return out;
  }

  /** New basis with f_i = e_i + c e_j, the others unchanged; coordinates: x_j falls by c x_i. */
  private Brackets sheared(int i, int j, long c) {
    Brackets out = new Brackets(dimension, new TreeMap<>());
    for (int a = 0; a < dimension; a++) {
      for (int b = a + 1; b < dimension; b++) {
        long[] v = new long[dimension];
        accumulate(v, a, b, 1);
        if (a == i) {
          accumulate(v, j, b, c);
        }
        if (b == i) {
          accumulate(v, a, j, c);
        }
        v[j] -= c * v[i];
        for (int k = 0; k < dimension; k++) {
          if (v[k] != 0) {
            out.add(a, b, k, v[k]);
          }
        }
      }
    }
    return out;
  }

  private void accumulate(long[] v, int a, int b, long factor) {
    if (a != b) {
      table
          .getOrDefault(
              new StructureConstants.Pair(Math.min(a, b), Math.max(a, b)),
              Collections.emptySortedMap())
          .forEach((k, c) -> v[k] += factor * (a < b ? c : -c));
    }
  }

  <E> StructureConstants<E> over(Domain<E> domain, Function<Long, E> number) {
    SortedMap<StructureConstants.Pair, SortedMap<Integer, E>> out = new TreeMap<>();
    table.forEach(
        (p, row) -> {
          SortedMap<Integer, E> to = new TreeMap<>();
          row.forEach((k, c) -> to.put(k, number.apply(c)));
          out.put(p, to);
        });
    return new StructureConstants<>(
        domain, dimension, out, domain.one(), Collections.nCopies(dimension, domain.one()));
  }

  StructureConstants<BigInteger> overIntegers() {
    return over(new Integers(), BigInteger::valueOf);
  }

  StructureConstants<Long> modulo(long prime) {
    PrimeField field = new PrimeField(prime);
    return over(field, field::of);
  }

  PointFacts facts() {
    return PointAnalysis.of(
        overIntegers(), dimension, new RationalNumbers(), new RationalNumbers());
  }
}
