package rankfall.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.exact.Chain;
import rankfall.exact.Integers;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;

/** Characteristic polynomial, signature, determinant and dual of symmetric matrices. */
class SymmetricMatrixTest {
  private static final Integers Z = new Integers();

  static IntStream seeds() {
    return IntStream.range(0, 60);
  }

  private static List<List<BigInteger>> random(int seed) {
    Random r = new Random(seed);
    int n = seed % 7;
    BigInteger[][] a = new BigInteger[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j <= i; j++) {
        a[i][j] = BigInteger.valueOf(r.nextInt(3) > 0 ? 0 : r.nextInt(7) - 3);
        a[j][i] = a[i][j];
      }
    }
    return java.util.Arrays.stream(a).map(List::of).toList();
  }

  /** Sylvester's law: diagonalise by congruence over the rationals and count. */
  @ParameterizedTest
  @MethodSource("seeds")
  void signatureAndDeterminantAgreeWithCongruence(int seed) {
    List<List<BigInteger>> m = random(seed);
    List<List<BigInteger>> blocks = CharacteristicPolynomial.byBlocks(Z, m);
    List<BigFraction> diagonal = diagonal(m);
    Signature expected =
        new Signature(
            (int) diagonal.stream().filter(d -> d.signum() > 0).count(),
            (int) diagonal.stream().filter(d -> d.signum() < 0).count(),
            (int) diagonal.stream().filter(d -> d.signum() == 0).count());
    assertEquals(expected, Signature.of(blocks, BigInteger::signum));
    assertEquals(
        expected, Signature.of(List.of(CharacteristicPolynomial.of(Z, m)), BigInteger::signum));
    BigFraction product = diagonal.stream().reduce(BigFraction.ONE, BigFraction::multiply);
    assertEquals(
        product, BigFraction.of(CharacteristicPolynomial.determinant(Z, blocks)), m.toString());
  }

  /** Steps of determinant 1 only, so the product of the diagonal is the determinant. */
  private static List<BigFraction> diagonal(List<List<BigInteger>> m) {
    int n = m.size();
    BigFraction[][] a = new BigFraction[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        a[i][j] = BigFraction.of(m.get(i).get(j));
      }
    }
    for (int k = 0; k < n; k++) {
      for (int j = k + 1; j < n && a[k][k].signum() == 0; j++) {
        if (a[k][j].signum() != 0) {
          BigFraction twice = a[k][j].multiply(2).add(a[j][j]);
          add(a, k, j, twice.signum() != 0 ? BigFraction.ONE : BigFraction.of(2));
        }
      }
      for (int i = k + 1; i < n && a[k][k].signum() != 0; i++) {
        add(a, i, k, a[i][k].divide(a[k][k]).negate());
      }
    }
    List<BigFraction> out = new ArrayList<>();
    for (int k = 0; k < n; k++) {
      out.add(a[k][k]);
    }
    return out;
  }

  private static void add(BigFraction[][] a, int to, int from, BigFraction c) {
    for (int j = 0; j < a.length; j++) {
      a[to][j] = a[to][j].add(c.multiply(a[from][j]));
    }
    for (int i = 0; i < a.length; i++) {
      a[i][to] = a[i][to].add(c.multiply(a[i][from]));
    }
  }

  /** Cayley and Hamilton: a matrix is a root of its characteristic polynomial. */
  @ParameterizedTest
  @MethodSource("seeds")
  void matrixIsARootOfItsCharacteristicPolynomial(int seed) {
    List<List<BigInteger>> m = random(seed);
    int n = m.size();
    BigInteger[][] sum = new BigInteger[n][n];
    for (BigInteger[] row : sum) {
      java.util.Arrays.fill(row, BigInteger.ZERO);
    }
    for (BigInteger c : CharacteristicPolynomial.of(Z, m)) {
      BigInteger[][] next = new BigInteger[n][n];
      for (int i = 0; i < n; i++) {
        for (int j = 0; j < n; j++) {
          next[i][j] = i == j ? c : BigInteger.ZERO;
          for (int k = 0; k < n; k++) {
            next[i][j] = next[i][j].add(sum[i][k].multiply(m.get(k).get(j)));
          }
        }
      }
      sum = next;
    }
    for (BigInteger[] row : sum) {
      for (BigInteger e : row) {
        assertEquals(BigInteger.ZERO, e);
      }
    }
  }

  private static final Variables AB = new Variables(List.of("a", "b"));
  private static final Chain FREE = Chain.free(AB);
  private static final RationalFunction A = RationalFunction.of(Polynomial.variable(AB, 0));
  private static final RationalFunction B = RationalFunction.of(Polynomial.variable(AB, 1));

  private static RationalFunction number(long k) {
    return RationalFunction.of(Polynomial.constant(AB, k));
  }

  private static String text(Optional<DualForm> dual) {
    return dual.orElseThrow().matrix().toString();
  }

  /**
   * Killing form on diag(1,0,-1), diag(0,1,-1) of sl(3): 6 tr(xy), so [[12, 6], [6, 12]]; dual
   * basis at 120 degrees (Humphreys 1972, table 1 of section 9.4).
   */
  @Test
  void dualOfTheTorusOfSl3StandsAt120Degrees() {
    List<List<RationalFunction>> k =
        List.of(List.of(number(12), number(6)), List.of(number(6), number(12)));
    List<List<RationalFunction>> d = DualForm.of(FREE, k).orElseThrow().matrix();
    assertEquals("[[1/9, -1/18], [-1/18, 1/9]]", d.toString());
    assertEquals(number(-1).over(number(2)), d.get(0).get(1).over(d.get(0).get(0)));
  }

  @Test
  void dualIsFoundBlockByBlock() {
    RationalFunction z = number(0);
    List<List<RationalFunction>> k =
        List.of(List.of(z, z, A), List.of(z, number(1).over(B), z), List.of(A, z, z));
    assertEquals("[[0, 0, 1/a], [0, b, 0], [1/a, 0, 0]]", text(DualForm.of(FREE, k)));
    assertEquals("[]", text(DualForm.of(FREE, List.of())));
  }

  @Test
  void degenerateFormHasNoDual() {
    List<List<RationalFunction>> k = List.of(List.of(A, B), List.of(B, B.times(B).over(A)));
    assertEquals(Optional.empty(), DualForm.of(FREE, k));
  }

  /** On a = b the form [[a, b], [b, a + b]] has determinant b^2; off it a^2 + a*b - b^2. */
  @Test
  void dualHoldsOnTheChain() {
    Chain diagonal = new Chain(AB, List.of(new Chain.Rule(0, A.minus(B).numerator())));
    List<List<RationalFunction>> k = List.of(List.of(A, B), List.of(B, A.plus(B)));
    assertEquals("[[2/b, -1/b], [-1/b, 1/b]]", text(DualForm.of(diagonal, k)));
    List<List<RationalFunction>> lost = List.of(List.of(A, B), List.of(B, A));
    assertEquals(Optional.empty(), DualForm.of(diagonal, lost));
    assertEquals(1, DualForm.of(FREE, lost).stream().count());
  }

  @Test
  void wrongInverseIsRefused() {
    List<List<RationalFunction>> k = List.of(List.of(A));
    assertThrows(
        IllegalStateException.class, () -> DualForm.requireInverse(FREE, k, List.of(List.of(B))));
  }

  @Test
  void quotientsPrintInLowestTerms() {
    RationalNumbers q = new RationalNumbers();
    assertEquals("-3/2", q.quotient(BigInteger.valueOf(6), BigInteger.valueOf(-4)));
    assertEquals("4", q.quotient(BigInteger.valueOf(-8), BigInteger.valueOf(-2)));
    assertEquals("0", q.quotient(BigInteger.ZERO, BigInteger.valueOf(-7)));
  }
}
