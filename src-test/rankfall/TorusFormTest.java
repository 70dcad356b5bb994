package rankfall;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.Forms.Angle;
import rankfall.Forms.Positivity;
import rankfall.Forms.Roots;
import rankfall.Forms.TorusForm;
import rankfall.Forms.WithoutRoots;
import rankfall.spec.SpecException;

/** Torus, dual form and roots against the tables of the literature. */
class TorusFormTest {

  private static List<String> cells(List<Analysis.MatrixEntry> entries) {
    return entries.stream().map(e -> e.row() + " " + e.column() + " " + e.value()).toList();
  }

  /** sl(3): K = [[12,6],[6,12]] since K = 6 tr (Humphreys, sec. 6, exercise 7; from memory). */
  @Test
  void formOfTheDiagonalOfOrderThree() throws IOException, SpecException {
    TorusForm t = FormSpecs.torus(Files.readString(Path.of("specs", "special-linear-3.yaml")));
    assertFalse(t.imaginary());
    assertEquals(List.of("0 0 12", "0 1 6", "1 1 12"), cells(t.form()));
    assertEquals(List.of("0 0 1/9", "0 1 -1/18", "1 1 1/9"), cells(t.dual().orElseThrow()));
    assertEquals(List.of(60), t.angles().stream().map(a -> a.degrees().orElseThrow()).toList());
    assertEquals(
        List.of(120), t.dualAngles().stream().map(a -> a.degrees().orElseThrow()).toList());
    assertEquals(new Positivity(true, List.of()), t.positive().orElseThrow());
    // by hand: h13/sqrt(12), (2 h23 - h13)/6
    assertEquals("[1, 0]", t.orthonormal().get(0).coefficients().toString());
    assertEquals("12", t.orthonormal().get(0).squaredLength().toString());
    assertTrue(t.orthonormal().get(0).rationalLength().isEmpty());
    assertEquals("[-1, 2]", t.orthonormal().get(1).coefficients().toString());
    assertEquals("6", t.orthonormal().get(1).rationalLength().orElseThrow().toString());
    // sharp of (1, -1) is K^-1 (1, -1) = (1/6, -1/6), of squared length 1/3
    assertEquals("k12", t.covectors().get(2).name());
    assertEquals("[1/6, -1/6]", t.covectors().get(2).sharp().toString());
    assertEquals("1/3", t.covectors().get(2).squaredLength().toString());
  }

  /**
   * Ratio of the squared lengths of simple roots and the angle between neighbours: Humphreys,
   * Introduction to Lie Algebras and Representation Theory, sec. 9.4, table 1, and Cartan matrices,
   * sec. 11.4; numbers of positive roots and highest roots, sec. 12.2, tables 1 and 2 (from
   * memory). A long root has the squared length 1/h under the dual of the Killing form, h the dual
   * Coxeter number: Kac, Infinite dimensional Lie algebras, ch. 6 (from memory).
   */
  static Stream<Arguments> systems() {
    return Stream.of(
        Arguments.of(
            FormSpecs.sl(3), "A2", "[[2, -1], [-1, 2]]", "[1/3, 1/3]", 120, 3, "[1, 1]", false),
        Arguments.of(
            FormSpecs.so5(), "B2", "[[2, -2], [-1, 2]]", "[1/3, 1/6]", 135, 4, "[1, 2]", true),
        Arguments.of(
            FormSpecs.g2(), "G2", "[[2, -1], [-3, 2]]", "[1/12, 1/4]", 150, 6, "[3, 2]", true),
        Arguments.of(
            FormSpecs.sl(4),
            "A3",
            "[[2, -1, 0], [-1, 2, -1], [0, -1, 2]]",
            "[1/4, 1/4, 1/4]",
            120,
            6,
            "[1, 1, 1]",
            false));
  }

  @ParameterizedTest(name = "{1}")
  @MethodSource("systems")
  void rootsAreThoseOfTheTables(
      String spec,
      String type,
      String cartan,
      String lengths,
      int angle,
      int positive,
      String highest,
      boolean imaginary)
      throws SpecException {
    TorusForm t = FormSpecs.torus(spec);
    Roots r = (Roots) t.roots();
    assertEquals(type, r.type());
    assertEquals(cartan, r.cartan().toString());
    assertEquals(lengths, r.squaredLengths().toString());
    int fourfold = r.cartan().get(0).get(1) * r.cartan().get(1).get(0);
    assertEquals(angle, List.of(90, 120, 135, 150).get(fourfold));
    assertEquals(positive, r.positive().size());
    assertEquals(highest, r.positive().get(positive - 1).toString());
    assertEquals(imaginary, t.imaginary());
  }

  /** Two copies of so(3): A1 + A1, simple roots at right angles (Humphreys, sec. 9.4, table 1). */
  @Test
  void sumOfTwoIdeals() throws SpecException {
    Roots r =
        FormSpecs.roots(
            """
            family: two-rotors
            brackets: |
              [X1, X2] = X3
              [X2, X3] = X1
              [X3, X1] = X2
              [Y1, Y2] = Y3
              [Y2, Y3] = Y1
              [Y3, Y1] = Y2
            torus: [X3, Y3]
            """);
    assertEquals("A1 + A1", r.type());
    assertEquals("[[2, 0], [0, 2]]", r.cartan().toString());
    // K(X3, X3) = -2, so i X3 has squared length 2 and the root, 1 on it, 1/2
    assertEquals("[1/2, 1/2]", r.squaredLengths().toString());
  }

  /** Eigenvalues of ad Z are the roots of x^2 = -a*b; K(Z, Z) = -2*a*b by hand. */
  @Test
  void conditionsAndRootsOfAFamily() throws SpecException {
    TorusForm t =
        FormSpecs.torus(
            """
            family: stretched
            parameters: [a, b, c]
            where: ["c != 0"]
            brackets: |
              [X, Y] = c*Z
              [Y, Z] = a*X
              [Z, X] = b*Y
            torus: [Z]
            """);
    assertTrue(t.imaginary());
    assertEquals(List.of("0 0 2*a*b"), cells(t.form()));
    assertEquals("[a*b > 0]", t.positive().orElseThrow().conditions().toString());
    WithoutRoots w = assertInstanceOf(WithoutRoots.class, t.roots());
    assertTrue(w.reason().contains("neither all rational"), w.reason());
  }

  /** With b = a the eigenvalues are i*a and -i*a, and the conditions of the spec are not told. */
  @Test
  void conditionThatFollowsFromTheSpecIsDropped() throws SpecException {
    TorusForm t =
        FormSpecs.torus(
            """
            family: round
            parameters: [a]
            where: ["a > 0"]
            brackets: |
              [X, Y] = Z
              [Y, Z] = a*X
              [Z, X] = a*Y
            torus: [Z]
            """);
    assertEquals(new Positivity(true, List.of()), t.positive().orElseThrow());
    Roots r = (Roots) t.roots();
    assertEquals("A1", r.type());
    assertEquals("[[a]]", r.simple().toString());
    assertEquals("[1/2]", r.squaredLengths().toString());
  }

  /** K = 6 tr by hand: the angle is 60 or 120 degrees, by the sign of the parameter. */
  @Test
  void angleWithAParameter() throws SpecException {
    String spec =
        FormSpecs.sl(3)
            .replace("family: sl\n", "family: sl\nparameters: [u]\nwhere: [\"u != 0\"]\n")
            .replace("H2: \"E(2,2)", "H2: \"u*E(2,2)")
            .replace("- E(3,3)\"", "- u*E(3,3)\"");
    TorusForm t = FormSpecs.torus(spec);
    Angle a = t.angles().get(0);
    assertEquals("-6*u", a.product().toString());
    assertEquals("1/4", a.squaredCosine().orElseThrow().toString());
    assertEquals(List.of("0 0 12", "0 1 -6*u", "1 1 12*u^2"), cells(t.form()));
    assertTrue(a.degrees().isEmpty());
  }

  @Test
  void elementThatIsNotInTheBasisOfTheComponentIsUnderstood() throws SpecException {
    String spec = FormSpecs.sl(3).replace("torus: [H1, H2]", "torus: [H1, H3]");
    TorusForm t =
        FormSpecs.torus(spec.replace("torus:", "  H3: \"E(1,1) + E(2,2) - 2*E(3,3)\"\ntorus:"));
    // K = 6 tr: tr(H1 H3) = 0, tr(H3^2) = 6
    assertEquals(List.of("0 0 12", "1 1 36"), cells(t.form()));
    assertEquals("A2", ((Roots) t.roots()).type());
  }

  @Test
  void torusThatIsNotItsOwnCentraliserHasNoRoots() throws SpecException {
    TorusForm t = FormSpecs.torus(FormSpecs.sl(3).replace("[H1, H2]", "[H1]"));
    assertEquals(
        "The torus is no Cartan subalgebra: its centraliser has dimension 2.",
        ((WithoutRoots) t.roots()).reason());
    assertEquals(List.of("0 0 12"), cells(t.form()));
  }

  @Test
  void elementsThatDoNotCommuteAreAFault() throws SpecException {
    Analysis a = FormSpecs.analysis(FormSpecs.sl(3).replace("[H1, H2]", "[H1, X12]"));
    assertEquals(Analysis.Status.FAILED, a.status());
    assertEquals(
        "test.yaml:12:13: 'H1' and 'X12' in 'torus' do not commute; list commuting generators, or"
            + " leave one of the two out",
        a.message());
  }

  @Test
  void dependentElementsAreAFault() throws SpecException {
    String spec = FormSpecs.sl(3).replace("torus: [H1, H2]", "torus: [H1, H3]");
    Analysis a =
        FormSpecs.analysis(spec.replace("torus:", "  H3: \"2*E(1,1) - 2*E(2,2)\"\ntorus:"));
    assertEquals(Analysis.Status.FAILED, a.status());
    assertTrue(
        a.message().startsWith("test.yaml:13:13: 'H3' in 'torus' is a combination of"),
        a.message());
  }

  /** The complex span has no positive form; roots are told all the same. */
  @Test
  void complexGround() throws SpecException {
    TorusForm t = FormSpecs.torus(FormSpecs.sl(3).replace("order: 3", "ground: complex\norder: 3"));
    assertTrue(t.positive().isEmpty() && t.orthonormal().isEmpty());
    assertEquals("A2", ((Roots) t.roots()).type());
  }
}
