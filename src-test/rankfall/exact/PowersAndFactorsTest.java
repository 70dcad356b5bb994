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
}
