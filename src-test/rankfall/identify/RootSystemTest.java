package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.published.ExactPoint;
import rankfall.published.PublishedEntry;
import rankfall.published.PublishedTables;

/** Root systems from coordinates and from algebras. */
class RootSystemTest {
  private static List<BigFraction> vector(int... c) {
    return IntStream.of(c).mapToObj(BigFraction::of).toList();
  }

  private static List<List<BigFraction>> identity(int n) {
    return IntStream.range(0, n)
        .mapToObj(
            i ->
                IntStream.range(0, n)
                    .mapToObj(j -> i == j ? BigFraction.ONE : BigFraction.ZERO)
                    .toList())
        .toList();
  }

  private static List<List<BigFraction>> withNegatives(List<List<BigFraction>> positive) {
    List<List<BigFraction>> out = new ArrayList<>(positive);
    positive.forEach(r -> out.add(r.stream().map(BigFraction::negate).toList()));
    return out;
  }

  /** A_n: e_i - e_j in the coordinates of the simple roots' span (Humphreys, section 12.1). */
  private static List<List<BigFraction>> differences(int n) {
    List<List<BigFraction>> out = new ArrayList<>();
    for (int i = 0; i <= n; i++) {
      for (int j = i + 1; j <= n; j++) {
        int[] c = new int[n + 1];
        c[i] = 1;
        c[j] = -1;
        out.add(vector(c));
      }
    }
    return withNegatives(out);
  }

  /** Humphreys, Introduction to Lie Algebras, section 11.4, table 1. */
  @Test
  void cartanMatricesOfTheBook() {
    assertEquals(
        "[[2, -1], [-1, 2]]", RootSystem.of(differences(2), identity(3)).cartanMatrix().toString());
    RootSystem a3 = RootSystem.of(differences(3), identity(4));
    assertEquals("[[2, -1, 0], [-1, 2, -1], [0, -1, 2]]", a3.cartanMatrix().toString());
    assertEquals("[A3]", a3.types().toString());
    RootSystem b2 =
        RootSystem.of(
            withNegatives(List.of(vector(1, 0), vector(0, 1), vector(1, 1), vector(1, -1))),
            identity(2));
    assertEquals("[[2, -2], [-1, 2]]", b2.cartanMatrix().toString());
    assertEquals("[B2]", b2.types().toString());
    RootSystem g2 =
        RootSystem.of(
            withNegatives(
                List.of(
                    vector(1, -1, 0),
                    vector(1, 0, -1),
                    vector(0, 1, -1),
                    vector(2, -1, -1),
                    vector(1, 1, -2),
                    vector(1, -2, 1))),
            identity(3));
    assertEquals("[[2, -1], [-3, 2]]", g2.cartanMatrix().toString());
    assertEquals("[G2]", g2.types().toString());
  }

  /** Humphreys, section 12.2, table 1: the numbers of positive roots. */
  @ParameterizedTest
  @CsvSource({
    "A, 4, 10",
    "B, 4, 16",
    "C, 4, 16",
    "D, 5, 20",
    "E, 6, 36",
    "E, 7, 63",
    "E, 8, 120",
    "F, 4, 24",
    "G, 2, 6"
  })
  void numbersOfPositiveRoots(SimpleType.Series series, int rank, int count) {
    SimpleType t = new SimpleType(series, rank);
    assertEquals(count, Weights.of(t).positive().size());
    assertEquals(t.dimension(), 2 * count + rank);
  }

  @Test
  void componentsAreTold() {
    RootSystem s = RootSystem.of(withNegatives(List.of(vector(1, 0), vector(0, 1))), identity(2));
    assertEquals("[A1, A1]", s.types().toString());
  }

  @Test
  void vectorsThatAreNoRootsAreRefused() {
    List<List<BigFraction>> turned = withNegatives(List.of(vector(1, 0), vector(3, 1)));
    assertThrows(IllegalArgumentException.class, () -> RootSystem.of(turned, identity(2)));
    List<List<BigFraction>> twice = withNegatives(List.of(vector(1), vector(2)));
    assertThrows(IllegalArgumentException.class, () -> RootSystem.of(twice, identity(1)));
    List<List<BigFraction>> open = List.of(vector(1, 0), vector(0, 1), vector(0, -1));
    assertThrows(IllegalArgumentException.class, () -> RootSystem.of(open, identity(2)));
  }

  /**
   * The roots at the diagonal matrices, listed first in the published families (Humphreys, section
   * 1.2): another road to the type than traces.
   */
  @ParameterizedTest
  @CsvSource({"sl-3-r, A2", "sl-4-r, A3", "sl-5-r, A4", "sp-4-r, B2", "sp-6-r, C3", "sp-8-r, C4"})
  void typesFromRootsAndFromTraces(String id, String type) {
    ExactAlgebra algebra = algebra(id);
    int rank = type.charAt(1) - '0';
    RootSystem roots =
        SplitTorus.roots(
                algebra.integral().orElseThrow(), torus(IntStream.range(0, rank).toArray()))
            .orElseThrow();
    assertEquals("[" + type + "]", roots.types().toString());
    assertEquals(
        type, SimpleIdeals.of(algebra).get(0).type().map(SimpleType::toString).orElse("unknown"));
  }

  /** Three boosts in three planes: B_3 and not C_3. */
  @Test
  void rootsOfSo43AreThoseOfB3() {
    ExactAlgebra algebra = algebra("so-4-3");
    RootSystem roots =
        SplitTorus.roots(
                algebra.integral().orElseThrow(),
                torus(position(1, 5), position(2, 6), position(3, 7)))
            .orElseThrow();
    assertEquals("[B3]", roots.types().toString());
    assertEquals("B3", SimpleIdeals.of(algebra).get(0).type().orElseThrow().toString());
  }

  /** The rotations of so(3) have no real roots. */
  @Test
  void torusThatDoesNotSplitIsTold() {
    assertEquals(
        java.util.Optional.empty(),
        SplitTorus.roots(algebra("so-3-0").integral().orElseThrow(), torus(0)));
  }

  /** The place of the generator L_ij among those of order 7, by i, then j. */
  private static int position(int i, int j) {
    int before = IntStream.range(1, i).map(k -> 7 - k).sum();
    return before + j - i - 1;
  }

  private static List<SortedMap<Integer, BigInteger>> torus(int... places) {
    List<SortedMap<Integer, BigInteger>> out = new ArrayList<>();
    IntStream.of(places).forEach(k -> out.add(new TreeMap<>(java.util.Map.of(k, BigInteger.ONE))));
    return out;
  }

  private static ExactAlgebra algebra(String id) {
    PublishedEntry entry =
        PublishedTables.all().stream().filter(e -> e.id().equals(id)).findFirst().orElseThrow();
    return ExactPoint.of(entry.spec(), new TreeMap<>()).orElseThrow();
  }
}
