package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.LongStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.exact.Chain.Rule;

class EliminationTest {
  private static final Variables RING = new Variables(List.of("a", "b", "c", "w"));

  /** c = a*b/(a + 1) and w^2 = a + 2: points by a = t^2 - 2, w = t. */
  private static final Chain TOWER =
      new Chain(
          RING,
          List.of(
              new Rule(2, Read.polynomial(RING, "(a + 1)*c - a*b")),
              new Rule(3, Read.polynomial(RING, "w^2 - a - 2"))));

  private static List<BigFraction> onTower(BigFraction t, BigFraction b) {
    BigFraction a = t.multiply(t).subtract(BigFraction.of(2));
    return List.of(a, b, a.multiply(b).divide(a.add(1)), t);
  }

  static LongStream seeds() {
    return Sample.seeds(80);
  }

  /** Rank over Q by plain elimination with fractions. */
  private static int rank(List<List<BigFraction>> rows) {
    List<List<BigFraction>> m = new ArrayList<>();
    rows.forEach(r -> m.add(new ArrayList<>(r)));
    int rank = 0;
    for (int c = 0; !m.isEmpty() && c < m.get(0).size(); c++) {
      int p = rank;
      while (p < m.size() && m.get(p).get(c).signum() == 0) {
        p++;
      }
      if (p == m.size()) {
        continue;
      }
      List<BigFraction> pivot = m.remove(p);
      m.add(rank, pivot);
      for (int i = rank + 1; i < m.size(); i++) {
        BigFraction q = m.get(i).get(c).divide(pivot.get(c));
        for (int j = c; j < pivot.size(); j++) {
          m.get(i).set(j, m.get(i).get(j).subtract(q.multiply(pivot.get(j))));
        }
      }
      rank++;
    }
    return rank;
  }

  private static List<SortedMap<Integer, Polynomial>> matrix(Sample s, int rows, int columns) {
    List<SortedMap<Integer, Polynomial>> out = new ArrayList<>();
    for (int i = 0; i < rows; i++) {
      SortedMap<Integer, Polynomial> row = new TreeMap<>();
      for (int j = 0; j < columns; j++) {
        Polynomial p = s.polynomial(RING, 2, 2, 2);
        if (!p.isZero()) {
          row.put(j, p);
        }
      }
      out.add(row);
      if (i > 0 && s.below(3) == 0) {
        Polynomial q = s.nonZero(RING, 2, 1, 2);
        SortedMap<Integer, Polynomial> multiple = new TreeMap<>();
        out.get(i - 1).forEach((k, v) -> multiple.put(k, v.times(q)));
        out.set(i, multiple);
      }
    }
    return out;
  }

  private static int rankAt(
      List<SortedMap<Integer, Polynomial>> rows, int columns, List<BigFraction> x) {
    List<List<BigFraction>> m = new ArrayList<>();
    for (SortedMap<Integer, Polynomial> r : rows) {
      List<BigFraction> row = new ArrayList<>();
      for (int j = 0; j < columns; j++) {
        row.add(r.getOrDefault(j, Polynomial.zero(RING)).at(x));
      }
      m.add(row);
    }
    return rank(m);
  }

  private static void assertAnnihilates(
      Chain chain, List<SortedMap<Integer, Polynomial>> rows, SortedMap<Integer, Polynomial> x) {
    assertFalse(x.isEmpty());
    for (SortedMap<Integer, Polynomial> r : rows) {
      Polynomial sum = Polynomial.zero(RING);
      for (var e : r.entrySet()) {
        sum = sum.plus(e.getValue().times(x.getOrDefault(e.getKey(), Polynomial.zero(RING))));
      }
      assertTrue(chain.vanishes(sum), sum.toString());
    }
  }

  private static void check(Chain chain, Sample s, boolean onTower) {
    int columns = 2 + s.below(3);
    List<SortedMap<Integer, Polynomial>> rows = matrix(s, 1 + s.below(4), columns);
    Echelon<Polynomial> e = Elimination.of(chain, rows, columns);
    List<SortedMap<Integer, Polynomial>> kernel = e.kernel();
    assertEquals(columns, e.rank() + kernel.size());
    kernel.forEach(x -> assertAnnihilates(chain, rows, x));
    int greatest = 0;
    for (int k = 0; k < 40; k++) {
      BigFraction t = k < 20 ? BigFraction.of(s.below(7) - 3) : s.fraction(9);
      if (onTower && t.abs().equals(BigFraction.ONE)) {
        continue; // an initial vanishes
      }
      List<BigFraction> x = onTower ? onTower(t, s.fraction(4)) : s.point(4, k < 20 ? 2 : 9);
      int r = rankAt(rows, columns, x);
      greatest = Math.max(greatest, r);
      assertTrue(r <= e.rank(), "rank " + r + " at " + x);
      if (e.nonVanishing().stream().allMatch(p -> p.at(x).signum() != 0)) {
        assertEquals(e.rank(), r, "rank at " + x + " off " + e.nonVanishing());
      }
    }
    assertEquals(e.rank(), greatest);
    Echelon<Polynomial> ordered = Elimination.of(chain, rows, columns, columns, true);
    assertEquals(e.rank(), ordered.rank());
    assertEquals(ordered.pivots().stream().sorted().toList(), ordered.pivots());
    ordered.kernel().forEach(x -> assertAnnihilates(chain, rows, x));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void rankAndKernelOverTheWholeSpace(long seed) {
    check(Chain.free(RING), new Sample(seed), false);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void rankAndKernelOverATower(long seed) {
    check(TOWER, new Sample(seed), true);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void rankAndKernelOverTheIntegers(long seed) {
    Sample s = new Sample(seed);
    int columns = 1 + s.below(5);
    List<SortedMap<Integer, BigInteger>> rows = new ArrayList<>();
    List<List<BigFraction>> plain = new ArrayList<>();
    for (int i = s.below(6); i > 0; i--) {
      SortedMap<Integer, BigInteger> row = new TreeMap<>();
      List<BigFraction> p = new ArrayList<>();
      for (int j = 0; j < columns; j++) {
        BigInteger v = s.below(2) == 0 ? BigInteger.ZERO : s.integer(3);
        p.add(BigFraction.of(v));
        if (v.signum() != 0) {
          row.put(j, v);
        }
      }
      rows.add(row);
      plain.add(p);
    }
    Echelon<BigInteger> e = Elimination.of(new Integers(), rows, columns);
    assertEquals(rank(plain), e.rank());
    assertEquals(List.of(), e.nonVanishing());
    assertEquals(columns - e.rank(), e.kernel().size());
    for (SortedMap<Integer, BigInteger> x : e.kernel()) {
      for (SortedMap<Integer, BigInteger> r : rows) {
        BigInteger sum = BigInteger.ZERO;
        for (var c : r.entrySet()) {
          sum = sum.add(c.getValue().multiply(x.getOrDefault(c.getKey(), BigInteger.ZERO)));
        }
        assertEquals(0, sum.signum());
      }
    }
  }

  @Test
  void pivotsConfinedToTheFirstColumnsLeaveARest() {
    SortedMap<Integer, BigInteger> first = new TreeMap<>();
    first.put(0, BigInteger.ONE);
    first.put(2, BigInteger.TWO);
    SortedMap<Integer, BigInteger> second = new TreeMap<>();
    second.put(0, BigInteger.TWO);
    second.put(2, BigInteger.ONE);
    Echelon<BigInteger> e = Elimination.of(new Integers(), List.of(first, second), 3, 2, true);
    assertEquals(List.of(0), e.pivots());
    assertEquals(1, e.rest().size());
    assertEquals(List.of(2), List.copyOf(e.rest().get(0).keySet()));
  }
}
