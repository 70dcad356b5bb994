package rankfall;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import rankfall.exact.Rationals;
import rankfall.scan.Axis;
import rankfall.scan.Columns;
import rankfall.scan.Finding;
import rankfall.scan.PointList;
import rankfall.scan.PointSet;
import rankfall.scan.Sample;
import rankfall.scan.ScanPlan;
import rankfall.scan.ScanRun;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** A million points, on loci and a billionth of a thousandth away from them, none wrong. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
final class ScanExactnessTest {
  /**
   * [X, Y] = p*Z, [Y, Z] = q*X, [Z, X] = r*Y has the Killing form diag(-2 p r, -2 p q, -2 q r)
   * (Milnor 1976; by hand: (ad X)^2 takes Y and Z to -p r times themselves).
   */
  private static final String SPEC =
      """
      family: cusp-and-hyperbola
      parameters: [a, b]
      brackets: |
        [X, Y] = (a^3 - b^2)*Z
        [Y, Z] = (a^2*b^6 - 1)*X
        [Z, X] = b*Y
      """;

  private static final int POINTS = 1_000_000;

  private Analysis analysis;

  @BeforeAll
  void analyse() throws SpecException {
    analysis =
        Engine.withoutGrid(
            SpecReader.read("s.yaml", SPEC.getBytes(UTF_8)).get(0).orThrow(), Budget.DEFAULT);
    assertEquals(Analysis.Status.COMPLETE, analysis.status());
  }

  private ScanPlan plan(PointSet points, List<String> facts) throws SpecException {
    ScanFamily family = ScanFamily.of(analysis.spec());
    List<String> names = List.of("a", "b");
    return new ScanPlan(
        family.atlas(names, analysis),
        p -> family.at(names, p),
        points,
        Optional.of(new ScanPlan.Table(Columns.of(names, facts), c -> String.join(",", c), false)));
  }

  /** The signs of p, q and r, in integers. */
  private static String expected(BigFraction a, BigFraction b) {
    BigInteger n = Rationals.numerator(a);
    BigInteger d = Rationals.denominator(a);
    BigInteger m = Rationals.numerator(b);
    BigInteger e = Rationals.denominator(b);
    int p = n.pow(3).multiply(e.pow(2)).compareTo(m.pow(2).multiply(d.pow(3)));
    int q = n.pow(2).multiply(m.pow(6)).compareTo(d.pow(2).multiply(e.pow(6)));
    int r = m.signum();
    int plus = 0;
    int minus = 0;
    for (int s : new int[] {-p * r, -p * q, -q * r}) {
      plus += s > 0 ? 1 : 0;
      minus += s < 0 ? 1 : 0;
    }
    return plus + "," + minus + "," + (3 - plus - minus);
  }

  /** Points anywhere, on the cusp, on the hyperbola, on the axis, and beside them. */
  private static List<BigFraction> point(Random random) {
    BigFraction t = small(random);
    BigFraction a = small(random);
    BigFraction b = t;
    switch (random.nextInt(4)) {
      case 0 -> {
        a = t.multiply(t);
        b = a.multiply(t);
      }
      case 1 -> a = t.signum() == 0 ? a : t.pow(3).reciprocal();
      case 2 -> b = BigFraction.ZERO;
      default -> a = small(random);
    }
    BigFraction near = BigFraction.of(BigInteger.ONE, BigInteger.TEN.pow(12));
    return switch (random.nextInt(5)) {
      case 0 -> List.of(a.add(near), b);
      case 1 -> List.of(a, b.subtract(near));
      case 2 -> List.of(a.subtract(near), b.add(near));
      default -> List.of(a, b);
    };
  }

  private static BigFraction small(Random random) {
    return BigFraction.of(
        BigInteger.valueOf(random.nextInt(401) - 200), BigInteger.valueOf(1 + random.nextInt(60)));
  }

  @Test
  void aMillionPointsHaveTheirSignatures() throws SpecException, IOException, InterruptedException {
    Random random = new Random(2026);
    List<String> wanted = new ArrayList<>();
    PointList.Rows rows =
        count -> {
          List<PointList.Row> out = new ArrayList<>();
          for (int k = 0; k < count; k++) {
            List<BigFraction> p = point(random);
            wanted.add(expected(p.get(0), p.get(1)));
            out.add(new PointList.Row(List.of(), Optional.of(p)));
          }
          return out;
        };
    PointList points = new PointList(List.of("a", "b"), POINTS, "a million", rows);
    ScanPlan plan = plan(points, List.of("plus", "minus", "zero"));
    Map<String, Integer> met = new HashMap<>();
    int[] at = {-1};
    new ScanRun(plan, 0, POINTS, 2)
        .run(
            0,
            part -> {
              for (String row : new String(part.rows(), UTF_8).split("\r\n")) {
                if (at[0] >= 0) {
                  assertEquals(wanted.get(at[0]), row, "row " + at[0]);
                  met.merge(row, 1, Integer::sum);
                }
                at[0]++;
              }
            });
    assertEquals(POINTS, at[0]);
    for (String signature : List.of("0,3,0", "2,1,0", "0,1,2", "1,0,2", "0,0,3")) {
      assertTrue(met.getOrDefault(signature, 0) > 100, signature + " is met: " + met);
    }
  }

  /** Against the answers at single points, with their strata; on a sample. */
  @Test
  void aSampleAgreesWithSinglePoints() throws SpecException {
    Points single = Points.of(analysis.spec(), StratumLookup.of(analysis.spec(), analysis));
    Sample sample =
        new Sample(
            List.of(
                Sample.range("a", BigFraction.of(-2), BigFraction.of(2)),
                Axis.values(
                    "b", List.of(BigFraction.ZERO, BigFraction.ONE, BigFraction.of(-1, 2)))),
            400,
            11);
    List<Finding> findings = ScanRun.each(plan(sample, List.of("rank")));
    long[] at = new long[2];
    for (int k = 0; k < findings.size(); k++) {
      sample.put(k, at);
      BigFraction a = fraction(at[0], sample.denominators().get(0));
      BigFraction b = fraction(at[1], sample.denominators().get(1));
      PointResult.Facts f = (PointResult.Facts) single.at(Map.of("a", a, "b", b));
      assertEquals(f.killing().signature(), findings.get(k).signature());
      assertEquals(f.stratum().orElseThrow(), findings.get(k).stratum());
    }
  }

  private static BigFraction fraction(long n, long d) {
    return BigFraction.of(BigInteger.valueOf(n), BigInteger.valueOf(d));
  }
}
