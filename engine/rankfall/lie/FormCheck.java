package rankfall.lie;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;

/**
 * Checks of a Killing matrix on random exact elements of its algebra.
 *
 * <p>Coordinates are seeded random integers from -9 to 9. A right matrix always passes; a wrong one
 * is caught unless the elements lie on a hypersurface.
 *
 * @param bracket the algebra
 * @param kappa exact values in the basis of the bracket, n rows of n
 * @param <E> the elements of the ring
 */
public record FormCheck<E>(LieBracket<E> bracket, List<List<E>> kappa) {
  private static final int SPREAD = 9;

  /**
   * A law that does not hold.
   *
   * @param law the law
   * @param left the value of its left side
   * @param right the value of its right side
   */
  public record Mismatch(String law, String left, String right) {}

  /** Copies the matrix. */
  public FormCheck {
    kappa = kappa.stream().map(List::copyOf).toList();
  }

  /** Whether kappa(x, y) = kappa(y, x), both halves of the matrix taking part. */
  public Optional<Mismatch> symmetry(long seed) {
    Random random = new Random(seed);
    SortedMap<Integer, E> x = element(random);
    SortedMap<Integer, E> y = element(random);
    return compare("kappa(x, y) = kappa(y, x)", value(x, y), value(y, x));
  }

  /** Whether kappa([x, y], z) = kappa(x, [y, z]). */
  public Optional<Mismatch> invariance(long seed) {
    Random random = new Random(seed);
    SortedMap<Integer, E> x = element(random);
    SortedMap<Integer, E> y = element(random);
    SortedMap<Integer, E> z = element(random);
    return compare(
        "kappa([x, y], z) = kappa(x, [y, z])",
        value(bracket.of(x, y), z),
        value(x, bracket.of(y, z)));
  }

  /** Whether kappa(x, y) is the trace of ad x ad y, the matrices multiplied plainly. */
  public Optional<Mismatch> trace(long seed) {
    Random random = new Random(seed);
    SortedMap<Integer, E> x = element(random);
    SortedMap<Integer, E> y = element(random);
    Domain<E> domain = bracket.domain();
    E trace = domain.zero();
    for (int k = 0; k < bracket.dimension(); k++) {
      SortedMap<Integer, E> unit = new Vectors<>(domain).unit(k);
      trace = domain.plus(trace, bracket.of(x, bracket.of(y, unit)).getOrDefault(k, domain.zero()));
    }
    return compare("kappa(x, y) = tr(ad x ad y)", value(x, y), trace);
  }

  /**
   * The first law that does not hold.
   *
   * @param seed of the random elements
   * @return empty if all hold
   */
  public Optional<Mismatch> all(long seed) {
    return symmetry(seed).or(() -> invariance(seed)).or(() -> trace(seed));
  }

  private E value(SortedMap<Integer, E> x, SortedMap<Integer, E> y) {
    Vectors<E> vectors = new Vectors<>(bracket.domain());
    return vectors.pair(vectors.times(x, kappa), y);
  }

  private SortedMap<Integer, E> element(Random random) {
    Vectors<E> vectors = new Vectors<>(bracket.domain());
    SortedMap<Integer, E> x = new TreeMap<>();
    for (int i = 0; i < bracket.dimension(); i++) {
      int c = random.nextInt(2 * SPREAD + 1) - SPREAD;
      vectors.add(x, i, vectors.integer(c));
    }
    return x;
  }

  private Optional<Mismatch> compare(String law, E left, E right) {
    Domain<E> domain = bracket.domain();
    E difference = domain.plus(left, domain.negate(right));
    return new Vectors<>(domain).vanishes(difference)
        ? Optional.empty()
        : Optional.of(new Mismatch(law, left.toString(), right.toString()));
  }
}
