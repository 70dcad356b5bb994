package rankfall;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** Default grids of published families, counted by hand. */
final class ScanCountsTest {
  private static ScanCounts counts(Spec spec) throws SpecException {
    return Engine.analyse(spec, Budget.DEFAULT).findings().orElseThrow().scan().orElseThrow();
  }

  private static Spec shipped(String name) throws IOException, SpecException {
    return SpecReader.read(name, Files.readAllBytes(Path.of("specs", name + ".yaml")))
        .get(0)
        .orThrow();
  }

  private static Spec spec(String text) throws SpecException {
    return SpecReader.read("s.yaml", text.getBytes(UTF_8)).get(0).orThrow();
  }

  private static Map<String, Long> bySignature(ScanCounts counts) {
    Map<String, Long> out = new TreeMap<>();
    for (ScanCount c : counts.counts()) {
      String key =
          c.signature().map(s -> s.plus() + "," + s.minus() + "," + s.zero()).orElse(c.status());
      out.merge(key, c.points(), Long::sum);
    }
    return out;
  }

  /**
   * The types of class A by the signs of n1, n2, n3 on {-1, 0, 1}^3: IX for equal signs (2 points),
   * VIII for unequal ones (6), VII_0 for one zero and equal signs (6), VI_0 for unequal ones (6),
   * II for two zeros (6), I (1); Ellis and MacCallum 1969, sec. 6 (from memory). The Killing form
   * is diag(-2 n2 n3, -2 n1 n3, -2 n1 n2) (Milnor 1976): definite for IX, of signature (2, 1) for
   * VIII, -1 for VII_0, +1 for VI_0, 0 for II and I.
   */
  @Test
  void bianchiTypesOfClassA() throws SpecException {
    ScanCounts counts =
        counts(
            spec(
                """
                family: class-a
                parameters: [n1, n2, n3]
                brackets: |
                  [e1, e2] = n3*e3
                  [e2, e3] = n1*e1
                  [e3, e1] = n2*e2
                scan: {n1: [-1, 0, 1], n2: [-1, 0, 1], n3: [-1, 0, 1]}
                """));
    assertEquals(
        Map.of("0,3,0", 2L, "2,1,0", 6L, "0,1,2", 6L, "1,0,2", 6L, "0,0,3", 7L),
        bySignature(counts));
    assertEquals(27, counts.points().size());
  }

  /**
   * The rotations of diag(g1, g2, g3) on {-1, 0, 1}^3: so(3) for equal signs (2), so(2,1) for
   * unequal ones (6) (Helgason 1978, ch. X, sec. 2). Their generators E_ij g_j - E_ji g_i become
   * dependent where two metric entries vanish: with one entry left two of them are independent and
   * commute (6 points), with none left all are 0 (1). With one zero entry the algebra is that of
   * the plane: of the Euclidean one for equal signs, kappa = -2 on the rotation (6), of the
   * Minkowski plane for unequal ones, +2 (6).
   */
  @Test
  void rotationsOfADiagonalMetric() throws SpecException {
    ScanCounts counts =
        counts(
            spec(
                """
                family: diagonal-rotations
                parameters: [g1, g2, g3]
                matrices:
                  X12: [[0, g2, 0], [-g1, 0, 0], [0, 0, 0]]
                  X13: [[0, 0, g3], [0, 0, 0], [-g1, 0, 0]]
                  X23: [[0, 0, 0], [0, 0, g3], [0, -g2, 0]]
                scan: {g1: [-1, 0, 1], g2: [-1, 0, 1], g3: [-1, 0, 1]}
                """));
    assertEquals(
        Map.of("0,3,0", 2L, "2,1,0", 6L, "0,1,2", 6L, "1,0,2", 6L, "0,0,2", 6L, "0,0,0", 1L),
        bySignature(counts));
  }

  /**
   * Ten generators over {-1, 0, 1}^3 (brackets of Bacry and Levy-Leblond 1968); the form by hand,
   * see {@link #byTraces}. Where a, b and m are not 0 this gives (0, 10), (4, 6) and (6, 4), those
   * of so(5), so(4,1) and so(3,2) (Helgason 1978, ch. X, table V).
   */
  @Test
  void kinematicalAlgebras() throws IOException, SpecException {
    Map<String, Long> met = bySignature(counts(shipped("kinematics-ten")));
    Map<String, Long> wanted = new TreeMap<>();
    for (int a = -1; a <= 1; a++) {
      for (int b = -1; b <= 1; b++) {
        for (int m = -1; m <= 1; m++) {
          wanted.merge(byTraces(a, b, m), 1L, Long::sum);
        }
      }
    }
    assertEquals(wanted, met);
  }

  /**
   * Signs of the diagonal Killing form; by hand from the brackets: (ad J)^2 is -1 on the two other
   * vectors of each of J, P, K, so that its trace is -6; (ad P)^2 has the trace 6 a m, (ad K)^2 the
   * trace -6 b m, (ad H)^2 the trace 6 a b.
   */
  private static String byTraces(int a, int b, int m) {
    int[] squares = {-1, -1, -1, a * m, a * m, a * m, -b * m, -b * m, -b * m, a * b};
    int plus = 0;
    int minus = 0;
    for (int s : squares) {
      plus += s > 0 ? 1 : 0;
      minus += s < 0 ? 1 : 0;
    }
    return plus + "," + minus + "," + (10 - plus - minus);
  }

  @Test
  void outsideAndPolesAreCountedAsSuch() throws SpecException {
    ScanCounts counts =
        counts(
            spec(
                """
                family: fenced
                parameters: [a, b]
                where:
                  - a > 0
                brackets: |
                  [X, Y] = Z/b
                  [Y, Z] = X
                  [Z, X] = a*Y
                scan: {a: [-1, 0, 1], b: [-1, 0, 1, 2]}
                """));
    // a > 0 leaves four points: one at the pole b = 0; Killing -2 a / b, -2 / b, -2 a: so(3) for
    // b > 0 (2 points), sl(2,R) for b < 0. The pole is told first: of all points with b = 0, 3.
    assertEquals(Map.of("pole", 3L, "outside", 6L, "0,3,0", 2L, "2,1,0", 1L), bySignature(counts));
  }

  @Test
  void aGridThatDoesNotFitIsSaidSo() throws SpecException {
    Analysis analysis =
        Engine.analyse(
            spec(
                """
                family: half
                parameters: [a, b]
                brackets: |
                  [X, Y] = a*b*Z
                scan: {a: [0, 1]}
                """),
            Budget.DEFAULT);
    assertEquals(
        List.of("The default grid was not counted: no value for the parameter 'b'."),
        analysis.remarks());
  }
}
