package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import rankfall.Analysis;
import rankfall.Analysis.RealPoints;

/**
 * Families at which a partition by hand, or by sampling, goes wrong; no source where none is named.
 */
class TrapsTest {

  private static List<String> exclusions(Analysis.Stratum s) {
    return s.exclusions().stream().map(Analysed::text).toList();
  }

  private static List<RealPoints> realPoints(Analysed family) {
    return family.strata().stream().map(Analysis.Stratum::realPoints).toList();
  }

  /**
   * With all entries non-zero the rotors close on a*d*e = b*c*f only; where generators vanish the
   * span is smaller and closes off that hypersurface or not, as it comes: at a = b = 0 with the
   * others not 0 it does not.
   */
  @Test
  void pointsOfDependenceCloseThoughTheirNeighboursDoNot() {
    Analysed rotors = Analysed.published("stretched-rotors-vanishing");
    assertEquals("a*d*e - b*c*f", Analysed.text(rotors.with(3, 3, 3, 0).equations()));
    assertEquals(6, rotors.all(3, 1, 2, 0).size());
    assertEquals(6, rotors.all(3, 0, 1, 1).size());
    assertEquals(6, rotors.all(2, 0, 0, 2).size());
    assertEquals(
        List.of("a; b; c; d", "a; b; e; f", "c; d; e; f"),
        rotors.all(1, 0, 0, 1).stream().map(s -> Analysed.text(s.equations())).toList());
    assertEquals("a; b; c; d; e; f", Analysed.text(rotors.with(0, 0, 0, 0).equations()));
    assertEquals(23, rotors.strata().size());
    assertTrue(exclusions(rotors.with(3, 3, 3, 0)).contains("a; b"));
  }

  @Test
  void theWholeSpaceIsClosedButNotTheLineOfDependence() {
    Analysed family = Analysed.published("closed-but-not-at-dependence");
    assertEquals(List.of("0 (3,3,3,0)", "a; b (2,1,1,0)"), family.rows());
    assertEquals(List.of("a + b"), exclusions(family.strata().get(0)));
    assertEquals(List.of(), exclusions(family.strata().get(1)));
  }

  @Test
  void theClosedPointsMayBeOpen() {
    Analysed family = Analysed.published("closure-open-locus");
    assertEquals(List.of("0 (3,0,1,1)"), family.rows());
    assertEquals(List.of("a"), exclusions(family.strata().get(0)));
  }

  /** The factor of the determinant stands where there is no algebra. */
  @Test
  void theDeterminantVanishesWhereThereIsNoAlgebra() {
    Analysed pole = Analysed.published("pole-at-dependence");
    assertEquals(List.of("0 (3,3,3,0)"), pole.rows());
    assertEquals(List.of("a"), exclusions(pole.strata().get(0)));
    Analysed tilted = Analysed.published("tilted-generator");
    assertEquals(List.of("0 (3,3,3,0)"), tilted.rows());
    assertEquals(List.of("c"), exclusions(tilted.strata().get(0)));
  }

  /** Ellis and MacCallum 1969: at real points a^2 + 1 is nowhere 0, so III is not in VII_h. */
  @Test
  void strataWithoutRealPointsStay() {
    Analysed six = Analysed.published("bianchi-vi-h");
    assertEquals(
        List.of("0 (3,1,2,0)", "a + 1 (3,1,1,1)", "a - 1 (3,1,1,1)", "a^2 + 1 (3,0,2,0)"),
        six.rows());
    assertEquals(
        List.of(RealPoints.YES, RealPoints.YES, RealPoints.YES, RealPoints.NO), realPoints(six));
    Analysed seven = Analysed.published("bianchi-vii-h");
    assertEquals(
        List.of("0 (3,1,2,0)", "a^2 + 1 (3,1,1,1)", "a + 1 (3,0,2,0)", "a - 1 (3,0,2,0)"),
        seven.rows());
    assertEquals(
        List.of(RealPoints.YES, RealPoints.NO, RealPoints.YES, RealPoints.YES), realPoints(seven));
  }

  /** The two matrices are dependent where u^2 + v^2 = 0, over the reals only where both vanish. */
  @Test
  void theOnlyRealZeroLiesInAnotherStratum() {
    Analysed wall =
        Analysed.text(
            "family: two-squares-matrices\nparameters: [u, v]\norder: 4\nmatrices:\n"
                + "  P: \"u*E(1,2) - v*E(2,1)\"\n  Q: \"v*E(1,2) + u*E(2,1)\"\n");
    for (Analysis.Stratum s : wall.strata()) {
      RealPoints expected =
          Analysed.text(s.equations()).equals("u^2 + v^2") ? RealPoints.NO : RealPoints.YES;
      assertEquals(expected, s.realPoints(), s.toString());
    }
    assertTrue(
        wall.rows().stream().anyMatch(r -> r.startsWith("u^2 + v^2 (")), wall.rows().toString());
    assertTrue(wall.rows().stream().anyMatch(r -> r.startsWith("u; v (")), wall.rows().toString());
  }

  @Test
  void wallsWithoutRationalPointsAreWalls() {
    Analysed line = Analysed.published("wall-irrational");
    assertEquals(List.of("0 (3,3,3,0)", "3*b^2 - 1 (3,1,2,0)"), line.rows());
    assertEquals(List.of(RealPoints.YES, RealPoints.YES), realPoints(line));
    assertTrue(
        line.strata().get(1).witness().get(0).value().startsWith("root(3*x^2 - 1, "),
        line.strata().get(1).witness().toString());
    Analysed circle = Analysed.published("wall-three-circle");
    assertEquals(List.of("0 (3,3,3,0)", "x^2 + y^2 - 3 (3,1,2,0)"), circle.rows());
    assertEquals(List.of(RealPoints.YES, RealPoints.YES), realPoints(circle));
  }

  @Test
  void theConjugateOfAnAlgebraicNumberIsNoWall() {
    Analysed family = Analysed.published("sqrt-difference");
    assertEquals(List.of("0 (3,3,3,0)", "t - sqrt(2) (3,1,2,0)"), family.rows());
  }

  /** Patera, Sharp, Winternitz, Zassenhaus 1976, table I: A_{5,19}. */
  @Test
  void threeOfTheSixStrataOfA519HaveNoRealPoints() {
    Analysed family = Analysed.published("pswz-a5-19");
    assertEquals(
        List.of(
            "0 (5,1,4,0)",
            "a (5,1,4,1)",
            "a - 1 (5,1,3,0)",
            "2*a^2 + b^2 - 2*a + 2 (5,0,4,0)",
            "a; b^2 + 2 (5,0,4,1)",
            "a - 1; b^2 + 2 (5,0,3,0)"),
        family.rows());
    assertEquals(
        List.of(
            RealPoints.YES,
            RealPoints.YES,
            RealPoints.YES,
            RealPoints.NO,
            RealPoints.NO,
            RealPoints.NO),
        realPoints(family));
  }

  /**
   * The Killing form is degenerate throughout, of one rank; derived algebra or centre alone
   * changes.
   */
  @Test
  void strataOfOneRank() {
    assertEquals(
        List.of("0 (3,0,1,1)", "h (3,0,0,3)"), Analysed.published("heisenberg-hbar").rows());
    assertEquals(
        List.of("0 (11,3,10,1)", "m (11,3,9,1)"), Analysed.published("bargmann-3-1").rows());
  }
}
