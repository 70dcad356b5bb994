package rankfall.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import rankfall.exact.Integers;

class MaximalRankTest {
  private static MaximalRank of(int n, List<List<SortedMap<Integer, BigInteger>>> space) {
    return MaximalRank.of(new Integers(), n, space);
  }

  /** Entries {@code row column value} of the upper triangle. */
  private static List<SortedMap<Integer, BigInteger>> symmetric(int n, int... entries) {
    List<SortedMap<Integer, BigInteger>> out = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      out.add(new TreeMap<>());
    }
    for (int at = 0; at < entries.length; at += 3) {
      BigInteger v = BigInteger.valueOf(entries[at + 2]);
      out.get(entries[at]).put(entries[at + 1], v);
      out.get(entries[at + 1]).put(entries[at], v);
    }
    return out;
  }

  @Test
  void emptySpaceAndDimensionZeroHaveRankZero() {
    assertEquals(new MaximalRank(0, true), of(3, List.of()));
    assertEquals(new MaximalRank(0, true), of(0, List.of()));
  }

  /** Two matrices of rank 1 whose sum has rank 2. */
  @Test
  void sumMayHaveGreaterRankThanTheBasis() {
    assertEquals(
        new MaximalRank(2, true), of(2, List.of(symmetric(2, 0, 0, 1), symmetric(2, 1, 1, -1))));
  }

  /** Last row and column are common zeros. */
  @Test
  void commonKernelBoundsTheRank() {
    assertEquals(
        new MaximalRank(2, true), of(3, List.of(symmetric(3, 0, 1, 1), symmetric(3, 0, 0, 1))));
  }

  /** No common kernel, yet a 2 x 2 block of zeros: determinant 0 throughout. */
  @Test
  void zeroBlockBoundsTheRankWithoutCommonKernel() {
    assertEquals(
        new MaximalRank(2, true), of(3, List.of(symmetric(3, 0, 1, 1), symmetric(3, 0, 2, 1))));
  }

  /**
   * Blocks of the general skew 3 x 3 matrix, which is singular though no subspace shows it (known
   * from Lovasz 1989, "Singular spaces of matrices and their application in combinatorics"): rank
   * 4.
   */
  @Test
  void skewBlocksAreProvedByExhaustion() {
    List<List<SortedMap<Integer, BigInteger>>> space =
        List.of(
            symmetric(6, 0, 4, 1, 1, 3, -1),
            symmetric(6, 0, 5, 1, 2, 3, -1),
            symmetric(6, 1, 5, 1, 2, 4, -1));
    assertEquals(new MaximalRank(4, true), of(6, space));
  }

  /** The same in so many blocks that the points are too many: the answer says it is not proved. */
  @Test
  void tooLargeASpaceIsNotCalledProved() {
    int copies = 6;
    List<List<SortedMap<Integer, BigInteger>>> space = new ArrayList<>();
    for (int c = 0; c < copies; c++) {
      int o = 6 * c;
      for (int[] e :
          List.of(new int[] {0, 4, 1, 3}, new int[] {0, 5, 2, 3}, new int[] {1, 5, 2, 4})) {
        int[] entries = {o + e[0], o + e[1], 1, o + e[2], o + e[3], -1};
        space.add(symmetric(6 * copies, entries));
      }
    }
    assertEquals(new MaximalRank(4 * copies, false), of(6 * copies, space));
  }

  /** Every combination of small coefficients, by plain enumeration, over a few random spaces. */
  @Test
  void noSmallCombinationHasGreaterRank() {
    java.util.Random random = new java.util.Random(4);
    for (int t = 0; t < 30; t++) {
      List<List<SortedMap<Integer, BigInteger>>> space = new ArrayList<>();
      for (int k = 0; k < 2; k++) {
        int[] entries = new int[9];
        for (int e = 0; e < 9; e += 3) {
          entries[e] = random.nextInt(4);
          entries[e + 1] = random.nextInt(4);
          entries[e + 2] = 1 + random.nextInt(3);
        }
        space.add(symmetric(4, entries));
      }
      int best = 0;
      for (int a = -5; a <= 5; a++) {
        for (int b = -5; b <= 5; b++) {
          best = Math.max(best, rank(a, space.get(0), b, space.get(1)));
        }
      }
      assertEquals(new MaximalRank(best, true), of(4, space), space.toString());
    }
  }

  private static int rank(
      int a,
      List<SortedMap<Integer, BigInteger>> x,
      int b,
      List<SortedMap<Integer, BigInteger>> y) {
    Vectors<BigInteger> v = new Vectors<>(new Integers());
    List<SortedMap<Integer, BigInteger>> rows = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      SortedMap<Integer, BigInteger> row = new TreeMap<>();
      v.add(row, BigInteger.valueOf(a), x.get(i));
      v.add(row, BigInteger.valueOf(b), y.get(i));
      rows.add(row);
    }
    return Subspace.span(new Integers(), 4, rows).dimension();
  }

  @Test
  void integersOfTheRingAreSums() {
    Vectors<BigInteger> v = new Vectors<>(new Integers());
    for (int k : Arrays.asList(-9, -1, 0, 1, 2, 13)) {
      assertEquals(BigInteger.valueOf(k), v.integer(k));
    }
  }
}
