package rankfall.identify;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.lie.LieBracket;
import rankfall.lie.StructureConstants;

/** The same algebra in another basis, reached by steps e_i + e_j or e_i - e_j. */
final class Turned {
  private Turned() {}

  static ExactAlgebra of(ExactAlgebra g, Random random, int steps) {
    int n = g.dimension();
    List<SortedMap<Integer, Polynomial>> basis = new ArrayList<>();
    long[][] inverse = new long[n][n];
    long[][] rows = new long[n][n];
    for (int i = 0; i < n; i++) {
      rows[i][i] = 1;
      inverse[i][i] = 1;
    }
    for (int s = 0; s < steps && n > 1; s++) {
      int a = random.nextInt(n);
      int b = (a + 1 + random.nextInt(n - 1)) % n;
      long c = random.nextBoolean() ? 1 : -1;
      for (int k = 0; k < n; k++) {
        rows[a][k] += c * rows[b][k];
        inverse[k][b] -= c * inverse[k][a];
      }
    }
    Chain chain = g.chain();
    for (long[] row : rows) {
      basis.add(vector(chain, row));
    }
    LieBracket<Polynomial> bracket = LieBracket.of(g.constants());
    SortedMap<StructureConstants.Pair, SortedMap<Integer, Polynomial>> table = new TreeMap<>();
    for (int a = 0; a < n; a++) {
      for (int b = a + 1; b < n; b++) {
        table.put(
            new StructureConstants.Pair(a, b),
            coordinates(chain, bracket.of(basis.get(a), basis.get(b)), inverse));
      }
    }
    return new ExactAlgebra(
        chain,
        new StructureConstants<>(chain, n, table, chain.one(), Collections.nCopies(n, chain.one())),
        g.signs());
  }

  private static SortedMap<Integer, Polynomial> vector(Chain chain, long[] row) {
    SortedMap<Integer, Polynomial> out = new TreeMap<>();
    for (int k = 0; k < row.length; k++) {
      if (row[k] != 0) {
        out.put(k, Polynomial.constant(chain.variables(), row[k]));
      }
    }
    return out;
  }

  /** A vector by the old basis, in coordinates by the new one. */
  private static SortedMap<Integer, Polynomial> coordinates(
      Chain chain, SortedMap<Integer, Polynomial> v, long[][] inverse) {
    SortedMap<Integer, Polynomial> out = new TreeMap<>();
    for (int k = 0; k < inverse.length; k++) {
      Polynomial sum = chain.zero();
      for (var e : v.entrySet()) {
        sum =
            sum.plus(
                e.getValue().times(Polynomial.constant(chain.variables(), inverse[e.getKey()][k])));
      }
      if (!sum.isZero()) {
        out.put(k, sum);
      }
    }
    return out;
  }
}
