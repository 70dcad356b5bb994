package rankfall.identify;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * The irreducible modules of a simple complex Lie algebra by their highest weights.
 *
 * <p>A weight is written in the fundamental weights, numbered as the simple roots of {@link
 * SimpleType#cartanMatrix}.
 *
 * @param type the algebra
 * @param positive the positive roots in the simple roots
 * @param halfSquares (alpha_i, alpha_i)/2 of the simple roots, short ones 1
 */
record Weights(SimpleType type, List<List<Integer>> positive, List<Integer> halfSquares) {
  Weights {
    positive = positive.stream().map(List::copyOf).toList();
    halfSquares = List.copyOf(halfSquares);
  }

  /** The weights of a type. */
  static Weights of(SimpleType type) {
    List<List<Integer>> a = type.cartanMatrix();
    return new Weights(type, positiveRoots(a), halfSquares(a));
  }

  /**
   * All positive roots, as orbits of the simple ones under reflections (Humphreys, Introduction to
   * Lie Algebras, section 10.2, lemma B, and theorem 10.3 (c)).
   *
   * @param cartan a Cartan matrix {@code <alpha_i, alpha_j>}
   */
  static List<List<Integer>> positiveRoots(List<List<Integer>> cartan) {
    int n = cartan.size();
    Set<List<Integer>> found = new LinkedHashSet<>();
    List<List<Integer>> open = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      List<Integer> simple = new ArrayList<>(Collections.nCopies(n, 0));
      simple.set(i, 1);
      open.add(List.copyOf(simple));
    }
    while (!open.isEmpty()) {
      List<Integer> root = open.remove(open.size() - 1);
      if (found.add(root)) {
        for (int j = 0; j < n; j++) {
          int pairing = 0;
          for (int i = 0; i < n; i++) {
            pairing += root.get(i) * cartan.get(i).get(j);
          }
          List<Integer> image = new ArrayList<>(root);
          image.set(j, image.get(j) - pairing);
          if (image.stream().allMatch(c -> c >= 0)) {
            open.add(List.copyOf(image));
          }
        }
      }
    }
    return List.copyOf(found);
  }

  private static List<Integer> halfSquares(List<List<Integer>> cartan) {
    int n = cartan.size();
    BigFraction[] d = new BigFraction[n];
    d[0] = BigFraction.ONE;
    for (int round = 0; round < n; round++) {
      for (int i = 0; i < n; i++) {
        for (int j = 0; j < n; j++) {
          if (d[i] != null && d[j] == null && cartan.get(i).get(j) != 0) {
            d[j] = d[i].multiply(BigFraction.of(cartan.get(j).get(i), cartan.get(i).get(j)));
          }
        }
      }
    }
    BigFraction least = d[0];
    for (BigFraction x : d) {
      least = x.subtract(least).signum() < 0 ? x : least;
    }
    BigFraction unit = least;
    return java.util.Arrays.stream(d).map(x -> x.divide(unit).intValue()).toList();
  }

  /** (lambda, alpha), alpha in the simple roots. */
  private long pairing(List<Integer> weight, List<Integer> root) {
    long sum = 0;
    for (int i = 0; i < root.size(); i++) {
      sum += (long) weight.get(i) * root.get(i) * halfSquares.get(i);
    }
    return sum;
  }

  private List<Integer> rho() {
    return Collections.nCopies(type.rank(), 1);
  }

  private static List<Integer> sum(List<Integer> a, List<Integer> b) {
    return IntStream.range(0, a.size()).mapToObj(i -> a.get(i) + b.get(i)).toList();
  }

  /** The dimension of a module (Weyl's formula; Humphreys, section 24.3). */
  int dimension(List<Integer> weight) {
    BigFraction product = BigFraction.ONE;
    List<Integer> shifted = sum(weight, rho());
    for (List<Integer> root : positive) {
      product =
          product.multiply(
              BigFraction.of(
                  java.math.BigInteger.valueOf(pairing(shifted, root)),
                  java.math.BigInteger.valueOf(pairing(rho(), root))));
    }
    return product.intValue();
  }

  /**
   * The value of the Casimir element of the Killing form, 1 on the adjoint module: (lambda, lambda
   * + 2 rho) over the same for the highest root (Humphreys, section 6.2 and exercise 23.4).
   */
  BigFraction casimir(List<Integer> weight) {
    return square(weight).divide(square(highestRoot()));
  }

  /** (lambda, lambda + 2 rho). */
  private BigFraction square(List<Integer> weight) {
    List<BigFraction> inRoots = inSimpleRoots(weight);
    List<Integer> other = sum(weight, sum(rho(), rho()));
    BigFraction out = BigFraction.ZERO;
    for (int i = 0; i < weight.size(); i++) {
      out = out.add(inRoots.get(i).multiply(other.get(i) * halfSquares.get(i)));
    }
    return out;
  }

  /** The highest root in the fundamental weights. */
  private List<Integer> highestRoot() {
    List<List<Integer>> a = type.cartanMatrix();
    List<Integer> top =
        positive.stream()
            .max(
                java.util.Comparator.comparingInt(
                    r -> r.stream().mapToInt(Integer::intValue).sum()))
            .orElseThrow();
    return IntStream.range(0, type.rank())
        .mapToObj(j -> IntStream.range(0, type.rank()).map(i -> top.get(i) * a.get(i).get(j)).sum())
        .toList();
  }

  /** Solves {@code sum of c_i <alpha_i, alpha_j> = weight_j} by Gauss and Jordan. */
  private List<BigFraction> inSimpleRoots(List<Integer> weight) {
    int n = type.rank();
    List<List<Integer>> a = type.cartanMatrix();
    BigFraction[][] m = new BigFraction[n][n + 1];
    for (int j = 0; j < n; j++) {
      for (int i = 0; i < n; i++) {
        m[j][i] = BigFraction.of(a.get(i).get(j));
      }
      m[j][n] = BigFraction.of(weight.get(j));
    }
    for (int c = 0; c < n; c++) {
      int at = c;
      while (m[at][c].signum() == 0) {
        at++;
      }
      BigFraction[] pivot = m[at];
      m[at] = m[c];
      m[c] = pivot;
      for (int r = 0; r < n; r++) {
        if (r != c && m[r][c].signum() != 0) {
          BigFraction q = m[r][c].divide(pivot[c]);
          for (int k = c; k <= n; k++) {
            m[r][k] = m[r][k].subtract(q.multiply(pivot[k]));
          }
        }
      }
    }
    return IntStream.range(0, n).mapToObj(i -> m[i][n].divide(m[i][i])).toList();
  }

  /**
   * The highest weights of all modules up to a dimension; the dimension grows with each coordinate.
   *
   * @param most the greatest dimension
   * @return the trivial one too
   */
  List<List<Integer>> upTo(int most) {
    Set<List<Integer>> found = new LinkedHashSet<>();
    List<List<Integer>> open = new ArrayList<>();
    open.add(Collections.nCopies(type.rank(), 0));
    while (!open.isEmpty()) {
      List<Integer> weight = open.remove(open.size() - 1);
      if (dimension(weight) <= most && found.add(weight)) {
        for (int i = 0; i < weight.size(); i++) {
          List<Integer> next = new ArrayList<>(weight);
          next.set(i, next.get(i) + 1);
          open.add(List.copyOf(next));
        }
      }
    }
    return List.copyOf(found);
  }

  /** The weight that the automorphism of order 2 of the Dynkin diagram makes of one. */
  List<Integer> mirrored(List<Integer> weight) {
    int n = type.rank();
    List<Integer> out = new ArrayList<>(weight);
    switch (type.series()) {
      case A -> Collections.reverse(out);
      case D -> Collections.swap(out, n - 2, n - 1);
      case E -> {
        if (n == 6) {
          Collections.swap(out, 0, 5);
          Collections.swap(out, 2, 4);
        }
      }
      default -> {}
    }
    return List.copyOf(out);
  }
}
