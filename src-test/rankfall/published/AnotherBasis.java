package rankfall.published;

import java.math.BigInteger;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.exact.TowerPoint;
import rankfall.exact.Variables;
import rankfall.identify.ExactAlgebra;
import rankfall.lie.StructureConstants;

/** The same real algebra in a random basis, over the rationals or over the root of 2. */
final class AnotherBasis {
  private static final Variables RATIONAL = new Variables(List.of());
  private static final Variables ROOT = new Variables(List.of("r"), 1);

  private AnotherBasis() {}

  /**
   * A change of basis by elementary matrices.
   *
   * @param algebra with integer constants
   * @param irrational whether some coefficients are multiples of the root of 2
   * @param random the choice
   */
  static ExactAlgebra of(ExactAlgebra algebra, boolean irrational, Random random) {
    Variables ring = irrational ? ROOT : RATIONAL;
    int n = algebra.dimension();
    Polynomial zero = Polynomial.zero(ring);
    Polynomial[][][] c = new Polynomial[n][n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        java.util.Arrays.fill(c[i][j], zero);
        int left = i;
        int right = j;
        algebra
            .constants()
            .bracket(i, j)
            .forEach((k, v) -> c[left][right][k] = Polynomial.constant(ring, v.constantValue()));
      }
    }
    for (int step = 0; step < n + 2; step++) {
      int i = random.nextInt(n);
      int j = random.nextInt(n);
      if (i != j) {
        Polynomial factor = Polynomial.constant(ring, 1 + random.nextInt(2));
        add(c, i, j, irrational ? factor.times(Polynomial.variable(ring, 0)) : factor);
      }
    }
    Chain chain =
        irrational
            ? new Chain(ring, List.of(new Chain.Rule(0, squareMinusTwo())))
            : Chain.free(ring);
    StructureConstants<Polynomial> constants = constants(chain, c);
    if (!irrational) {
      return ExactAlgebra.real(chain, constants, p -> p.constantValue().signum());
    }
    TowerPoint point = TowerPoint.of(chain, Map.of(0, BigFraction.of(3, 2)));
    return ExactAlgebra.real(chain, constants, point::sign);
  }

  private static Polynomial squareMinusTwo() {
    return Polynomial.variable(ROOT, 0).pow(2).minus(Polynomial.constant(ROOT, 2));
  }

  /** Replaces the basis element i by itself plus a multiple of the basis element j. */
  private static void add(Polynomial[][][] c, int i, int j, Polynomial factor) {
    int n = c.length;
    for (int k = 0; k < n; k++) {
      for (int l = 0; l < n; l++) {
        c[i][k][l] = c[i][k][l].plus(factor.times(c[j][k][l]));
      }
    }
    for (int k = 0; k < n; k++) {
      for (int l = 0; l < n; l++) {
        c[k][i][l] = c[k][i][l].plus(factor.times(c[k][j][l]));
      }
    }
    for (Polynomial[][] rows : c) {
      for (Polynomial[] row : rows) {
        row[j] = row[j].minus(factor.times(row[i]));
      }
    }
  }

  private static StructureConstants<Polynomial> constants(Chain chain, Polynomial[][][] c) {
    int n = c.length;
    SortedMap<StructureConstants.Pair, SortedMap<Integer, Polynomial>> brackets = new TreeMap<>();
    for (int i = 0; i < n; i++) {
      for (int j = i + 1; j < n; j++) {
        SortedMap<Integer, Polynomial> row = new TreeMap<>();
        for (int k = 0; k < n; k++) {
          Polynomial reduced = chain.reduced(c[i][j][k]);
          if (!reduced.isZero()) {
            row.put(k, reduced);
          }
        }
        brackets.put(new StructureConstants.Pair(i, j), row);
      }
    }
    Polynomial one = Polynomial.constant(chain.variables(), BigInteger.ONE);
    return new StructureConstants<>(chain, n, brackets, one, Collections.nCopies(n, one));
  }
}
