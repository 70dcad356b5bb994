package rankfall.identify;

import java.util.Arrays;

/**
 * Linear algebra modulo a prime below 2^31, on rows of residues 0 .. p - 1.
 *
 * @param prime the characteristic
 */
record PrimeField(long prime) {
  /** The residue of an integer. */
  long of(long value) {
    return Math.floorMod(value, prime);
  }

  long times(long a, long b) {
    return a * b % prime;
  }

  long plus(long a, long b) {
    long s = a + b;
    return s >= prime ? s - prime : s;
  }

  long minus(long a, long b) {
    return a >= b ? a - b : a - b + prime;
  }

  /** The power with an exponent of 0 or more. */
  long power(long a, long exponent) {
    long out = 1;
    long square = a;
    for (long e = exponent; e > 0; e >>= 1) {
      out = (e & 1) == 1 ? times(out, square) : out;
      square = times(square, square);
    }
    return out;
  }

  /** The inverse of a residue that is not 0 (Fermat). */
  long inverse(long a) {
    return power(a, prime - 2);
  }

  /** The product of a row and a matrix. */
  long[] times(long[] row, long[][] matrix) {
    long[] out = new long[matrix[0].length];
    for (int i = 0; i < row.length; i++) {
      if (row[i] != 0) {
        add(out, row[i], matrix[i], 0);
      }
    }
    return out;
  }

  /** The product of square matrices. */
  long[][] times(long[][] a, long[][] b) {
    return Arrays.stream(a).map(row -> times(row, b)).toArray(long[][]::new);
  }

  /** Adds a multiple of a row to a row, which is changed, from a column on. */
  private void add(long[] sum, long factor, long[] row, int from) {
    for (int j = from; j < row.length; j++) {
      if (row[j] != 0) {
        sum[j] = (sum[j] + factor * row[j]) % prime;
      }
    }
  }

  /**
   * Brings rows to reduced echelon form in place.
   *
   * @param columns pivots stand in columns below this one
   * @return the pivot columns, ascending; row k has pivot 1 in column k of them
   */
  int[] reduce(long[][] rows, int columns) {
    int[] pivots = new int[Math.min(rows.length, columns)];
    int rank = 0;
    for (int c = 0; c < columns && rank < rows.length; c++) {
      int at = rank;
      while (at < rows.length && rows[at][c] == 0) {
        at++;
      }
      if (at == rows.length) {
        continue;
      }
      long[] pivot = rows[at];
      rows[at] = rows[rank];
      rows[rank] = pivot;
      long inverse = inverse(pivot[c]);
      for (int j = c; j < pivot.length; j++) {
        pivot[j] = times(pivot[j], inverse);
      }
      for (int i = 0; i < rows.length; i++) {
        if (i != rank && rows[i][c] != 0) {
          add(rows[i], prime - rows[i][c], pivot, c);
        }
      }
      pivots[rank++] = c;
    }
    return Arrays.copyOf(pivots, rank);
  }

  /** The rank; the rows are not changed. */
  int rank(long[][] rows) {
    return rows.length == 0 ? 0 : reduce(copy(rows), rows[0].length).length;
  }

  private static long[][] copy(long[][] rows) {
    return Arrays.stream(rows).map(long[]::clone).toArray(long[][]::new);
  }

  /** A basis of the columns x with (matrix) x = 0. */
  long[][] kernel(long[][] matrix) {
    long[][] rows = copy(matrix);
    int n = matrix[0].length;
    int[] pivots = reduce(rows, n);
    long[][] out = new long[n - pivots.length][n];
    int at = 0;
    for (int c = 0; c < n; c++) {
      if (Arrays.binarySearch(pivots, c) < 0) {
        out[at][c] = 1;
        for (int k = 0; k < pivots.length; k++) {
          out[at][pivots[k]] = of(-rows[k][c]);
        }
        at++;
      }
    }
    return out;
  }

  /**
   * The inverse of a square matrix.
   *
   * @return empty rows if there is none
   */
  long[][] inverse(long[][] matrix) {
    int n = matrix.length;
    long[][] rows = new long[n][2 * n];
    for (int i = 0; i < n; i++) {
      System.arraycopy(matrix[i], 0, rows[i], 0, n);
      rows[i][n + i] = 1;
    }
    if (reduce(rows, n).length < n) {
      return new long[0][];
    }
    return Arrays.stream(rows).map(r -> Arrays.copyOfRange(r, n, 2 * n)).toArray(long[][]::new);
  }
}
