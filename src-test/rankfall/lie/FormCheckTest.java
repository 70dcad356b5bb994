package rankfall.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The checks of a Killing matrix pass what is right and catch what is wrong. */
class FormCheckTest {

  static Stream<Brackets> algebras() {
    return Samples.varied().stream();
  }

  @ParameterizedTest
  @MethodSource("algebras")
  void killingMatrixPasses(Brackets algebra) {
    StructureConstants<BigInteger> c = algebra.inRandomBasis(1, 6).overIntegers();
    FormCheck<BigInteger> check = new FormCheck<>(LieBracket.of(c), PlainKilling.of(c));
    for (long seed = 0; seed < 5; seed++) {
      assertEquals(Optional.empty(), check.all(seed));
    }
  }

  private static FormCheck<BigInteger> broken(
      Brackets algebra, int i, int j, long by, boolean both) {
    StructureConstants<BigInteger> c = algebra.overIntegers();
    List<List<BigInteger>> kappa = new ArrayList<>();
    PlainKilling.of(c).forEach(row -> kappa.add(new ArrayList<>(row)));
    kappa.get(i).set(j, kappa.get(i).get(j).add(BigInteger.valueOf(by)));
    if (both) {
      kappa.get(j).set(i, kappa.get(j).get(i).add(BigInteger.valueOf(by)));
    }
    return new FormCheck<>(LieBracket.of(c), kappa);
  }

  private static String law(Optional<FormCheck.Mismatch> mismatch) {
    return mismatch.orElseThrow().law();
  }

  @Test
  void matrixWithUnequalHalvesIsCaught() {
    assertEquals("kappa(x, y) = kappa(y, x)", law(broken(Samples.sl2(), 0, 1, 1, false).all(3)));
  }

  @Test
  void symmetricMatrixThatIsNotInvariantIsCaught() {
    FormCheck<BigInteger> check = broken(Samples.sl2(), 0, 1, 1, true);
    assertTrue(check.symmetry(3).isEmpty());
    assertEquals("kappa([x, y], z) = kappa(x, [y, z])", law(check.all(3)));
  }

  /** Any multiple of the Killing form is invariant; only the trace tells. */
  @Test
  void invariantFormThatIsNotTheKillingFormIsCaught() {
    StructureConstants<BigInteger> c = Samples.so3().overIntegers();
    List<List<BigInteger>> twice =
        PlainKilling.of(c).stream().map(row -> row.stream().map(v -> v.add(v)).toList()).toList();
    FormCheck<BigInteger> check = new FormCheck<>(LieBracket.of(c), twice);
    assertTrue(check.symmetry(3).isEmpty() && check.invariance(3).isEmpty());
    assertEquals("kappa(x, y) = tr(ad x ad y)", law(check.all(3)));
  }

  /** Constants that break Jacobi's identity: invariance of the trace form fails. */
  @Test
  void bracketsWithoutJacobiAreCaught() {
    StructureConstants<BigInteger> c = Brackets.of(3, "1 2 3, 2 3 1, 3 1 2, 1 2 1").overIntegers();
    FormCheck<BigInteger> check = new FormCheck<>(LieBracket.of(c), PlainKilling.of(c));
    assertEquals("kappa([x, y], z) = kappa(x, [y, z])", law(check.all(3)));
  }
}
