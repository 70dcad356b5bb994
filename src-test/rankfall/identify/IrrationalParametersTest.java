package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Map;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Parameters that are no rational numbers, or belong to algebras with irrational constants. The
 * values due are roots of polynomials that the brackets show: trace, determinant and eigenvalues
 * are worked out beside the case. Classes: Patera, Sharp, Winternitz and Zassenhaus 1976 (from
 * memory).
 */
class IrrationalParametersTest {
  private static final String HEAD = "family: test\ngenerators: [e1, e2, e3, e4]\nbrackets: |\n  ";

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '"',
      value = {
        // eigenvalues of [[1,1],[1,0]]: golden ratio g and -1/g; ratio -1/g^2 = (sqrt(5) - 3)/2
        "A_{4,9}, b = root(x^2 + 3*x + 1, -0.38196601)"
            + " | [e2,e3] = e1; [e1,e4] = e1; [e2,e4] = e2 + e3; [e3,e4] = e2",
        // eigenvalues 1 +- sqrt(2) i
        "A_{4,11}, a = root(2*x^2 - 1, 0.70710678)"
            + " | [e2,e3] = e1; [e1,e4] = 2*e1; [e2,e4] = e2 - 2*e3; [e3,e4] = e2 + e3",
        // 1, sqrt(2), -sqrt(2): over sqrt(2): -1 and 1/sqrt(2)
        "A_{4,5}, a = -1, b = root(2*x^2 - 1, 0.70710678)"
            + " | [e1,e4] = e1; [e2,e4] = 2*e3; [e3,e4] = e2",
        // x^3 - 2: real root c, pair -c/2 +- i sqrt(3) c/2: a = 2/sqrt(3), b = -1/sqrt(3), turned
        "A_{4,6}, a = root(3*x^2 - 4, -1.15470054), b = root(3*x^2 - 1, 0.57735027)"
            + " | [e1,e4] = e2; [e2,e4] = e3; [e3,e4] = 2*e1",
        // 2, 1 +- sqrt(2) i
        "A_{4,6}, a = root(x^2 - 2, 1.41421356), b = root(2*x^2 - 1, 0.70710678)"
            + " | [e1,e4] = 2*e1; [e2,e4] = e2 - 2*e3; [e3,e4] = e2 + e3",
        // constants with a root: all eigenvalues times sqrt(2)
        "A_{4,5}, a = -1/2, b = 1/3"
            + " | [e1,e4] = 6*sqrt(2)*e1; [e2,e4] = 2*sqrt(2)*e2; [e3,e4] = -3*sqrt(2)*e3",
        "A_{4,2}, a = root(x^2 - 2, 1.41421356)"
            + " | [e1,e4] = sqrt(2)*e1; [e2,e4] = e2; [e3,e4] = e2 + e3",
        "A_{4,5}, a = root(2*x^2 - 1, -0.70710678), b = 1"
            + " | [e1,e4] = sqrt(2)*e1; [e2,e4] = sqrt(2)*e2; [e3,e4] = -e3",
        "A_{4,6}, a = 1, b = 1"
            + " | [e1,e4] = sqrt(3)*e1; [e2,e4] = sqrt(3)*e2 - sqrt(3)*e3;"
            + " [e3,e4] = sqrt(3)*e2 + sqrt(3)*e3",
        "A_{4,9}, b = root(2*x^2 - 1, 0.70710678)"
            + " | [e2,e3] = e1; [e1,e4] = (1 + sqrt(2))*e1; [e2,e4] = e2; [e3,e4] = sqrt(2)*e3",
        // t = 2 sqrt(2), d = 3: h = t^2/(4 d - t^2) = 8/4
        "Bianchi VII_h + R, h = 2" + " | [e2,e4] = sqrt(2)*e2 - e3; [e3,e4] = e2 + sqrt(2)*e3",
        // h = -((1 + sqrt(2))/(1 - sqrt(2)))^2 = -(17 + 12 sqrt(2))
        "Bianchi VI_h + R, h = root(x^2 + 34*x + 1, -33.97056275)"
            + " | [e2,e4] = e2; [e3,e4] = sqrt(2)*e3",
      })
  void parameterIsTheExactNumber(String due, String brackets) {
    ExactAlgebra g = PointAlgebra.of(HEAD + brackets.replace("; ", "\n  ") + "\n", Map.of());
    TypeName name = AlgebraNames.of(g).orElseThrow();
    assertEquals(due, name.name());
    assertEquals(name, AlgebraNames.of(Turned.of(g, new Random(5), 6)).orElseThrow());
  }
}
