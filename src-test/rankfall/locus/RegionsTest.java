package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.stream.Collectors;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.Analysis;
import rankfall.Comparison;
import rankfall.PointResult;

class RegionsTest {
  private static final String CLASS_A =
      """
      family: class-a
      parameters: [n1, n2, n3]
      brackets: |
        [X, Y] = n3*Z
        [Y, Z] = n1*X
        [Z, X] = n2*Y
      """;

  /** [X, Y] = Z, [Y, Z] = f X, [Z, X] = g Y. */
  private static String twoFactors(String parameters, String where, String f, String g) {
    return "family: two-factors\nparameters: ["
        + parameters
        + "]\n"
        + (where.isEmpty() ? "" : "where: [\"" + where.replace("; ", "\", \"") + "\"]\n")
        + "brackets: |\n  [X, Y] = Z\n  [Y, Z] = ("
        + f
        + ")*X\n  [Z, X] = ("
        + g
        + ")*Y\n";
  }

  private static List<BigFraction> point(int... x) {
    return java.util.Arrays.stream(x).mapToObj(BigFraction::of).toList();
  }

  private static Set<String> signatures(RegionRows rows, List<BigFraction> at) {
    Set<String> out = new java.util.TreeSet<>();
    for (Analysis.Stratum s : rows.strataAt(at)) {
      rows.of(s).stream()
          .filter(r -> RegionRows.holds(r, at))
          .forEach(r -> out.add(RegionRows.signature(r.signature())));
    }
    return out;
  }

  /**
   * Class A of Bianchi: type IX, so(3), where n1, n2, n3 have one sign, type VIII, sl(2,R), where
   * they do not; with one n zero type VII_0 or VI_0 (Ellis and MacCallum, Commun. Math. Phys. 12
   * (1969) 108, table 1; table from memory). so(3) is compact; the form of sl(2,R) has signature
   * (2,1) (Helgason 1978, ch. X, table V).
   */
  @Test
  void classAOfBianchiByTheSignsOfN() {
    RegionRows rows = RegionRows.of(CLASS_A);
    for (int a : new int[] {-1, 1}) {
      for (int b : new int[] {-1, 1}) {
        for (int c : new int[] {-1, 1}) {
          String expected = a == b && b == c ? "0,3,0" : "2,1,0";
          assertEquals(Set.of(expected), signatures(rows, point(2 * a, b, 3 * c)));
        }
        assertEquals(
            Set.of(a == b ? "0,1,2" : "1,0,2"), signatures(rows, point(a, 0, b)), "VII_0 or VI_0");
      }
    }
    assertTrue(rows.all().stream().allMatch(Analysis.Region::exact));
  }

  /** Two octants of one signature share a row: a product tells them. */
  @Test
  void octantsOfOneSignatureAreMerged() {
    RegionRows rows = RegionRows.of(CLASS_A);
    assertEquals(3, rows.texts("S1").size(), rows.texts("S1").toString());
    assertEquals(List.of("n2*n3 < 0: 1,0,2", "n2*n3 > 0: 0,1,2"), rows.texts("S2"));
  }

  /**
   * Rotations of a metric g: compact where g is definite, so(2,1) elsewhere; the signature of g is
   * that of the diagonal matrix from which a change of basis makes it (Sylvester 1852).
   */
  @Test
  void rotationsOfAMetricBySylvestersLaw() {
    RegionRows rows = new RegionRows(Analysed.shipped("metric-rotations-3"));
    Random random = new Random(7);
    int found = 0;
    for (int k = 0; k < 200; k++) {
      int[] d = {random.nextBoolean() ? 1 : -1, random.nextBoolean() ? 2 : -2, 0};
      d[2] = random.nextBoolean() ? 1 : -3;
      int[][] m = new int[3][3];
      for (int[] row : m) {
        for (int j = 0; j < 3; j++) {
          row[j] = random.nextInt(5) - 2;
        }
      }
      int det =
          m[0][0] * (m[1][1] * m[2][2] - m[1][2] * m[2][1])
              - m[0][1] * (m[1][0] * m[2][2] - m[1][2] * m[2][0])
              + m[0][2] * (m[1][0] * m[2][1] - m[1][1] * m[2][0]);
      if (det != 0) {
        List<BigFraction> g = new ArrayList<>();
        for (int i = 0; i < 3; i++) {
          for (int j = i; j < 3; j++) {
            g.add(
                BigFraction.of(
                    m[0][i] * d[0] * m[0][j]
                        + m[1][i] * d[1] * m[1][j]
                        + m[2][i] * d[2] * m[2][j]));
          }
        }
        boolean definite = d[0] > 0 == d[1] > 0 && d[1] > 0 == d[2] > 0;
        Set<String> said = signatures(rows, g);
        assertTrue(Set.of(definite ? "0,3,0" : "2,1,0").containsAll(said), g + " " + said);
        found += said.size();
      }
    }
    assertTrue(found > 100, "rows held at " + found + " points only");
  }

  /**
   * so(3,2), so(4,1) and so(5) among the kinematical algebras (Bacry and Levy-Leblond 1968; the
   * last is no kinematics): so(p,q) has p*q non-compact directions (Helgason 1978, ch. X, table V).
   */
  @Test
  void kinematicsHaveTheRealFormsOfSo5() {
    RegionRows rows = new RegionRows(Analysed.shipped("kinematics-ten"));
    List<String> signatures =
        rows.of(rows.family().strata().get(0)).stream()
            .map(r -> RegionRows.signature(r.signature()))
            .toList();
    assertEquals(List.of("6,4,0", "4,6,0", "0,10,0"), signatures);
  }

  /** The circle falls into three rows off four points, the two lines a^2 = 2 b^2 into three. */
  @ParameterizedTest
  @CsvSource({"a^2 + b^2 = 1, true", "a^2 = 2*b^2, false"})
  void curvesAreCut(String where, boolean rational) {
    RegionRows rows = RegionRows.of(twoFactors("a, b", where, "a", "b"));
    assertEquals(
        List.of("a < 0: 2,1,0", "a > 0; b < 0: 2,1,0", "a > 0; b > 0: 0,3,0"), rows.texts("S1"));
    boolean noRoot =
        rows.all().stream()
            .flatMap(r -> r.witness().stream())
            .noneMatch(c -> c.value().contains("root"));
    assertEquals(rational, noRoot, "rational points on a circle, none but 0 on the lines");
  }

  /** Above b = a^2, c^2 = a + 1 the product a*c is positive exactly where c > 1. */
  @Test
  void towersAreCut() {
    RegionRows rows = RegionRows.of(twoFactors("a, b, c", "a^2 = b; c^2 = a + 1", "a", "c"));
    for (int c : new int[] {-3, -2, 2, 3}) {
      int a = c * c - 1;
      assertEquals(Set.of(c > 1 ? "0,3,0" : "2,1,0"), signatures(rows, point(a, a * a, c)));
    }
    assertTrue(rows.all().stream().allMatch(Analysis.Region::exact));
  }

  /** Signs are decided at the root that is meant, not at its conjugate. */
  @Test
  void algebraicConstantsBoundRegions() {
    RegionRows rows = RegionRows.of(twoFactors("t", "", "t - sqrt(2)", "1"));
    assertEquals(List.of("t - sqrt(2) < 0: 2,1,0", "t - sqrt(2) > 0: 0,3,0"), rows.texts("S1"));
  }

  /**
   * Whitney's umbrella x^2 = z y^2: its handle, the negative z axis, lies in the closure of no
   * surface point (Whitney 1944; common practice).
   */
  @Test
  void handleOfTheUmbrellaIsARegion() {
    RegionRows rows = RegionRows.of(twoFactors("x, y, z", "x^2 = z*y^2", "1", "z"));
    assertEquals(Set.of("2,1,0"), signatures(rows, point(0, 0, -5)));
    assertEquals(Set.of("0,3,0"), signatures(rows, point(6, 3, 4)));
  }

  /** The cubic y^2 = x^3 - x^2 has the isolated point (0, 0); its branch has x of 1 or more. */
  @Test
  void isolatedPointIsARegion() {
    RegionRows rows = RegionRows.of(twoFactors("x, y", "y^2 = x^3 - x^2", "1", "2*x - 1"));
    assertEquals(Set.of("2,1,0"), signatures(rows, point(0, 0)));
    assertEquals(Set.of("0,3,0"), signatures(rows, point(5, 10)));
    assertEquals(2, rows.texts("S1").size());
  }

  /** u^2 + v^2 = 0 has one real point. */
  @Test
  void sumOfSquaresHasOneRealPoint() {
    RegionRows rows = RegionRows.of(twoFactors("u, v", "u^2 + v^2 = 0", "1 + u", "1 + v"));
    assertEquals(List.of(": 0,3,0"), rows.texts("S1"));
    assertEquals(1, rows.all().size(), "the other strata have no real point");
  }

  /** Conditions of the domain are not repeated, and what follows from them is dropped. */
  @Test
  void domainIsRespected() {
    RegionRows rows =
        RegionRows.of(twoFactors("a, b", "b > 0; a^2 + b^2 < 1; a != 0", "a", "b*(2 - a)"));
    assertEquals(List.of("a < 0: 2,1,0", "a > 0: 0,3,0"), rows.texts("S1"));
    for (Analysis.Region r : rows.all()) {
      assertTrue(r.witness().get(1).value().charAt(0) != '-', "b > 0 at " + r.witness());
    }
  }

  /** a^2 <= 0 leaves the line a = 0 only, on which no open cell lies. */
  @Test
  void borderOfTheDomainIsCovered() {
    RegionRows rows = RegionRows.of(twoFactors("a, b", "a^2 <= 0", "a + 1", "b"));
    assertEquals(List.of("b < 0: 2,1,0", "b > 0: 0,3,0"), rows.texts("S1"));
  }

  /** exp is positive, and cos and sin lie on their circle. */
  @Test
  void functionsOfParametersAreCoordinates() {
    RegionRows rows = RegionRows.of(twoFactors("t, s", "", "cos(t)", "exp(s) - 2"));
    List<String> texts = rows.texts("S1");
    assertEquals(3, texts.size());
    assertTrue(texts.contains("cos(t) > 0; exp(s) - 2 > 0: 0,3,0"), texts.toString());
    assertTrue(texts.stream().noneMatch(t -> t.contains("exp(s) >")), texts.toString());
  }

  /** 2^11 octants are too many cells: the rows are said to be sampled, and none is wrong. */
  @Test
  void tooManyCellsAreSampled() {
    List<String> names = new ArrayList<>();
    for (int k = 1; k <= 11; k++) {
      names.add("a" + k);
    }
    String all = String.join("*", names);
    RegionRows rows = RegionRows.of(twoFactors(String.join(", ", names), "", all, "1"));
    List<Analysis.Region> first = rows.of(rows.family().strata().get(0));
    assertTrue(first.size() > 10);
    assertTrue(first.stream().noneMatch(Analysis.Region::exact));
    for (Analysis.Region r : first) {
      assertEquals(11, r.conditions().size(), "no condition may be dropped");
      long negative =
          r.conditions().stream().filter(c -> c.comparison() == Comparison.LESS).count();
      assertEquals(negative % 2 == 0 ? 0 : 2, r.signature().plus());
    }
  }

  /** Over the complex numbers there are no signs. */
  @Test
  void complexGroundHasNoRegions() {
    RegionRows rows = RegionRows.of(CLASS_A + "ground: complex\n");
    assertEquals(List.of(), rows.all());
    assertEquals(Analysis.Status.COMPLETE, rows.family().analysis().status());
  }

  /** Labels part cells of one signature: so the names of algebras part rows. */
  @Test
  void labelsPartRows() throws Exception {
    rankfall.lie.Family family = rankfall.lie.Family.of(Analysed.text(CLASS_A).spec());
    Meter meter = new Meter(Duration.ofMinutes(1), 10_000);
    Strata.Stratum s =
        Partition.start(family, meter)
            .completed(family, meter)
            .strata()
            .orElseThrow()
            .strata()
            .get(0);
    rankfall.exact.Polynomial n1 =
        rankfall.exact.Polynomial.variable(family.ring().variables(), "n1");
    Cells cells = Cells.of(family, s, List.of(n1), meter);
    Regions rows = Regions.of(family, s, cells, c -> c.point().sign(n1) > 0 ? "up" : "down", meter);
    assertTrue(rows.complete());
    for (Regions.Row r : rows.rows()) {
      Set<Integer> signs =
          r.cells().stream().map(c -> c.point().sign(n1)).collect(Collectors.toSet());
      assertEquals(Set.of(r.label().equals("up") ? 1 : -1), signs);
    }
    assertEquals(
        Set.of("up", "down"),
        rows.rows().stream().map(Regions.Row::label).collect(Collectors.toSet()));
    Regions plain = Regions.of(family, s, cells, c -> "", meter);
    assertFalse(plain.rows().size() >= rows.rows().size());
  }

  private static final List<String> SMALL =
      List.of(
          CLASS_A,
          twoFactors("a, b", "", "a^2 - b", "b - 1"),
          twoFactors("a, b", "", "a^3 - 3*a + b", "1"),
          twoFactors("a, b, c", "", "a*c - b^2", "b - c"),
          twoFactors("a, b", "a^2 + b^2 < 4", "a*b - 1", "a + b"),
          twoFactors("x, y, z", "x^2 = z*y^2", "y - 1", "z"));

  /**
   * At rational points the rows say what the program for single points says; each point has one.
   */
  @ParameterizedTest
  @CsvSource({"0", "1", "2", "3", "4", "5"})
  void rowsAgreeWithSinglePoints(int family) {
    RegionRows rows = RegionRows.of(SMALL.get(family));
    int variables = rows.family().analysis().findings().orElseThrow().variables().size();
    Random random = new Random(family);
    int held = 0;
    for (int k = 0; k < 400; k++) {
      List<BigFraction> at = new ArrayList<>();
      for (int v = 0; v < variables; v++) {
        at.add(BigFraction.of(random.nextInt(13) - 6, 1 + random.nextInt(3)));
      }
      if (family == 5) {
        at.set(2, at.get(2).multiply(at.get(2)));
        at.set(0, BigFraction.ZERO);
        at.set(1, random.nextBoolean() ? BigFraction.ZERO : at.get(1));
        if (at.get(1).signum() != 0) {
          BigFraction r = BigFraction.of(random.nextInt(7) - 3, 2);
          at.set(2, r.multiply(r));
          at.set(0, r.multiply(at.get(1)));
        }
      }
      if (rows.at(at) instanceof PointResult.Facts facts) {
        List<Analysis.Stratum> in = rows.strataAt(at);
        assertEquals(1, in.size(), at.toString());
        List<Analysis.Region> here =
            rows.of(in.get(0)).stream().filter(r -> RegionRows.holds(r, at)).toList();
        boolean border = rows.of(in.get(0)).stream().anyMatch(r -> RegionRows.isOnBorder(r, at));
        assertTrue(here.size() == 1 || (here.isEmpty() && border), at + " lies in " + here);
        for (Analysis.Region r : here) {
          assertEquals(facts.killing().signature().orElseThrow(), r.signature(), at.toString());
          held++;
        }
      }
    }
    assertTrue(held > 100, "rows held at " + held + " points only");
  }
}
