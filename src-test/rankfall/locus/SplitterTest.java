package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.TreeSet;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import rankfall.exact.Chain;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.Read;
import rankfall.exact.Term;
import rankfall.exact.Variables;

/** Random systems: counted modulo primes, and put together from primes that are known. */
class SplitterTest {
  private static final int[] PRIMES = {11, 13, 17, 19, 23};
  private static final Variables XYZ = new Variables(List.of("x", "y", "z"));

  static LongStream seeds() {
    return LongStream.range(0, 120);
  }

  static LongStream fewSeeds() {
    return LongStream.range(0, 40);
  }

  private static Meter meter() {
    return new Meter(Duration.ofSeconds(60), 20_000);
  }

  /** Few short terms, coefficients often 1 or -1. */
  private static Polynomial random(Random r, Variables v, int terms, int degree) {
    List<Term> out = new ArrayList<>();
    for (int k = 1 + r.nextInt(terms); k > 0; k--) {
      int left = r.nextInt(degree + 1);
      List<Integer> e = new ArrayList<>();
      for (int j = 0; j < v.count(); j++) {
        int d = r.nextInt(left + 1);
        left -= d;
        e.add(d);
      }
      java.util.Collections.shuffle(e, r);
      int c = r.nextInt(3) == 0 ? 1 + r.nextInt(3) : r.nextBoolean() ? 1 : -1;
      out.add(new Term(BigInteger.valueOf(c), e));
    }
    return Polynomial.of(v, out);
  }

  /** A polynomial modulo a small prime. */
  private record Residues(int prime, long[] coefficients, int[][] exponents) {
    static Residues of(Polynomial p, int prime) {
      List<Term> terms = p.terms();
      return new Residues(
          prime,
          terms.stream()
              .mapToLong(t -> t.coefficient().mod(BigInteger.valueOf(prime)).longValue())
              .toArray(),
          terms.stream()
              .map(t -> t.exponents().stream().mapToInt(Integer::intValue).toArray())
              .toArray(int[][]::new));
    }

    boolean vanishes(int[] x) {
      long sum = 0;
      for (int k = 0; k < coefficients.length; k++) {
        long t = coefficients[k];
        for (int v = 0; v < x.length; v++) {
          for (int e = 0; e < exponents[k][v]; e++) {
            t = t * x[v] % prime;
          }
        }
        sum += t;
      }
      return sum % prime == 0;
    }
  }

  private record ResiduePiece(List<Residues> rules, List<Residues> nonZero) {
    static ResiduePiece of(Piece p, int prime) {
      return new ResiduePiece(
          p.chain().rules().stream().map(r -> Residues.of(r.equation(), prime)).toList(),
          p.nonZero().stream().map(q -> Residues.of(q, prime)).toList());
    }

    boolean holds(int[] x) {
      return rules.stream().allMatch(r -> r.vanishes(x))
          && nonZero.stream().noneMatch(r -> r.vanishes(x));
    }
  }

  /**
   * Whether every zero over a prime field lies in exactly one piece and every other point in none.
   */
  private static boolean fits(List<Polynomial> equations, List<Piece> pieces, int n, int prime) {
    List<Residues> e = equations.stream().map(p -> Residues.of(p, prime)).toList();
    List<ResiduePiece> q = pieces.stream().map(p -> ResiduePiece.of(p, prime)).toList();
    int points = BigInteger.valueOf(prime).pow(n).intValue();
    for (int m = 0; m < points; m++) {
      int[] x = new int[n];
      for (int v = 0, rest = m; v < n; v++, rest /= prime) {
        x[v] = rest % prime;
      }
      long count = q.stream().filter(p -> p.holds(x)).count();
      if (count != (e.stream().allMatch(r -> r.vanishes(x)) ? 1 : 0)) {
        return false;
      }
    }
    return true;
  }

  /** All but a few primes are good; a wrong piece is wrong modulo most of them. */
  @ParameterizedTest
  @MethodSource("seeds")
  void piecesAreDisjointAndCoverTheZeros(long seed) {
    Random r = new Random(seed);
    int n = 2 + r.nextInt(2);
    Variables v = new Variables(XYZ.names().subList(0, n));
    List<Polynomial> equations = new ArrayList<>();
    for (int k = 1 + r.nextInt(3); k > 0; k--) {
      Polynomial p = random(r, v, 3, 3);
      equations.add(r.nextInt(3) == 0 ? p.times(random(r, v, 2, 2)) : p);
    }
    List<Piece> pieces = new Splitter(Chain.free(v), meter()).zeros(equations, List.of());
    List<Integer> bad = new ArrayList<>();
    for (int prime : PRIMES) {
      if (!fits(equations, pieces, n, prime)) {
        bad.add(prime);
      }
    }
    assertTrue(bad.size() <= 1, () -> equations + " modulo " + bad + ": " + pieces);
  }

  /** Pieces that overlap or leave a point out are seen. */
  @ParameterizedTest
  @ValueSource(ints = {11, 23})
  void comparisonSeesWrongPieces(int prime) {
    List<Polynomial> cross = List.of(Read.polynomial(XYZ, "x*y"));
    List<Piece> pieces = new Splitter(Chain.free(XYZ), meter()).zeros(cross, List.of());
    assertTrue(fits(cross, pieces, 3, prime));
    assertFalse(fits(cross, pieces.subList(1, pieces.size()), 3, prime));
    List<Piece> twice = new ArrayList<>(pieces);
    twice.add(pieces.get(0));
    assertFalse(fits(cross, twice, 3, prime));
  }

  /** Graphs, lines, points, a cusp over a graph, cones: all prime, whatever the numbers. */
  private static List<String> prime(Random r) {
    int a = r.nextInt(5) - 2;
    int b = r.nextInt(3) + 1;
    return switch (r.nextInt(9)) {
      case 0 -> List.of("x - (" + a + ")*z^2 - y", "y - z^" + b);
      case 1 -> List.of("y - " + b + "*x*z - (" + a + ")");
      case 2 -> List.of("x - (" + a + ")", "y - " + b, "z");
      case 3 -> List.of("z^2 - y^3", "x - (" + a + ")*y - z");
      case 4 -> List.of("x^2 - 2", "y - x - (" + a + ")");
      case 5 -> List.of("x*z - y^2");
      case 6 -> List.of("x^2 + y^2 + " + b);
      case 7 -> List.of("y^2 - 3", "x^2 - 2", "z - (" + a + ")*x*y");
      default -> List.of("x + (" + a + ")*y", "z - " + b + "*y");
    };
  }

  private static List<Polynomial> products(List<Polynomial> a, List<Polynomial> b) {
    List<Polynomial> out = new ArrayList<>();
    a.forEach(p -> b.forEach(q -> out.add(p.times(q))));
    return out;
  }

  /** The components of a product of primes are those that contain no other one. */
  @ParameterizedTest
  @MethodSource("fewSeeds")
  void productsOfPrimesAreTakenApart(long seed) {
    Random r = new Random(seed);
    GroebnerBasis bases = new GroebnerBasis(Chain.free(XYZ));
    List<List<Polynomial>> primes = new ArrayList<>();
    List<Polynomial> product = List.of(Polynomial.one(XYZ));
    for (int k = 1 + r.nextInt(3); k > 0; k--) {
      List<Polynomial> p = prime(r).stream().map(t -> Read.polynomial(XYZ, t)).toList();
      primes.add(bases.reduced(p));
      product = products(product, p);
    }
    TreeSet<String> expected = new TreeSet<>();
    for (List<Polynomial> p : primes) {
      boolean embedded =
          primes.stream().anyMatch(q -> !q.equals(p) && bases.outside(p, q).isEmpty());
      if (!embedded) {
        expected.add(p.toString());
      }
    }
    Decomposition d = Decomposition.of(Chain.free(XYZ), product, meter());
    TreeSet<String> found = new TreeSet<>();
    d.components().forEach(c -> found.add(c.equations().toString()));
    assertEquals(expected, found);
    assertInstanceOf(Decomposition.Certified.class, d.certificate());
  }
}
