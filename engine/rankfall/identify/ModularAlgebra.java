package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.Random;
import rankfall.exact.Polynomial;
import rankfall.lie.StructureConstants;

/**
 * The image of an algebra under a {@link ResidueMap}. Bounds and refutations that are found here
 * hold for the algebra itself.
 */
final class ModularAlgebra {
  private final PrimeField field;
  private final int n;
  private final List<Entry> entries;

  /** {@code [e_left, e_right]} holds {@code value * e_target}; left before right. */
  private record Entry(int left, int right, int target, long value) {}

  private ModularAlgebra(PrimeField field, int n, List<Entry> entries) {
    this.field = field;
    this.n = n;
    this.entries = List.copyOf(entries);
  }

  /** The algebra of the constants C. */
  static ModularAlgebra of(StructureConstants<Polynomial> constants, ResidueMap map) {
    List<Entry> entries = new ArrayList<>();
    constants
        .brackets()
        .forEach(
            (pair, row) ->
                row.forEach(
                    (k, c) -> {
                      long value = map.of(c);
                      if (value != 0) {
                        entries.add(new Entry(pair.left(), pair.right(), k, value));
                      }
                    }));
    return new ModularAlgebra(map.field(), constants.dimension(), entries);
  }

  int dimension() {
    return n;
  }

  PrimeField field() {
    return field;
  }

  /** An element with random coordinates. */
  long[] element(Random random) {
    return random.longs(n, 0, field.prime()).toArray();
  }

  /** The bracket of two elements. */
  long[] bracket(long[] x, long[] y) {
    long[] out = new long[n];
    for (Entry e : entries) {
      long minor =
          field.minus(field.times(x[e.left], y[e.right]), field.times(x[e.right], y[e.left]));
      if (minor != 0) {
        out[e.target] = field.plus(out[e.target], field.times(minor, e.value));
      }
    }
    return out;
  }

  /** The matrix of ad x: column j holds the coordinates of [x, e_j]. */
  private long[][] adjoint(long[] x) {
    long[][] out = new long[n][n];
    for (Entry e : entries) {
      out[e.target][e.right] = field.plus(out[e.target][e.right], field.times(x[e.left], e.value));
      out[e.target][e.left] = field.minus(out[e.target][e.left], field.times(x[e.right], e.value));
    }
    return out;
  }

  /** The dimension of the centraliser of x; not less than the rank of a semisimple algebra. */
  int centraliser(long[] x) {
    return n - field.rank(adjoint(x));
  }

  /**
   * A bound on the dimension of the centroid, the matrices that commute with ad.
   *
   * <p>If x generates the algebra as an ideal, a matrix phi of the centroid is determined by
   * phi(x), which commutes with x: phi of a word [..[x,u],..v] is the same word with phi(x) for x.
   * Some of the linear conditions on phi(x) bound the dimension of all solutions from above.
   *
   * @return empty if the random words do not span the algebra
   */
  OptionalInt centroidBound(Random random) {
    long[] x = element(random);
    long[][] candidates = field.kernel(adjoint(x));
    long[][] letters = new long[n][];
    for (int k = 0; k < n; k++) {
      letters[k] = element(random);
    }
    long[][] inverse = field.inverse(words(x, letters));
    if (inverse.length == 0) {
      return OptionalInt.empty();
    }
    long[] y = element(random);
    long[] u = element(random);
    long[] left = field.times(bracket(y, u), inverse);
    long[] right = field.times(y, inverse);
    long[][] conditions = new long[candidates.length][];
    for (int a = 0; a < candidates.length; a++) {
      long[][] image = words(candidates[a], letters);
      long[] difference = field.times(left, image);
      long[] other = bracket(field.times(right, image), u);
      for (int i = 0; i < n; i++) {
        difference[i] = field.minus(difference[i], other[i]);
      }
      conditions[a] = difference;
    }
    return OptionalInt.of(candidates.length - field.rank(conditions));
  }

  private long[][] words(long[] x, long[][] letters) {
    long[][] out = new long[n][];
    out[0] = x;
    for (int k = 1; k < n; k++) {
      out[k] = bracket(out[k - 1], letters[k]);
    }
    return out;
  }

  /**
   * The traces of even powers of ad x.
   *
   * @return {@code tr((ad x)^2), tr((ad x)^4), ...}, as many as asked for
   */
  long[] evenTraces(long[] x, int count) {
    long[][] square = field.times(adjoint(x), adjoint(x));
    long[][] power = square;
    long[] out = new long[count];
    for (int k = 0; k < count; k++) {
      for (int i = 0; i < n; i++) {
        out[k] = field.plus(out[k], power[i][i]);
      }
      power = k + 1 < count ? field.times(power, square) : power;
    }
    return out;
  }
}
