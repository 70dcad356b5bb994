package rankfall.locus;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * Plain linear algebra over the integers modulo a prime, written apart from the program's
 * elimination.
 *
 * @param prime below 2^31
 */
record Residues(long prime) {

  long of(BigInteger n) {
    return n.mod(BigInteger.valueOf(prime)).longValue();
  }

  /**
   * A fraction.
   *
   * @throws ArithmeticException if the prime divides the denominator
   */
  long of(BigFraction q) {
    return of(q.getNumerator()) * inverse(of(q.getDenominator())) % prime;
  }

  /**
   * The inverse.
   *
   * @throws ArithmeticException for 0
   */
  long inverse(long a) {
    return BigInteger.valueOf(a).modInverse(BigInteger.valueOf(prime)).longValue();
  }

  int rank(List<long[]> rows) {
    return new Rows(this).allOf(rows);
  }

  /** Rows in echelon form that remember of which independent rows they are combinations. */
  static final class Rows {
    private final Residues field;
    private final List<long[]> reduced = new ArrayList<>();
    private final List<long[]> combinations = new ArrayList<>();
    private final List<Integer> pivots = new ArrayList<>();

    Rows(Residues field) {
      this.field = field;
    }

    int allOf(List<long[]> rows) {
      int n = 0;
      for (long[] row : rows) {
        if (add(row, rows.size())) {
          n++;
        }
      }
      return n;
    }

    /** Takes a row in if it is independent of those before; {@code most} bounds their number. */
    boolean add(long[] row, int most) {
      long[] rest = row.clone();
      long[] used = reduce(rest, most);
      int pivot = firstNonZero(rest);
      if (pivot < 0) {
        return false;
      }
      for (int k = 0; k < most; k++) {
        used[k] = (field.prime - used[k]) % field.prime;
      }
      used[reduced.size()] = 1;
      reduced.add(rest);
      combinations.add(used);
      pivots.add(pivot);
      return true;
    }

    /**
     * Coordinates in the independent rows.
     *
     * @return one a row taken in; empty if the row is not a combination of them
     */
    java.util.Optional<long[]> coordinates(long[] row) {
      long[] rest = row.clone();
      long[] used = reduce(rest, reduced.isEmpty() ? 0 : combinations.get(0).length);
      return firstNonZero(rest) < 0
          ? java.util.Optional.of(java.util.Arrays.copyOf(used, reduced.size()))
          : java.util.Optional.empty();
    }

    private long[] reduce(long[] rest, int most) {
      long[] used = new long[most];
      for (int k = 0; k < reduced.size(); k++) {
        int at = pivots.get(k);
        if (rest[at] != 0) {
          long c = rest[at] * field.inverse(reduced.get(k)[at]) % field.prime;
          subtract(rest, c, reduced.get(k));
          long[] add = combinations.get(k);
          for (int i = 0; i < most; i++) {
            used[i] = (used[i] + c * add[i]) % field.prime;
          }
        }
      }
      return used;
    }

    private void subtract(long[] row, long c, long[] other) {
      for (int i = 0; i < row.length; i++) {
        row[i] = Math.floorMod(row[i] - c * other[i] % field.prime, field.prime);
      }
    }

    private static int firstNonZero(long[] row) {
      for (int i = 0; i < row.length; i++) {
        if (row[i] != 0) {
          return i;
        }
      }
      return -1;
    }
  }
}
