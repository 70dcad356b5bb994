package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.Elimination;
import rankfall.exact.NumberFieldTower;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;
import rankfall.lie.Subspace;

/**
 * A general element of the centroid of a semisimple algebra with its minimal polynomial, which has
 * as many different roots as there are simple ideals over the complex numbers.
 *
 * @param ground the field
 * @param matrix sparse rows
 * @param factors the irreducible factors of the minimal polynomial, coefficients of each, the
 *     constant one first
 */
record Centroid<E>(Ground<E> ground, List<SortedMap<Integer, E>> matrix, List<List<E>> factors) {
  private static final int TRIES = 20;
  private static final int SPREAD = 4;

  Centroid {
    matrix = List.copyOf(matrix);
    factors = factors.stream().map(List::copyOf).toList();
  }

  /**
   * A random element.
   *
   * @param kappa the Killing matrix
   * @param forms a basis of the invariant forms, one a simple ideal over the complex numbers
   * @param random the choice
   */
  static <E> Centroid<E> of(
      Ground<E> ground,
      List<List<E>> kappa,
      List<List<SortedMap<Integer, E>>> forms,
      Random random) {
    int n = kappa.size();
    List<SortedMap<Integer, E>> rows = kappa.stream().map(ground::sparse).toList();
    for (int k = 0; k < TRIES; k++) {
      List<SortedMap<Integer, E>> form = new ArrayList<>();
      for (int i = 0; i < n; i++) {
        form.add(new TreeMap<>());
      }
      for (List<SortedMap<Integer, E>> f : forms) {
        E weight = number(ground, random);
        for (int i = 0; i < n; i++) {
          ground.add(form.get(i), weight, f.get(i));
        }
      }
      List<SortedMap<Integer, E>> phi = ground.solve(rows, form, n).rows();
      Centroid<E> all = new Centroid<>(ground, phi, List.of());
      Optional<List<E>> minimal = all.minimalPolynomial(forms.size(), random);
      if (minimal.isPresent()) {
        return new Centroid<>(ground, phi, all.split(minimal.get()));
      }
    }
    throw new IllegalStateException("no general element of the centroid found");
  }

  private static <E> E number(Ground<E> ground, Random random) {
    return ground.integer(BigInteger.valueOf(random.nextInt(2 * SPREAD + 1) - SPREAD));
  }

  /** The image of a vector. */
  SortedMap<Integer, E> image(SortedMap<Integer, E> x) {
    List<E> out = matrix.stream().map(row -> ground.pair(row, x)).toList();
    return ground.sparse(ground.shorter().apply(out));
  }

  /** {@code slope * phi(x) + shift * x}. */
  SortedMap<Integer, E> linear(SortedMap<Integer, E> x, E slope, E shift) {
    SortedMap<Integer, E> out = new TreeMap<>();
    ground.add(out, slope, image(x));
    ground.add(out, shift, x);
    return out;
  }

  /** The relation of least degree between the images of a random vector, if it has the degree. */
  private Optional<List<E>> minimalPolynomial(int degree, Random random) {
    int n = matrix.size();
    SortedMap<Integer, E> x = new TreeMap<>();
    for (int i = 0; i < n; i++) {
      x.put(i, number(ground, random));
    }
    List<SortedMap<Integer, E>> rows = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      rows.add(new TreeMap<>());
    }
    for (int k = 0; k <= degree; k++) {
      int column = k;
      x.forEach((i, v) -> rows.get(i).put(column, v));
      x = image(x);
    }
    List<SortedMap<Integer, E>> kernel = Elimination.of(ground.domain(), rows, degree + 1).kernel();
    if (kernel.size() != 1 || !kernel.get(0).containsKey(degree)) {
      return Optional.empty();
    }
    SortedMap<Integer, E> relation = ground.over(kernel.get(0), kernel.get(0).get(degree));
    List<E> out = new ArrayList<>();
    for (int k = 0; k <= degree; k++) {
      out.add(relation.getOrDefault(k, ground.domain().zero()));
    }
    return Optional.of(out);
  }

  private List<List<E>> split(List<E> coefficients) {
    Chain chain = ground.chain();
    String name = "x";
    while (chain.variables().names().contains(name)) {
      name += "'";
    }
    List<String> names = new ArrayList<>(chain.variables().names());
    names.add(name);
    Variables ring = new Variables(names);
    Chain tower =
        new Chain(
            ring,
            chain.tower().stream()
                .map(r -> new Chain.Rule(r.variable(), NumberFieldTower.inRing(r.equation(), ring)))
                .toList());
    int v = ring.count() - 1;
    Polynomial x = Polynomial.variable(ring, v);
    Polynomial sum = Polynomial.zero(ring);
    List<Polynomial> reduced = chain.reduced(coefficients.stream().map(ground.lift()).toList());
    for (int k = 0; k < reduced.size(); k++) {
      sum = sum.plus(NumberFieldTower.inRing(reduced.get(k), ring).times(x.pow(k)));
    }
    return NumberFieldTower.factors(tower, sum).stream()
        .map(
            f ->
                f.coefficientsIn(v).stream()
                    .map(c -> ground.lower().apply(NumberFieldTower.inRing(c, chain.variables())))
                    .toList())
        .toList();
  }

  /** The value of a polynomial in phi at a vector, up to a factor. */
  private SortedMap<Integer, E> value(List<E> polynomial, SortedMap<Integer, E> x) {
    SortedMap<Integer, E> sum = new TreeMap<>();
    for (int k = polynomial.size() - 1; k >= 0; k--) {
      SortedMap<Integer, E> next = new TreeMap<>(image(sum));
      ground.add(next, polynomial.get(k), x);
      sum = next;
    }
    return ground.normal(sum);
  }

  /**
   * The kernel of a factor at phi, an ideal: the image of the product of the other factors.
   *
   * @param factor one of the factors
   * @return a basis
   */
  List<SortedMap<Integer, E>> ideal(List<E> factor) {
    int n = matrix.size();
    List<SortedMap<Integer, E>> images = Subspace.whole(ground.domain(), n).basis();
    for (List<E> other : factors) {
      if (!other.equals(factor)) {
        images = images.stream().map(x -> value(other, x)).toList();
      }
    }
    return ground.reduced(images, n, n).rows();
  }

  /**
   * A residue of a random element of one simple ideal over the complex numbers.
   *
   * @param factor whose root tells the ideal
   * @param map where the factor must have a root
   * @return empty if it has none, or the map is not defined on the field
   */
  Optional<long[]> elementOfIdeal(List<E> factor, ResidueMap map, Random random) {
    PrimeField field = map.field();
    List<Long> own = residues(factor, map);
    OptionalLong root = map.root(own);
    if (root.isEmpty()) {
      return Optional.empty();
    }
    int n = matrix.size();
    long[][] phi = new long[n][n];
    for (int i = 0; i < n; i++) {
      int row = i;
      matrix.get(i).forEach((j, v) -> phi[row][j] = map.of(ground.lift().apply(v)));
    }
    long[] x = random.longs(n, 0, field.prime()).toArray();
    for (List<E> other : factors) {
      List<Long> p =
          other.equals(factor) ? quotient(own, root.getAsLong(), field) : residues(other, map);
      x = value(p, phi, x, field);
    }
    return Optional.of(x);
  }

  private List<Long> residues(List<E> polynomial, ResidueMap map) {
    return polynomial.stream().map(c -> map.of(ground.lift().apply(c))).toList();
  }

  /** The quotient by {@code x - root}, by Horner's rule. */
  private static List<Long> quotient(List<Long> p, long root, PrimeField field) {
    List<Long> out = new ArrayList<>();
    long sum = 0;
    for (int k = p.size() - 1; k > 0; k--) {
      sum = field.plus(field.times(sum, root), p.get(k));
      out.add(0, sum);
    }
    return out;
  }

  private static long[] value(List<Long> p, long[][] phi, long[] x, PrimeField field) {
    long[] sum = new long[x.length];
    for (int k = p.size() - 1; k >= 0; k--) {
      long[] next = new long[x.length];
      for (int i = 0; i < x.length; i++) {
        next[i] = field.times(p.get(k), x[i]);
        for (int j = 0; j < x.length; j++) {
          next[i] = field.plus(next[i], field.times(phi[i][j], sum[j]));
        }
      }
      sum = next;
    }
    return sum;
  }
}
