package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Levi factors whose simple ideals are conjugate over the field of the constants. */
class ConjugateIdealsTest {
  /** Matrices that keep a diagonal form, and translations. */
  private static String motions(String ground, List<String> form) {
    int n = form.size();
    StringBuilder out = new StringBuilder("family: test\n" + ground + "order: " + (n + 1));
    out.append("\nmatrices:\n");
    for (int i = 1; i <= n; i++) {
      out.append("  P%d: \"E(%d,%d)\"\n".formatted(i, i, n + 1));
      for (int j = i + 1; j <= n; j++) {
        out.append(
            "  M%d%d: \"(%s)*E(%d,%d) - (%s)*E(%d,%d)\"\n"
                .formatted(i, j, form.get(j - 1), i, j, form.get(i - 1), j, i));
      }
    }
    return out.toString();
  }

  /**
   * The motions of a quadratic form of order 4, whose ideals are conjugate over the field with the
   * root of its determinant. The real form is told by the signature alone: multiples of the basis
   * vectors by square roots of the entries' absolute values are a change of basis, an identity.
   */
  @ParameterizedTest
  @CsvSource(
      delimiter = ':',
      value = {
        "1; 1; 1; 1 : so(4) |x R^4",
        "1; 1; 1; 2 : so(4) |x R^4",
        "1; 1; 1; 3 : so(4) |x R^4",
        "2; 3; 5; 7 : so(4) |x R^4",
        "1; 1; -1; -1 : so(2,2) |x R^4",
        "1; 1; -1; -2 : so(2,2) |x R^4",
        "1; -1; 1; -3 : so(2,2) |x R^4",
        "3; -2; -5; 1 : so(2,2) |x R^4",
        "1; 1; 1; -2 : so(3,1) |x R^4",
        "1; 1; 1; 1 + sqrt(2) : so(4) |x R^4",
        "1; 1; 1; 1 - sqrt(2) : so(3,1) |x R^4",
        "1; -1; sqrt(2); -3 : so(2,2) |x R^4",
        "1; 1; -1; 1 - sqrt(2) : so(2,2) |x R^4",
        "1; 1; 1; sqrt(2)*sqrt(2) : so(4) |x R^4",
      })
  void motionsOfAFormOfOrderFour(String form, String due) {
    ExactAlgebra g = PointAlgebra.of(motions("", List.of(form.split("; "))), Map.of());
    for (int seed = 0; seed < 3; seed++) {
      assertEquals(due, LeviNames.of(Turned.of(g, new Random(seed), 4 * seed)).name());
    }
  }

  /** Over the complex numbers all forms are one (change of basis, an identity). */
  @ParameterizedTest
  @CsvSource({"1; 1; 1; 1", "1; 1; 1; 2", "1; 1; 1; -3", "1; 2; -3; sqrt(2)"})
  void complexMotions(String form) {
    String spec = motions("ground: complex\n", List.of(form.split("; ")));
    assertEquals("so(4,C) |x C^4", LeviNames.of(PointAlgebra.of(spec, Map.of())).name());
  }

  /**
   * The motions of space over the ring of numbers modulo a polynomial whose roots are real and
   * differ: as many copies as there are roots, by the Chinese remainder theorem.
   *
   * @param relation the coefficients of the highest power by the lower ones
   */
  @ParameterizedTest
  @CsvSource({"1 0", "2 0", "3 0", "1 1", "-1 3 0"})
  void motionsOverAProductOfFields(String relation) {
    int[] top = IntStream.of(ints(relation)).toArray();
    int d = top.length;
    List<String> names = new ArrayList<>();
    StringBuilder brackets = new StringBuilder();
    for (int k = 0; k < d; k++) {
      for (int i = 0; i < 3; i++) {
        names.add("J" + i + "_" + k);
        names.add("P" + i + "_" + k);
      }
    }
    for (int i = 0; i < 3; i++) {
      int j = (i + 1) % 3;
      for (int k = 0; k < d; k++) {
        for (int l = 0; l < d; l++) {
          int[] power = power(top, k + l);
          brackets.append(bracket("J" + i, "J" + j, "J" + (3 - i - j), k, l, power));
          brackets.append(bracket("J" + i, "P" + j, "P" + (3 - i - j), k, l, power));
          brackets.append(bracket("P" + i, "J" + j, "P" + (3 - i - j), k, l, power));
        }
      }
    }
    String spec = "family: test\ngenerators: " + names + "\nbrackets: |\n" + brackets;
    String due = String.join(" + ", java.util.Collections.nCopies(d, "(so(3) |x R^3)"));
    ExactAlgebra g = PointAlgebra.of(spec, Map.of());
    assertEquals(due, LeviNames.of(g).name());
    assertEquals(due, LeviNames.of(Turned.of(g, new Random(3), 5)).name());
  }

  private static int[] ints(String text) {
    return java.util.Arrays.stream(text.split(" ")).mapToInt(Integer::parseInt).toArray();
  }

  /** The coefficients of a power of the root. */
  private static int[] power(int[] top, int exponent) {
    int d = top.length;
    int[] out = new int[d];
    out[0] = 1;
    for (int e = 0; e < exponent; e++) {
      int carry = out[d - 1];
      for (int k = d - 1; k >= 0; k--) {
        out[k] = (k > 0 ? out[k - 1] : 0) + carry * top[k];
      }
    }
    return out;
  }

  private static String bracket(String a, String b, String c, int k, int l, int[] power) {
    StringBuilder sum = new StringBuilder();
    for (int m = 0; m < power.length; m++) {
      if (power[m] != 0) {
        sum.append(sum.isEmpty() ? "" : " + ").append("(%d)*%s_%d".formatted(power[m], c, m));
      }
    }
    return "  [%s_%d, %s_%d] = %s\n".formatted(a, k, b, l, sum.isEmpty() ? "0" : sum);
  }
}
