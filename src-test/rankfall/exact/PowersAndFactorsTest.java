package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Defining identities of roots of powers and of common factors, on random polynomials. */
class PowersAndFactorsTest {
  private static final Variables RING = new Variables(List.of("a", "b", "c"));

  static LongStream seeds() {
    return LongStream.range(0, 40);
  }

  private static Polynomial random(Random random) {
    List<Term> terms = new ArrayList<>();
    for (int k = 0; k < 1 + random.nextInt(4); k++) {
      int c = 1 + random.nextInt(5);
      terms.add(
          new Term(
              java.math.BigInteger.valueOf(random.nextBoolean() ? c : -c),
              List.of(random.nextInt(3), random.nextInt(3), random.nextInt(2))));
    }
    Polynomial p = Polynomial.of(RING, terms);
    return p.isZero() ? Polynomial.one(RING) : p;
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void theRootOfAPowerIsFound(long seed) {
    Random random = new Random(seed);
    Polynomial p = random(random);
    int k = 2 + random.nextInt(2);
    Polynomial root = PolynomialRoot.root(p.pow(k), k).orElseThrow();
    assertEquals(p.pow(k), root.pow(k));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void oneMoreThanASquareIsNoSquare(long seed) {
    Polynomial p = random(new Random(seed));
    Polynomial a = Polynomial.variable(RING, 0);
    Polynomial q = p.times(a).plus(Polynomial.constant(RING, 2));
    Polynomial next = q.pow(2).plus(Polynomial.one(RING));
    assertEquals(Optional.empty(), PolynomialRoot.root(next, 2));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void aCommonFactorDividesAllAndIsFound(long seed) {
    Random random = new Random(seed);
    Polynomial shared = random(random);
    List<Polynomial> all = new ArrayList<>();
    for (int k = 0; k < 3; k++) {
      all.add(shared.times(random(random)));
    }
    Polynomial g = CommonFactor.of(all);
    for (Polynomial p : all) {
      assertTrue(p.dividedBy(g).isPresent());
    }
    assertTrue(g.dividedBy(shared.primitive()).isPresent() || shared.isConstant());
  }

  /**
   * Powers over the numbers of c^2 + 1 and c^2 - 2, also such as show only modulo the equation: (a
   * - 2*c)^2 is a^2 - 4*a*c - 4 over c^2 + 1. Factors multiply back, none is a factor twice.
   */
  @ParameterizedTest
  @MethodSource("seeds")
  void powersOverAlgebraicNumbersAreFound(long seed) {
    Random random = new Random(seed);
    Variables ring = new Variables(List.of("a", "b", "c"));
    Polynomial a = Polynomial.variable(ring, 0);
    Polynomial c = Polynomial.variable(ring, 2);
    Polynomial number = c.pow(2).plus(Polynomial.constant(ring, random.nextBoolean() ? 1 : -2));
    Chain chain = new Chain(ring, List.of(new Chain.Rule(2, number)));
    Polynomial base = a.plus(c.times(java.math.BigInteger.valueOf(1 + random.nextInt(5))));
    Polynomial other = Polynomial.variable(ring, 1).plus(c).plus(a.pow(random.nextInt(2)));
    int k = 2 + random.nextInt(3);
    Polynomial power = chain.reduced(random.nextBoolean() ? base.pow(k) : base.pow(k).times(other));
    Factorization found = ChainFactoring.factorization(chain, power);
    assertTrue(
        found.factors().stream().anyMatch(f -> f.base().equals(base) && f.multiplicity() == k),
        () -> power + " -> " + found);
    assertTrue(found.factors().size() <= 2, found::toString);
  }
}
