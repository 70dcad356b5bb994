package rankfall.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.exact.Integers;

/** Facts of the textbooks about well-known algebras, from memory unless a source is named. */
class PublishedFactsTest {

  /**
   * Name, algebra, signature, derived and lower central series, dimensions of centre, radical,
   * nilradical, unimodular, number of invariant forms, greatest rank of one. All values agree with
   * a recomputation modulo a large prime by a separate program.
   */
  static Stream<Arguments> facts() {
    return Stream.of(
        row("dimension 0", Samples.abelian(0), "0 0 0", "0", "0", "0 0 0", true, "0 0"),
        row("R", Samples.abelian(1), "0 0 1", "1 0", "1 0", "1 1 1", true, "1 1"),
        row("R^3", Samples.abelian(3), "0 0 3", "3 0", "3 0", "3 3 3", true, "6 3"),
        row("so(3)", Samples.so3(), "0 3 0", "3", "3", "0 0 0", true, "1 3"),
        row("sl(2,R)", Samples.sl2(), "2 1 0", "3", "3", "0 0 0", true, "1 3"),
        row("gl(2,R)", Samples.gl(2), "2 1 1", "4 3", "4 3", "1 1 1", true, "2 4"),
        row("Heisenberg", Samples.heisenberg(), "0 0 3", "3 1 0", "3 1 0", "1 3 3", true, "3 2"),
        // Invariant Lorentz metric of the oscillator group: Medina and Revoy 1985.
        row("oscillator", Samples.oscillator(), "0 1 3", "4 3 1 0", "4 3", "1 4 3", true, "2 4"),
        // Bianchi's classes in the form of Ellis and MacCallum 1969.
        row("Bianchi III", bianchi(1, 1, -1), "1 0 2", "3 1 0", "3 1", "1 3 2", false, "3 2"),
        row("Bianchi IV", bianchi(1, 0, 1), "1 0 2", "3 2 0", "3 2", "0 3 2", false, "1 1"),
        row("Bianchi V", bianchi(1, 0, 0), "1 0 2", "3 2 0", "3 2", "0 3 2", false, "1 1"),
        row("Bianchi VI_0", bianchi(0, 1, -1), "1 0 2", "3 2 0", "3 2", "0 3 2", true, "1 1"),
        row("Bianchi VI_-4", bianchi(2, 1, -1), "1 0 2", "3 2 0", "3 2", "0 3 2", false, "1 1"),
        row("Bianchi VII_0", bianchi(0, 1, 1), "0 1 2", "3 2 0", "3 2", "0 3 2", true, "1 1"),
        row("Bianchi VII_1", bianchi(1, 1, 1), "0 0 3", "3 2 0", "3 2", "0 3 2", false, "1 1"),
        row("Bianchi VII_4", bianchi(2, 1, 1), "1 0 2", "3 2 0", "3 2", "0 3 2", false, "1 1"),
        row("so(4)", so(1, 1, 1, 1), "0 6 0", "6", "6", "0 0 0", true, "2 6"),
        row("so(3,1)", so(1, 1, 1, -1), "3 3 0", "6", "6", "0 0 0", true, "2 6"),
        // e(3) has a second invariant form, of signature (3, 3): Ball, A Treatise on Screws, 1900.
        row("iso(3)", iso(1, 1, 1), "0 3 3", "6", "6", "0 3 3", true, "2 6"),
        // Three-dimensional gravity as a gauge theory: Witten 1988.
        row("iso(2,1)", iso(1, 1, -1), "2 1 3", "6", "6", "0 3 3", true, "2 6"),
        row("Poincare", iso(1, 1, 1, -1), "3 3 4", "10", "10", "0 4 4", true, "2 6"),
        row("Galilei", Samples.galilei(3), "0 3 7", "10 9", "10 9", "0 7 7", true, "3 7"),
        row("sl(3,R)", Samples.sl(3), "5 3 0", "8", "8", "0 0 0", true, "1 8"),
        row(
            "borel of gl(3)",
            Samples.upper(3, true),
            "2 0 4",
            "6 3 1 0",
            "6 3",
            "1 6 4",
            false,
            "6 3"),
        row(
            "strictly upper 4x4",
            Samples.upper(4, false),
            "0 0 6",
            "6 3 0",
            "6 3 1 0",
            "1 6 6",
            true,
            "6 3"),
        // Classes of Patera, Sharp, Winternitz and Zassenhaus 1976.
        row("A_4,1", "2 4 1, 3 4 2", "0 0 4", "4 2 0", "4 2 1 0", "1 4 4", true, "3 2"),
        row("A_4,3", "1 4 1, 3 4 2", "1 0 3", "4 2 0", "4 2 1", "1 4 3", false, "3 2"),
        row(
            "A_4,4",
            "1 4 1, 2 4 1, 2 4 2, 3 4 2, 3 4 3",
            "1 0 3",
            "4 3 0",
            "4 3",
            "0 4 3",
            false,
            "1 1"),
        row("A_4,8", "2 3 1, 2 4 2, 3 4 3 -1", "1 0 3", "4 3 1 0", "4 3", "1 4 3", true, "2 4"),
        row("A_4,10", "2 3 1, 2 4 3 -1, 3 4 2", "0 1 3", "4 3 1 0", "4 3", "1 4 3", true, "2 4"),
        row(
            "A_4,12",
            "1 3 1, 2 3 2, 1 4 2 -1, 2 4 1",
            "1 1 2",
            "4 2 0",
            "4 2",
            "0 4 2",
            false,
            "3 2"));
  }

  private static Brackets bianchi(long a, long n2, long n3) {
    return Samples.bianchi(a, n2, n3);
  }

  private static Brackets so(long... metric) {
    return Samples.rotations(metric, false);
  }

  private static Brackets iso(long... metric) {
    return Samples.rotations(metric, true);
  }

  private static Arguments row(
      String name,
      Object algebra,
      String signature,
      String derived,
      String lower,
      String dimensions,
      boolean unimodular,
      String forms) {
    Brackets b = algebra instanceof String text ? Brackets.of(4, text) : (Brackets) algebra;
    return Arguments.of(name, b, signature, derived, lower, dimensions, unimodular, forms);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("facts")
  void factsAreThoseOfTheTextbooks(
      String name,
      Brackets algebra,
      String signature,
      String derived,
      String lower,
      String dimensions,
      boolean unimodular,
      String forms) {
    PointFacts f = algebra.facts();
    Signature s = f.killing().signature().orElseThrow();
    assertEquals(signature, s.plus() + " " + s.minus() + " " + s.zero(), "signature");
    assertEquals(derived, text(f.derivedSeries()), "derived series");
    assertEquals(lower, text(f.lowerCentralSeries()), "lower central series");
    assertEquals(
        dimensions,
        f.centre() + " " + f.radical() + " " + f.nilradical(),
        "centre, radical, nilradical");
    assertEquals(unimodular, f.unimodular(), "unimodular");
    assertTrue(f.invariantForms().maximalRank().proved());
    assertEquals(
        forms,
        f.invariantForms().dimension() + " " + f.invariantForms().maximalRank().rank(),
        "invariant forms");
  }

  private static String text(List<Integer> numbers) {
    return String.join(" ", numbers.stream().map(String::valueOf).toList());
  }

  /** The conventions of dimension 0 are those of the output contract. */
  @Test
  void dimensionZeroIsNotSemisimpleButAllElse() {
    PointFacts f = Samples.abelian(0).facts();
    assertTrue(f.abelian() && f.nilpotent() && f.solvable() && f.reductive() && f.unimodular());
    assertFalse(f.semisimple() || f.compact());
    assertEquals("1", f.killing().determinant());
    assertEquals(List.of(), f.killing().matrix());
  }

  @Test
  void booleansTellTheClassesApart() {
    PointFacts so3 = Samples.so3().facts();
    assertTrue(so3.semisimple() && so3.reductive() && so3.compact());
    assertFalse(so3.solvable() || so3.nilpotent() || so3.abelian());
    PointFacts gl2 = Samples.gl(2).facts();
    assertTrue(gl2.reductive());
    assertFalse(gl2.semisimple() || gl2.compact() || gl2.solvable());
    PointFacts flat = Samples.bianchi(0, 1, 1).facts();
    assertTrue(flat.solvable());
    assertFalse(flat.nilpotent() || flat.reductive() || flat.abelian());
    PointFacts heisenberg = Samples.heisenberg().facts();
    assertTrue(heisenberg.nilpotent() && heisenberg.solvable());
    assertFalse(heisenberg.abelian() || heisenberg.reductive());
  }

  /** Killing form of sl(2) in h, e, f: Humphreys, section 5.1, example: determinant -128. */
  @Test
  void killingMatrixOfSl2IsThatOfTheTextbook() {
    PointFacts.Killing k = Samples.sl2().facts().killing();
    assertEquals(
        List.of(List.of("8", "0", "0"), List.of("0", "0", "4"), List.of("0", "4", "0")),
        k.matrix());
    assertEquals("-128", k.determinant());
  }

  /** With y_i = s_i e_i and a denominator d the form falls by s_i s_j d^2. */
  @Test
  void denominatorAndScaleEnterTheValuesOnly() {
    StructureConstants<BigInteger> c = Samples.sl2().overIntegers();
    StructureConstants<BigInteger> scaled =
        new StructureConstants<>(
            c.domain(),
            3,
            c.brackets(),
            BigInteger.valueOf(-3),
            List.of(BigInteger.TWO, BigInteger.ONE, BigInteger.valueOf(-5)));
    PointFacts f = PointAnalysis.of(scaled, 4, new RationalNumbers(), new RationalNumbers());
    assertEquals(
        List.of(List.of("2/9", "0", "0"), List.of("0", "0", "-4/45"), List.of("0", "-4/45", "0")),
        f.killing().matrix());
    assertEquals("-32/18225", f.killing().determinant());
    assertEquals(Optional.of(new Signature(2, 1, 0)), f.killing().signature());
    assertEquals(4, f.generators());
  }

  @Test
  void complexAlgebraHasNoSignature() {
    PointFacts f = PointAnalysis.complex(Samples.so3().overIntegers(), 3, new RationalNumbers());
    assertEquals(Optional.empty(), f.killing().signature());
    assertFalse(f.compact());
    assertTrue(f.semisimple());
  }

  /** A wrong order of the numbers must not pass for a signature. */
  @Test
  void signatureAndRankMustAgree() {
    org.junit.jupiter.api.Assertions.assertThrows(
        IllegalStateException.class,
        () -> PointAnalysis.of(Samples.so3().overIntegers(), 3, v -> 0, new RationalNumbers()));
  }

  /** The centre of the oscillator algebra is its fourth basis vector. */
  @Test
  void idealsHoldTheRightVectors() {
    AlgebraFacts<BigInteger> f = AlgebraFacts.of(Samples.oscillator().overIntegers());
    Vectors<BigInteger> v = new Vectors<>(new Integers());
    assertTrue(f.centre().contains(v.unit(3)));
    assertFalse(f.centre().contains(v.unit(2)));
    assertTrue(f.nilradical().contains(f.derived()));
    assertFalse(f.nilradical().contains(v.unit(0)));
    assertTrue(f.killingKernel().contains(v.unit(1)));
  }
}
