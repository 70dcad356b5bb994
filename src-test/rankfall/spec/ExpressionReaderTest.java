package rankfall.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Random;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ExpressionReaderTest {

  /** Reads the text as the only entry of a matrix, through the front door. */
  private static SpecResult readEntry(String entry) {
    String spec =
        "family: probe\nparameters: [a, b, c, t, u]\nmatrices:\n  X: [['" + entry + "']]\n";
    List<SpecResult> results = SpecReader.read("probe.yaml", spec.getBytes(StandardCharsets.UTF_8));
    assertEquals(1, results.size());
    return results.get(0);
  }

  private static Expression entry(String text) {
    Spec spec = ((SpecResult.Read) readEntry(text)).spec();
    Spec.Matrices matrices = (Spec.Matrices) spec.presentation();
    return ((Spec.Rows) matrices.matrices().get(0).body()).entries().get(0).get(0);
  }

  private static Diagnostic onlyFault(String text) {
    List<Diagnostic> faults = ((SpecResult.Faulty) readEntry(text)).diagnostics();
    assertEquals(1, faults.size());
    return faults.get(0);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "a + b*c; (a+(b*c))",
        "a - b - c; ((a-b)-c)",
        "a/b*c; ((a/b)*c)",
        "a/b/c; ((a/b)/c)",
        "-a^2; (-(a^2))",
        "(-a)^2; ((-a)^2)",
        "-a*b; ((-a)*b)",
        "a*-b; (a*(-b))",
        "--a; (-(-a))",
        "+a; a",
        "a^-1; (a^-1)",
        "a^(-1); (a^-1)",
        "a^(2); (a^2)",
        "2^3; (2^3)",
        "a*b^2/c; ((a*(b^2))/c)",
        "a^64; (a^64)",
        "i*a; (i*a)",
        "sqrt(3)/2; (root 3/2)",
        "sqrt(1/4 + 2); root 9|4",
        "cos(t); cos{1t}",
        "exp(2*t - 3*u); exp{2t,-3u}",
        "tanh(-(t + u)*2); tanh{-2t,-2u}",
        "a ; a"
      })
  void bindsAsMathematicsDoes(String text, String tree) {
    assertEquals(tree, ExpressionText.of(entry(text)));
  }

  @ParameterizedTest
  @CsvSource({
    "0.25, 1, 4",
    "1e-3, 1, 1000",
    "1.5E2, 150, 1",
    ".5, 1, 2",
    "7, 7, 1",
    "2e+1, 20, 1",
    "0.1, 1, 10",
    "00012, 12, 1"
  })
  void numbersAreExact(String text, long numerator, long denominator) {
    assertEquals(BigFraction.of(numerator, denominator), ((Expression.Number) entry(text)).value());
  }

  @Test
  void placesSpanTheWrittenText() {
    Expression.Binary sum = (Expression.Binary) entry("a + (b*c)^2");
    assertEquals(new Place("probe.yaml", 4, 9, 11), sum.place());
    Expression.Power power = (Expression.Power) sum.right();
    assertEquals(new Place("probe.yaml", 4, 13, 7), power.place());
    assertEquals(new Place("probe.yaml", 4, 14, 3), power.base().place());
  }

  @Test
  void twoHundredParenthesesAreReadAndOneMoreIsNot() {
    assertEquals("a", ExpressionText.of(entry("(".repeat(200) + "a" + ")".repeat(200))));
    assertEquals(
        "an expression nested over 200 deep",
        onlyFault("(".repeat(201) + "a" + ")".repeat(201)).cause());
    assertEquals("an expression nested over 200 deep", onlyFault("-".repeat(201) + "a").cause());
  }

  @Test
  void aPowerOfAPowerWantsParentheses() {
    assertEquals("a power of a power", onlyFault("a^2^3").cause());
    assertEquals("((a^2)^3)", ExpressionText.of(entry("(a^2)^3")));
  }

  @Test
  void tooLargeNumbersAreRefused() {
    assertEquals("the number is too long", onlyFault("1e99999999").cause());
    assertEquals("the number is too long", onlyFault("1".repeat(6000)).cause());
  }

  /** Long chains become flat trees; their value is that of the chain from the left. */
  @Test
  void longChainsKeepTheirValueAndStayFlat() {
    Random chance = new Random(20240517L);
    for (int length : new int[] {7, 8, 9, 10, 33, 500}) {
      for (String signs : new String[] {"+-", "*/"}) {
        BigFraction value = BigFraction.of(3);
        StringBuilder text = new StringBuilder("3");
        for (int k = 1; k < length; k++) {
          char sign = signs.charAt(chance.nextInt(2));
          int number = 1 + chance.nextInt(9);
          text.append(sign).append(number);
          value =
              switch (sign) {
                case '+' -> value.add(number);
                case '-' -> value.subtract(number);
                case '*' -> value.multiply(number);
                default -> value.divide(number);
              };
        }
        Expression chain = entry(text.toString());
        assertEquals(value, RationalValue.of(chain).orElseThrow(), text.toString());
        assertTrue(depth(chain) <= 10, text.toString());
      }
    }
  }

  private static int depth(Expression e) {
    return e instanceof Expression.Binary b ? 1 + Math.max(depth(b.left()), depth(b.right())) : 0;
  }

  /** Towers of powers are not multiplied out while reading. */
  @Test
  void towersOfPowersStayUnevaluated() {
    String tower = "((((2^64)^64)^64)^64)^64";
    assertEquals("(((((2^64)^64)^64)^64)^64)", ExpressionText.of(entry(tower)));
    assertEquals(
        "sqrt takes a rational number that is not negative",
        onlyFault("sqrt(" + tower + ")").cause());
  }

  @ParameterizedTest
  @CsvSource({
    "7, 7, 1",
    "-3/2, -3, 2",
    "0.25, 1, 4",
    "-1e-3, -1, 1000",
    "+2/4, 1, 2",
    "1/0.5, 2, 1"
  })
  void rationalNumbersOfACommandLineAreExact(String text, long numerator, long denominator) {
    assertEquals(BigFraction.of(numerator, denominator), ExactNumber.of(text).orElseThrow());
  }

  @ParameterizedTest
  @CsvSource({"a", "1/0", "1//2", "''", "1e99999", "--1", "0x1F", "1/-2", "1 2", "."})
  void otherTextsAreNoRationalNumber(String text) {
    assertTrue(ExactNumber.of(text).isEmpty());
  }
}
