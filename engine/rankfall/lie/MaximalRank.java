package rankfall.lie;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;
import rankfall.exact.Elimination;

/**
 * The greatest rank in a linear space of symmetric matrices.
 *
 * <p>A combination B with small random coefficients gives a lower bound r; chance decides the way
 * only, never the result. The bound is proved by a subspace U whose images under all matrices of
 * the space together span a space W with dim U - dim W = n - r: each matrix then has a kernel of at
 * least that dimension. U is found as the limit of the second Wong sequence of B, which finds one
 * whenever any exists (Ivanyos, Karpinski, Qiao, Santha 2014, "Generalized Wong sequences and their
 * applications to Edmonds' problems"). Where none exists, the minors of order r + 1, forms of
 * degree r + 1 in the coefficients, are shown to vanish at all points with non-negative integer
 * coordinates of sum r + 1, which suffices in characteristic 0.
 *
 * @param rank the greatest rank found; some matrix of the space has it
 * @param proved whether no matrix of the space, over any larger field, has a greater rank
 */
public record MaximalRank(int rank, boolean proved) {
  private static final int TRIES = 3;
  private static final long MOST_POINTS = 200_000;

  /**
   * The greatest rank.
   *
   * @param n the number of rows
   * @param space matrices that span the space, n sparse rows each
   */
  public static <E> MaximalRank of(
      Domain<E> domain, int n, List<List<SortedMap<Integer, E>>> space) {
    if (n == 0 || space.isEmpty()) {
      return new MaximalRank(0, true);
    }
    return new Search<>(domain, n, space).run();
  }

  /** One space with what is derived from it. */
  private record Search<E>(Domain<E> domain, int n, List<List<SortedMap<Integer, E>>> space) {
    MaximalRank run() {
      List<SortedMap<Integer, E>> best = List.of();
      int rank = -1;
      Random random = new Random(31L * n + space.size());
      for (int t = 0; t < TRIES && rank < n; t++) {
        int spread = 8 << (4 * t);
        int[] weights = random.ints(space.size(), 1, 1 + spread).toArray();
        List<SortedMap<Integer, E>> b = member(weights);
        int r = rank(b);
        if (r > rank) {
          rank = r;
          best = b;
        }
        if (rank == n || isProved(best, rank)) {
          return new MaximalRank(rank, true);
        }
      }
      return exhaust(rank);
    }

    private MaximalRank exhaust(int found) {
      int rank = found;
      while (points(rank + 1) <= MOST_POINTS) {
        Optional<List<SortedMap<Integer, E>>> better = betterPoint(rank);
        if (better.isEmpty()) {
          return new MaximalRank(rank, true);
        }
        rank = rank(better.get());
        if (rank == n || isProved(better.get(), rank)) {
          return new MaximalRank(rank, true);
        }
      }
      return new MaximalRank(rank, false);
    }

    /** The number of points with non-negative coordinates of a given sum, or more than allowed. */
    private long points(int sum) {
      long out = 1;
      for (int k = 1; k < space.size() && out <= MOST_POINTS; k++) {
        out = out * (sum + k) / k;
      }
      return out;
    }

    private Optional<List<SortedMap<Integer, E>>> betterPoint(int rank) {
      int[] weights = new int[space.size()];
      weights[0] = rank + 1;
      while (true) {
        List<SortedMap<Integer, E>> b = member(weights);
        if (rank(b) > rank) {
          return Optional.of(b);
        }
        if (!advance(weights)) {
          return Optional.empty();
        }
      }
    }

    /** The next point of the same sum in reverse lexicographic order. */
    private static boolean advance(int[] weights) {
      int last = weights.length - 1;
      int tail = weights[last];
      weights[last] = 0;
      int k = last - 1;
      while (k >= 0 && weights[k] == 0) {
        k--;
      }
      if (k < 0) {
        weights[last] = tail;
        return false;
      }
      weights[k]--;
      weights[k + 1] = tail + 1;
      return true;
    }

    private List<SortedMap<Integer, E>> member(int[] weights) {
      Vectors<E> vectors = new Vectors<>(domain);
      List<E> factors = Arrays.stream(weights).mapToObj(vectors::integer).toList();
      List<SortedMap<Integer, E>> out = new ArrayList<>();
      for (int i = 0; i < n; i++) {
        SortedMap<Integer, E> row = new TreeMap<>();
        for (int k = 0; k < weights.length; k++) {
          if (weights[k] != 0) {
            vectors.add(row, factors.get(k), space.get(k).get(i));
          }
        }
        out.add(row);
      }
      return out;
    }

    private int rank(List<SortedMap<Integer, E>> b) {
      return Elimination.of(domain, b, n).rank();
    }

    /** Whether the second Wong sequence of b ends in a subspace that proves the bound. */
    private boolean isProved(List<SortedMap<Integer, E>> b, int rank) {
      Subspace<E> u = Subspace.kernel(domain, n, b);
      while (true) {
        Subspace<E> w = images(u);
        if (u.dimension() - w.dimension() >= n - rank) {
          return true;
        }
        Subspace<E> next = preimage(b, w);
        if (next.dimension() == u.dimension()) {
          return false;
        }
        u = next;
      }
    }

    private Subspace<E> images(Subspace<E> u) {
      List<SortedMap<Integer, E>> out = new ArrayList<>();
      for (List<SortedMap<Integer, E>> matrix : space) {
        u.basis().forEach(x -> out.add(image(x, matrix)));
      }
      return Subspace.span(domain, n, out);
    }

    /** The x with b x in w. */
    private Subspace<E> preimage(List<SortedMap<Integer, E>> b, Subspace<E> w) {
      return Subspace.kernel(
          domain,
          n,
          Subspace.kernel(domain, n, w.basis()).basis().stream().map(y -> image(y, b)).toList());
    }

    /** The product of a symmetric matrix and a vector. */
    private SortedMap<Integer, E> image(
        SortedMap<Integer, E> x, List<SortedMap<Integer, E>> matrix) {
      Vectors<E> vectors = new Vectors<>(domain);
      SortedMap<Integer, E> out = new TreeMap<>();
      x.forEach((i, v) -> vectors.add(out, v, matrix.get(i)));
      return out;
    }
  }
}
