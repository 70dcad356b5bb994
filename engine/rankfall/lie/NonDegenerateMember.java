package rankfall.lie;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;
import rankfall.exact.Domain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;

/**
 * A non-degenerate member of a space of symmetric matrices, simple weights preferred.
 *
 * @param weights coefficients of the basis
 * @param nonVanishing elements such that the same member is non-degenerate wherever none of them
 *     vanishes
 * @param <E> the entries
 */
public record NonDegenerateMember<E>(List<Integer> weights, List<E> nonVanishing) {
  private static final int SIMPLE = 64;
  private static final int TRIES = 40;

  /** Copies the lists. */
  public NonDegenerateMember {
    weights = List.copyOf(weights);
    nonVanishing = List.copyOf(nonVanishing);
  }

  /**
   * Searches a member: weights 0 and 1 first, as few as possible, then small random ones.
   *
   * @param domain the ring of the entries
   * @param n the number of rows, 1 or more
   * @param space matrices that span the space, n sparse rows each
   * @return empty if none was found; that proves nothing
   */
  public static <E> Optional<NonDegenerateMember<E>> of(
      Domain<E> domain, int n, List<List<SortedMap<Integer, E>>> space) {
    Random random = new Random(17L * n + space.size());
    for (int[] weights : candidates(space.size(), random)) {
      Echelon<E> e = Elimination.of(domain, member(domain, n, space, weights), n);
      if (e.rank() == n) {
        return Optional.of(
            new NonDegenerateMember<>(Arrays.stream(weights).boxed().toList(), e.nonVanishing()));
      }
    }
    return Optional.empty();
  }

  private static List<int[]> candidates(int size, Random random) {
    List<int[]> out = new ArrayList<>();
    if (size < 16) {
      IntStream.range(1, 1 << size)
          .boxed()
          .sorted((a, b) -> Integer.compare(Integer.bitCount(a), Integer.bitCount(b)))
          .limit(SIMPLE)
          .map(bits -> IntStream.range(0, size).map(k -> bits >> k & 1).toArray())
          .forEach(out::add);
    }
    for (int t = 0; t < TRIES; t++) {
      out.add(random.ints(size, 1, 9 + 8 * t).toArray());
    }
    return out;
  }

  private static <E> List<SortedMap<Integer, E>> member(
      Domain<E> domain, int n, List<List<SortedMap<Integer, E>>> space, int[] weights) {
    Vectors<E> vectors = new Vectors<>(domain);
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      SortedMap<Integer, E> row = new TreeMap<>();
      for (int k = 0; k < weights.length; k++) {
        if (weights[k] != 0) {
          vectors.add(row, vectors.integer(weights[k]), space.get(k).get(i));
        }
      }
      out.add(row);
    }
    return out;
  }
}
