package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Map;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The classes of Patera, Sharp, Winternitz and Zassenhaus, J. Math. Phys. 17 (1976) 986, tables I
 * and II: brackets and ranges of the parameters from memory.
 */
class FourDimensionalTest {

  private static String spec(int n, String brackets) {
    String generators = IntStream.rangeClosed(1, n).mapToObj(i -> "e" + i).toList().toString();
    return "family: test\ngenerators: "
        + generators
        + "\nbrackets: |\n  "
        + brackets.replace("; ", "\n  ")
        + "\n";
  }

  private static TypeName name(String brackets) {
    return AlgebraNames.of(PointAlgebra.of(spec(4, brackets), Map.of())).orElseThrow();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '"',
      value = {
        "A_{4,1} | [e2,e4] = e1; [e3,e4] = e2",
        "A_{4,2}, a = 1 | [e1,e4] = e1; [e2,e4] = e2; [e3,e4] = e2 + e3",
        "A_{4,2}, a = -2 | [e1,e4] = -2*e1; [e2,e4] = e2; [e3,e4] = e2 + e3",
        "A_{4,2}, a = 3/2 | [e1,e4] = 3*e1; [e2,e4] = 2*e2; [e3,e4] = e2 + 2*e3",
        "A_{4,3} | [e1,e4] = e1; [e3,e4] = e2",
        "A_{4,4} | [e1,e4] = e1; [e2,e4] = e1 + e2; [e3,e4] = e2 + e3",
        "A_{4,5}, a = 1, b = 1 | [e1,e4] = e1; [e2,e4] = e2; [e3,e4] = e3",
        "A_{4,5}, a = 1/2, b = 1 | [e1,e4] = e1; [e2,e4] = e2; [e3,e4] = 1/2*e3",
        "A_{4,5}, a = -1/2, b = -1/2 | [e1,e4] = e1; [e2,e4] = -1/2*e2; [e3,e4] = -1/2*e3",
        "A_{4,5}, a = -1, b = 1 | [e1,e4] = e1; [e2,e4] = -e2; [e3,e4] = -e3",
        "A_{4,5}, a = -1, b = 1/2 | [e1,e4] = e1; [e2,e4] = 1/2*e2; [e3,e4] = -e3",
        "A_{4,5}, a = -1, b = 1/2 | [e1,e4] = e1; [e2,e4] = -1/2*e2; [e3,e4] = -e3",
        "A_{4,5}, a = -2/3, b = 1/3 | [e1,e4] = -3*e1; [e2,e4] = -1*e2; [e3,e4] = 2*e3",
        "A_{4,5}, a = 1/4, b = 1/2 | [e1,e4] = e1; [e2,e4] = 2*e2; [e3,e4] = 4*e3",
        "A_{4,6}, a = 1, b = 0 | [e1,e4] = e1; [e2,e4] = -e3; [e3,e4] = e2",
        "A_{4,6}, a = 1, b = 0 | [e1,e4] = -e1; [e2,e4] = -e3; [e3,e4] = e2",
        "A_{4,6}, a = 4/3, b = 1/3 | [e1,e4] = 4/3*e1; [e2,e4] = 1/3*e2 - e3; [e3,e4] = e2 + 1/3*e3",
        "A_{4,6}, a = -2, b = 1 | [e1,e4] = 2*e1; [e2,e4] = -e2 - e3; [e3,e4] = e2 - e3",
        "A_{4,7} | [e2,e3] = e1; [e1,e4] = 2*e1; [e2,e4] = e2; [e3,e4] = e2 + e3",
        "A_{4,8} | [e2,e3] = e1; [e2,e4] = e2; [e3,e4] = -e3",
        "A_{4,9}, b = 1 | [e2,e3] = e1; [e1,e4] = 2*e1; [e2,e4] = e2; [e3,e4] = e3",
        "A_{4,9}, b = -1/2 | [e2,e3] = e1; [e1,e4] = 1/2*e1; [e2,e4] = e2; [e3,e4] = -1/2*e3",
        "A_{4,9}, b = 0 | [e2,e3] = e1; [e1,e4] = e1; [e2,e4] = e2",
        "A_{4,9}, b = 2/5 | [e2,e3] = e1; [e1,e4] = -7*e1; [e2,e4] = -2*e2; [e3,e4] = -5*e3",
        "A_{4,10} | [e2,e3] = e1; [e2,e4] = -e3; [e3,e4] = e2",
        "A_{4,11}, a = 1 | [e2,e3] = e1; [e1,e4] = 2*e1; [e2,e4] = e2 - e3; [e3,e4] = e2 + e3",
        "A_{4,11}, a = 1/2 | [e2,e3] = e1; [e1,e4] = -2*e1; [e2,e4] = -e2 - 2*e3; [e3,e4] = 2*e2 - e3",
        "A_{4,12} | [e1,e3] = e1; [e2,e3] = e2; [e1,e4] = -e2; [e2,e4] = e1",
        "aff(1,R) + aff(1,R) | [e1,e2] = e2; [e3,e4] = e4",
        "aff(1,R) + R^2 | [e1,e2] = e2",
        "h3 + R | [e2,e3] = e1",
        "R^4 | [e1,e2] = 0",
        "Bianchi IV + R | [e1,e3] = e1; [e2,e3] = e1 + e2",
        "Bianchi V + R | [e1,e3] = e1; [e2,e3] = e2",
        "Bianchi VI_0 + R | [e1,e3] = e1; [e2,e3] = -e2",
        "Bianchi VI_h + R, h = -9 | [e1,e3] = e1; [e2,e3] = 1/2*e2",
        "Bianchi VII_0 + R | [e1,e3] = -e2; [e2,e3] = e1",
        "Bianchi VII_h + R, h = 4 | [e1,e3] = 2*e1 - e2; [e2,e3] = e1 + 2*e2",
        "sl(2,R) + R | [e1,e3] = -2*e2; [e1,e2] = e1; [e2,e3] = e3",
        "so(3) + R | [e1,e2] = e3; [e2,e3] = e1; [e3,e1] = e2",
      })
  void classInEveryBasis(String due, String brackets) {
    assertEquals(due, name(brackets).name());
    ExactAlgebra g = PointAlgebra.of(spec(4, brackets), Map.of());
    TypeName expected = name(brackets);
    for (int seed = 0; seed < 4; seed++) {
      ExactAlgebra turned = Turned.of(g, new Random(seed), 6);
      assertEquals(expected, AlgebraNames.of(turned).orElseThrow(), "basis " + seed);
    }
  }
}
