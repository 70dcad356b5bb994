package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Elimination;
import rankfall.exact.Factoring;
import rankfall.exact.Integers;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;
import rankfall.lie.CharacteristicPolynomial;
import rankfall.lie.LieBracket;
import rankfall.lie.StructureConstants;

/**
 * The roots of a semisimple algebra with respect to a Cartan subalgebra that acts diagonally over
 * the rational numbers: its joint eigenvalues under ad (Humphreys, Introduction to Lie Algebras,
 * section 8.1).
 */
public final class SplitTorus {
  private static final long SEED = 1894;
  private static final int SPREAD = 1000;

  private SplitTorus() {}

  /**
   * The root system.
   *
   * @param constants of a semisimple algebra
   * @param torus a basis of an abelian subalgebra, sparse vectors
   * @return empty if the torus is no Cartan subalgebra that acts diagonally over the rationals
   */
  public static Optional<RootSystem> roots(
      StructureConstants<BigInteger> constants, List<SortedMap<Integer, BigInteger>> torus) {
    LieBracket<BigInteger> bracket = LieBracket.of(constants);
    int n = constants.dimension();
    List<List<BigFraction>> roots = new ArrayList<>();
    for (SortedMap<Integer, BigInteger> v : eigenvectors(bracket, general(torus))) {
      List<BigFraction> root = new ArrayList<>();
      for (SortedMap<Integer, BigInteger> t : torus) {
        BigInteger value = bracket.of(t, v).getOrDefault(v.firstKey(), BigInteger.ZERO);
        root.add(BigFraction.of(value, v.get(v.firstKey())));
      }
      roots.add(root);
    }
    if (roots.size() + torus.size() != n) {
      return Optional.empty();
    }
    return Optional.of(RootSystem.of(roots, inverse(gram(roots, torus.size()))));
  }

  private static SortedMap<Integer, BigInteger> general(
      List<SortedMap<Integer, BigInteger>> torus) {
    Random random = new Random(SEED);
    SortedMap<Integer, BigInteger> out = new TreeMap<>();
    for (SortedMap<Integer, BigInteger> t : torus) {
      BigInteger weight = BigInteger.valueOf(1 + random.nextInt(SPREAD));
      t.forEach((k, c) -> out.merge(k, c.multiply(weight), BigInteger::add));
    }
    return out;
  }

  /** Eigenvectors of ad t whose eigenvalue is rational, not 0, and has no other eigenvector. */
  private static List<SortedMap<Integer, BigInteger>> eigenvectors(
      LieBracket<BigInteger> bracket, SortedMap<Integer, BigInteger> t) {
    int n = bracket.dimension();
    List<SortedMap<Integer, BigInteger>> rows = Action.transposed(bracket.adjoint(t), n);
    List<SortedMap<Integer, BigInteger>> out = new ArrayList<>();
    for (BigInteger value : integerRoots(rows)) {
      List<SortedMap<Integer, BigInteger>> shifted = new ArrayList<>();
      for (int i = 0; i < n; i++) {
        SortedMap<Integer, BigInteger> row = new TreeMap<>(rows.get(i));
        row.merge(i, value.negate(), BigInteger::add);
        row.values().removeIf(c -> c.signum() == 0);
        shifted.add(row);
      }
      List<SortedMap<Integer, BigInteger>> kernel =
          Elimination.of(new Integers(), shifted, n).kernel();
      if (kernel.size() == 1) {
        out.add(kernel.get(0));
      }
    }
    return out;
  }

  /**
   * The roots, other than 0, of a characteristic polynomial over the integers that are rational.
   */
  private static List<BigInteger> integerRoots(List<SortedMap<Integer, BigInteger>> matrix) {
    int n = matrix.size();
    List<List<BigInteger>> dense = new ArrayList<>();
    for (SortedMap<Integer, BigInteger> row : matrix) {
      List<BigInteger> out = new ArrayList<>();
      for (int j = 0; j < n; j++) {
        out.add(row.getOrDefault(j, BigInteger.ZERO));
      }
      dense.add(out);
    }
    List<BigInteger> coefficients = CharacteristicPolynomial.of(new Integers(), dense);
    Variables ring = new Variables(List.of("x"));
    Polynomial x = Polynomial.variable(ring, 0);
    Polynomial sum = Polynomial.zero(ring);
    for (BigInteger c : coefficients) {
      sum = sum.times(x).plus(Polynomial.constant(ring, c));
    }
    return Factoring.irreducible(sum).stream()
        .filter(f -> f.degree(0) == 1)
        .map(f -> f.coefficient(0, 0).constantValue().negate())
        .filter(r -> r.signum() != 0)
        .toList();
  }

  /** The Killing form on the torus: the sum over the roots of products of values. */
  private static List<List<BigFraction>> gram(List<List<BigFraction>> roots, int rank) {
    List<List<BigFraction>> out = new ArrayList<>();
    for (int i = 0; i < rank; i++) {
      List<BigFraction> row = new ArrayList<>();
      for (int j = 0; j < rank; j++) {
        BigFraction sum = BigFraction.ZERO;
        for (List<BigFraction> root : roots) {
          sum = sum.add(root.get(i).multiply(root.get(j)));
        }
        row.add(sum);
      }
      out.add(row);
    }
    return out;
  }

  /** The inverse of a positive definite matrix by Gauss and Jordan, without exchanges. */
  private static List<List<BigFraction>> inverse(List<List<BigFraction>> matrix) {
    int n = matrix.size();
    BigFraction[][] m = new BigFraction[n][2 * n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        m[i][j] = matrix.get(i).get(j);
        m[i][n + j] = i == j ? BigFraction.ONE : BigFraction.ZERO;
      }
    }
    for (int c = 0; c < n; c++) {
      BigFraction pivot = m[c][c];
      for (int j = 0; j < 2 * n; j++) {
        m[c][j] = m[c][j].divide(pivot);
      }
      for (int i = 0; i < n; i++) {
        BigFraction q = m[i][c];
        for (int j = 0; i != c && j < 2 * n; j++) {
          m[i][j] = m[i][j].subtract(q.multiply(m[c][j]));
        }
      }
    }
    List<List<BigFraction>> out = new ArrayList<>();
    for (BigFraction[] row : m) {
      out.add(List.of(row).subList(n, 2 * n));
    }
    return out;
  }
}
