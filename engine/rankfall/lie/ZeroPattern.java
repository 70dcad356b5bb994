package rankfall.lie;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.TreeSet;
import java.util.function.BiPredicate;

/**
 * The blocks into which a symmetric matrix falls: the connected components of its non-zero pattern.
 */
final class ZeroPattern {
  private ZeroPattern() {}

  /**
   * The blocks.
   *
   * @param n the number of rows
   * @param mayBeNonZero asked for row below column only
   * @return positions from 0, ascending within a block; blocks by their first position
   */
  static List<List<Integer>> blocks(int n, BiPredicate<Integer, Integer> mayBeNonZero) {
    boolean[] seen = new boolean[n];
    List<List<Integer>> out = new ArrayList<>();
    for (int start = 0; start < n; start++) {
      if (!seen[start]) {
        out.add(component(start, seen, mayBeNonZero));
      }
    }
    return out;
  }

  private static List<Integer> component(
      int start, boolean[] seen, BiPredicate<Integer, Integer> mayBeNonZero) {
    TreeSet<Integer> block = new TreeSet<>();
    Deque<Integer> queue = new ArrayDeque<>(List.of(start));
    seen[start] = true;
    while (!queue.isEmpty()) {
      int i = queue.remove();
      block.add(i);
      for (int j = 0; j < seen.length; j++) {
        if (!seen[j] && mayBeNonZero.test(Math.min(i, j), Math.max(i, j))) {
          seen[j] = true;
          queue.add(j);
        }
      }
    }
    return List.copyOf(block);
  }

  /** The rows and columns of a matrix that a block names. */
  static <T> List<List<T>> part(List<List<T>> matrix, List<Integer> block) {
    return block.stream().map(i -> block.stream().map(j -> matrix.get(i).get(j)).toList()).toList();
  }
}
