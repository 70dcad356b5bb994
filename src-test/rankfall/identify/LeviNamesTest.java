package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.published.ExactPoint;

/**
 * Names of algebras with a radical. The algebras are written down by their definitions, so that the
 * name is right by construction (common practice, no source).
 */
class LeviNamesTest {
  private static final String ROTATIONS = "[J1, J2] = J3\n  [J2, J3] = J1\n  [J3, J1] = J2\n";
  private static final String SL2 = "[e, f] = h\n  [h, e] = 2*e\n  [h, f] = -2*f\n";

  private static ExactAlgebra brackets(String generators, String brackets) {
    String spec =
        "family: test\ngenerators: ["
            + generators
            + "]\nbrackets: |\n  "
            + brackets.strip().replaceAll("\n\\s*", "\n  ")
            + "\n";
    return ExactPoint.of(spec, new TreeMap<>()).orElseThrow();
  }

  private static ExactAlgebra matrices(String text) {
    return ExactPoint.of("family: test\n" + text, new TreeMap<>()).orElseThrow();
  }

  private static String vector(String j, String p) {
    StringBuilder out = new StringBuilder();
    for (int[] c : new int[][] {{1, 2, 3}, {2, 3, 1}, {3, 1, 2}}) {
      out.append("\n[%s%d, %s%d] = %s%d".formatted(j, c[0], p, c[1], p, c[2]));
      out.append("\n[%s%d, %s%d] = -%s%d".formatted(j, c[1], p, c[0], p, c[2]));
    }
    return out.toString();
  }

  @Test
  void smallAbelianAlgebras() {
    assertEquals("R^2", LeviNames.of(brackets("a, b", "[a, b] = 0")).name());
    assertEquals("h3", LeviNames.of(brackets("p, q, z", "[p, q] = z")).name());
  }

  @Test
  void twoVectorsUnderRotations() {
    ExactAlgebra algebra =
        brackets(
            "J1, J2, J3, P1, P2, P3, Q1, Q2, Q3", ROTATIONS + vector("J", "P") + vector("J", "Q"));
    assertEquals("so(3) |x (R^3 + R^3)", LeviNames.of(algebra).name());
  }

  @Test
  void twoMotionAlgebrasSideBySide() {
    ExactAlgebra algebra =
        brackets(
            "J1, J2, J3, P1, P2, P3, L1, L2, L3, Q1, Q2, Q3",
            ROTATIONS + ROTATIONS.replace("J", "L") + vector("J", "P") + vector("L", "Q"));
    TypeName name = LeviNames.of(algebra);
    assertEquals("(so(3) |x R^3) + (so(3) |x R^3)", name.name());
    assertTrue(name.otherNames().contains("(so(3) |x R^3) + iso(3)"));
  }

  @Test
  void directFactorsAreSplitOff() {
    ExactAlgebra algebra =
        brackets("J1, J2, J3, P1, P2, P3, e, f, h, u, v", ROTATIONS + SL2 + vector("J", "P"));
    assertEquals("sl(2,R) + (so(3) |x R^3) + R^2", LeviNames.of(algebra).name());
  }

  /** A vector and an invariant on which a dilation acts: no usual name, so a description. */
  @Test
  void algebrasWithoutNameAreDescribed() {
    ExactAlgebra algebra =
        brackets(
            "J1, J2, J3, P1, P2, P3, D, s",
            ROTATIONS
                + vector("J", "P")
                + "\n[D, P1] = P1\n[D, P2] = P2\n[D, P3] = P3\n[D, s] = 2*s");
    assertEquals(
        "so(3) |x (radical of dimension 5, nilradical of dimension 4, abelian)",
        LeviNames.of(algebra).name());
  }

  /** R^3 + R^3 under sl(3,R) could be twice a module, or the module and its dual. */
  @Test
  void aModuleThatTheNameWouldNotTellIsDescribed() {
    String units =
        "order: 7\nmatrices:\n"
            + "  H1: \"E(1,1) - E(2,2) + E(4,4) - E(5,5)\"\n"
            + "  H2: \"E(2,2) - E(3,3) + E(5,5) - E(6,6)\"\n"
            + "  X12: \"E(1,2) + E(4,5)\"\n  X13: \"E(1,3) + E(4,6)\"\n"
            + "  X21: \"E(2,1) + E(5,4)\"\n  X23: \"E(2,3) + E(5,6)\"\n"
            + "  X31: \"E(3,1) + E(6,4)\"\n  X32: \"E(3,2) + E(6,5)\"\n"
            + "  P1: \"E(1,7)\"\n  P2: \"E(2,7)\"\n  P3: \"E(3,7)\"\n"
            + "  Q1: \"E(4,7)\"\n  Q2: \"E(5,7)\"\n  Q3: \"E(6,7)\"\n";
    assertEquals(
        "sl(3,R) |x (nilpotent radical of dimension 6, abelian)",
        LeviNames.of(matrices(units)).name());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "sl(2,C) |x C^2; [e, f] = h | [h, e] = 2*e | [h, f] = -2*f | [h, v] = v | [h, w] = -w |"
            + " [e, w] = v | [f, v] = w; e, f, h, v, w",
        "sl(2,C) + C; [e, f] = h | [h, e] = 2*e | [h, f] = -2*f; e, f, h, z",
        "sl(2,C); [e, f] = h | [h, e] = 2*e | [h, f] = -2*f; e, f, h"
      })
  void complexAlgebras(String name, String brackets, String generators) {
    String spec =
        "family: test\nground: complex\ngenerators: ["
            + generators
            + "]\nbrackets: |\n  "
            + brackets.replace(" | ", "\n  ")
            + "\n";
    assertEquals(name, LeviNames.of(ExactPoint.of(spec, new TreeMap<>()).orElseThrow()).name());
  }

  /** u(2) is the algebra of a compact group, gl(2,R) is not. */
  @Test
  void compactTypeWithCentre() {
    ExactAlgebra u2 = brackets("J1, J2, J3, z", ROTATIONS);
    assertTrue(LeviNames.compactTypeAndCentre(u2));
    assertEquals("so(3) + R", LeviNames.of(u2).name());
    assertTrue(LeviNames.of(u2).otherNames().contains("u(2)"));
    assertTrue(LeviNames.of(u2).otherNames().contains("compact type + centre"));
    ExactAlgebra gl2 = brackets("e, f, h, z", SL2);
    assertFalse(LeviNames.compactTypeAndCentre(gl2));
    assertTrue(LeviNames.of(gl2).otherNames().contains("gl(2,R)"));
    ExactAlgebra motions = brackets("J1, J2, J3, P1, P2, P3", ROTATIONS + vector("J", "P"));
    assertFalse(LeviNames.compactTypeAndCentre(motions));
  }
}
