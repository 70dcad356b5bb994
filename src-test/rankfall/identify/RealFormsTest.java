package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.identify.SimpleType.Series;

/**
 * The table of real forms against the maximal compact subalgebras k of Helgason 1978, chapter X,
 * table V: the character is dim g - 2 dim k.
 */
class RealFormsTest {
  private static int so(int n) {
    return n * (n - 1) / 2;
  }

  private static int u(int n) {
    return n * n;
  }

  private static int sp(int n) {
    return n * (2 * n + 1);
  }

  private static void holds(String name, SimpleType type, int compact) {
    RealForm form =
        RealForms.of(type).stream()
            .filter(f -> f.name().equals(name) || f.otherNames().contains(name))
            .findFirst()
            .orElseThrow(() -> new AssertionError("no " + name));
    assertEquals(type.dimension() - 2 * compact, form.character(), name);
  }

  private static String two(String letters, int p, int q) {
    return q == 0 ? letters + "(" + p + ")" : letters + "(" + p + "," + q + ")";
  }

  @Test
  void charactersOfTheClassicalForms() {
    for (int n = 2; n <= 9; n++) {
      SimpleType a = new SimpleType(Series.A, n - 1);
      for (int q = 0; q <= n / 2; q++) {
        holds(two("su", n - q, q), a, u(n - q) + u(q) - 1);
      }
      holds("sl(" + n + ",R)", a, so(n));
      if (n % 2 == 0) {
        holds("su*(" + n + ")", a, sp(n / 2));
      }
    }
    for (int n = 5; n <= 13; n++) {
      if (n != 6) {
        SimpleType t = new SimpleType(n % 2 == 1 ? Series.B : Series.D, n / 2);
        for (int q = 0; q <= n / 2; q++) {
          holds(two("so", n - q, q), t, so(n - q) + so(q));
        }
        if (n % 2 == 0) {
          holds("so*(" + n + ")", t, u(n / 2));
        }
      }
    }
    for (int n = 2; n <= 6; n++) {
      SimpleType t = n == 2 ? new SimpleType(Series.B, 2) : new SimpleType(Series.C, n);
      for (int q = 0; q <= n / 2; q++) {
        holds(two("sp", n - q, q), t, sp(n - q) + sp(q));
      }
      holds("sp(" + 2 * n + ",R)", t, u(n));
    }
  }

  /** The names of type D_3 are names of type A_3 (Helgason, chapter X, section 6.4). */
  @ParameterizedTest
  @CsvSource({
    "'so(6)', 15",
    "'so(5,1)', 10",
    "'so(4,2)', 7",
    "'so(3,3)', 6",
    "'so*(6)', 9",
    "'su*(4)', 10"
  })
  void orthogonalFormsOfDimension15(String name, int compact) {
    holds(name, new SimpleType(Series.A, 3), compact);
  }

  @ParameterizedTest
  @CsvSource({
    "e6(6), 36",
    "e6(2), 38",
    "e6(-14), 46",
    "e6(-26), 52",
    "e6(-78), 78",
    "e7(7), 63",
    "e7(-5), 69",
    "e7(-25), 79",
    "e7(-133), 133",
    "e8(8), 120",
    "e8(-24), 136",
    "e8(-248), 248",
    "f4(4), 24",
    "f4(-20), 36",
    "f4(-52), 52",
    "g2(2), 6",
    "g2(-14), 14"
  })
  void charactersOfTheExceptionalForms(String name, int compact) {
    Series series = Series.valueOf(name.substring(0, 1).toUpperCase(java.util.Locale.ROOT));
    holds(name, new SimpleType(series, name.charAt(1) - '0'), compact);
  }

  /**
   * Up to dimension 200 type and character leave two forms only twice: 2n is a square for D_n, n =
   * 9, and (p - q)^2 = N + 2 for A_13 (from the formulas of table V).
   */
  @Test
  void typeAndCharacterNearlyAlwaysDecide() {
    List<String> open = new ArrayList<>();
    for (int dimension = 1; dimension <= 200; dimension++) {
      for (SimpleType t : SimpleType.ofDimension(dimension)) {
        Map<Integer, List<String>> byCharacter = new TreeMap<>();
        RealForms.of(t)
            .forEach(
                f ->
                    byCharacter
                        .computeIfAbsent(f.character(), c -> new ArrayList<>())
                        .add(f.name()));
        byCharacter.values().stream()
            .filter(l -> l.size() > 1)
            .forEach(l -> open.add(l.toString()));
      }
    }
    assertEquals(List.of("[so(12,6), so*(18)]", "[su(9,5), su*(14)]"), open);
  }

  /** Helgason, chapter X, table V: dim g of the last column. */
  @Test
  void dimensionsThatAreShared() {
    assertEquals("[B3, C3]", SimpleType.ofDimension(21).toString());
    assertEquals("[B6, C6, E6]", SimpleType.ofDimension(78).toString());
    assertEquals("[A10, D8]", SimpleType.ofDimension(120).toString());
    assertTrue(SimpleType.ofDimension(7).isEmpty());
    assertEquals(
        List.of(1, 1, 1, 1),
        IntStream.of(3, 8, 14, 52).mapToObj(d -> SimpleType.ofDimension(d).size()).toList());
  }
}
