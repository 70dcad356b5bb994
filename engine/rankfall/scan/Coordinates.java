package rankfall.scan;

import java.math.BigInteger;

/**
 * Where signs are asked: integers with their powers, as doubles, as longs and, once they are asked
 * for, as big integers. One thread at a time.
 */
final class Coordinates {
  private final double[][] doubles;
  private final long[][] longs;
  private final BigInteger[][] bigs;
  private final boolean[] bigKnown;
  private long line;
  private long inner;

  /**
   * No point yet.
   *
   * @param degrees the greatest power of each coordinate that is asked for
   */
  Coordinates(int[] degrees) {
    doubles = new double[degrees.length][];
    longs = new long[degrees.length][];
    bigs = new BigInteger[degrees.length][];
    bigKnown = new boolean[degrees.length];
    for (int v = 0; v < degrees.length; v++) {
      doubles[v] = new double[degrees[v] + 1];
      longs[v] = new long[degrees[v] + 1];
      bigs[v] = new BigInteger[degrees[v] + 1];
    }
  }

  /** Begins another line: all that was known of the one before is void. */
  void nextLine() {
    line++;
  }

  /** A number that changes from line to line. */
  long line() {
    return line;
  }

  /** Sets a coordinate that stays on the line. */
  void set(int v, long n) {
    fill(doubles[v], n);
    long power = 1;
    for (int e = 0; e < longs[v].length; e++) {
      longs[v][e] = power;
      power *= n; // wraps only in powers that no polynomial in longs uses
    }
    bigKnown[v] = false;
  }

  /** Sets a coordinate that stays on the line and may be long; not for polynomials in longs. */
  void set(int v, BigInteger n) {
    fill(doubles[v], n.doubleValue());
    fillBig(v, n);
  }

  private static void fill(double[] powers, double x) {
    double power = 1;
    for (int e = 0; e < powers.length; e++) {
      powers[e] = power;
      power *= x;
    }
  }

  private void fillBig(int v, BigInteger n) {
    BigInteger power = BigInteger.ONE;
    for (int e = 0; e < bigs[v].length; e++) {
      bigs[v][e] = power;
      power = power.multiply(n);
    }
    bigKnown[v] = true;
  }

  /** Sets the coordinate along the line. */
  void setInner(long n) {
    inner = n;
  }

  /** The coordinate along the line. */
  long inner() {
    return inner;
  }

  double power(int v, int e) {
    return doubles[v][e];
  }

  long longPower(int v, int e) {
    return longs[v][e];
  }

  BigInteger bigPower(int v, int e) {
    if (!bigKnown[v]) {
      fillBig(v, BigInteger.valueOf(longs[v].length > 1 ? longs[v][1] : 0));
    }
    return bigs[v][e];
  }
}
