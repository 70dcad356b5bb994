package rankfall.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;
import rankfall.lie.StructureConstants;
import rankfall.lie.StructureConstants.Pair;

/**
 * The rotations of n dimensions that keep a diagonal metric g: {@code [L_ab, L_cd] = g_bc L_ad -
 * g_ac L_bd - g_bd L_ac + g_ad L_bc} (a fact of the trade).
 */
final class RotationAlgebra {
  private RotationAlgebra() {}

  /**
   * The brackets.
   *
   * @param n of so(n), at least 2
   * @return n (n - 1) / 2 generators over n variables
   */
  static StructureConstants<Polynomial> of(int n) {
    Variables variables =
        new Variables(IntStream.rangeClosed(1, n).mapToObj(k -> "g" + k).toList());
    Chain ring = Chain.free(variables);
    List<int[]> planes = new ArrayList<>();
    for (int a = 0; a < n; a++) {
      for (int b = a + 1; b < n; b++) {
        planes.add(new int[] {a, b});
      }
    }
    SortedMap<Pair, SortedMap<Integer, Polynomial>> brackets = new TreeMap<>();
    for (int i = 0; i < planes.size(); i++) {
      for (int j = i + 1; j < planes.size(); j++) {
        brackets.put(new Pair(i, j), bracket(variables, n, planes.get(i), planes.get(j)));
      }
    }
    return new StructureConstants<>(
        ring, planes.size(), brackets, ring.one(), planes.stream().map(p -> ring.one()).toList());
  }

  private static SortedMap<Integer, Polynomial> bracket(
      Variables variables, int n, int[] left, int[] right) {
    SortedMap<Integer, Polynomial> out = new TreeMap<>();
    for (int s = 0; s < 2; s++) {
      for (int t = 0; t < 2; t++) {
        int from = left[1 - s];
        int to = right[1 - t];
        if (left[s] == right[t] && from != to) {
          boolean turned = from > to;
          boolean positive = (s != t) != turned;
          Polynomial g = Polynomial.variable(variables, left[s]);
          out.put(position(n, Math.min(from, to), Math.max(from, to)), positive ? g : g.negate());
        }
      }
    }
    return out;
  }

  private static int position(int n, int a, int b) {
    return a * n - a * (a + 1) / 2 + b - a - 1;
  }
}
