package rankfall.scan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import rankfall.AlgebraType;
import rankfall.Analysis.Region;
import rankfall.Analysis.Stratum;
import rankfall.Comparison;
import rankfall.SignCondition;
import rankfall.exact.Polynomial;
import rankfall.scan.Finding.Status;

/** What is concluded from signs, and what is asked for instead. */
final class AtlasTest {
  private static final Polynomial A = HandMade.A;
  private static final Polynomial B = Polynomial.variable(HandMade.RING, 1);

  private final List<List<BigFraction>> asked = new ArrayList<>();

  private Finding at(Atlas atlas, Finding direct, long a, long b) {
    ScanPlan plan =
        new ScanPlan(
            atlas,
            p -> {
              asked.add(p);
              return direct;
            },
            new Grid(
                List.of(
                    Axis.values("a", List.of(fraction(a))),
                    Axis.values("b", List.of(fraction(b))))),
            Optional.empty());
    return ScanRun.each(plan).get(0);
  }

  private static BigFraction fraction(long n) {
    return BigFraction.of(BigInteger.valueOf(n));
  }

  private static Atlas atlas(
      List<SignCondition> domain, List<Stratum> strata, List<Region> regions) {
    return new Atlas(
        new Frame(List.of("a", "b"), Set.of(), Set.of(), HandMade.RATIONAL),
        List.of(A.minus(Polynomial.constant(HandMade.RING, 7))),
        List.of(),
        domain,
        false,
        strata,
        regions);
  }

  private static SignCondition is(Polynomial p, Comparison c) {
    return new SignCondition(p, c);
  }

  private static Stratum whole() {
    return HandMade.stratum("S1", List.of(), List.of(), 3);
  }

  @Test
  void polesAndTheDomainComeFirst() {
    Atlas atlas = atlas(List.of(is(B, Comparison.NOT_LESS)), List.of(whole()), List.of());
    assertEquals(Status.POLE, at(atlas, HandMade.finding(0, 3), 7, -1).status());
    assertEquals(Status.OUTSIDE, at(atlas, HandMade.finding(0, 3), 1, -1).status());
    assertEquals(List.of(), asked);
  }

  @Test
  void aPointInNoStratumHasNoAlgebra() {
    Stratum line = HandMade.stratum("S1", List.of(A), List.of(), 3);
    assertEquals(
        Status.OPEN,
        at(atlas(List.of(), List.of(line), List.of()), HandMade.finding(0, 3), 1, 0).status());
  }

  /** On the border of two regions of one signature nothing is asked, of two signatures it is. */
  @Test
  void aBorderBetweenEqualSignaturesNeedsNoQuestion() {
    Region up = HandMade.region("S1", "R1", List.of(is(A, Comparison.GREATER)), 0, 3);
    Region down = HandMade.region("S1", "R2", List.of(is(A, Comparison.LESS)), 0, 3);
    Finding equal =
        at(atlas(List.of(), List.of(whole()), List.of(up, down)), HandMade.finding(2, 1), 0, 1);
    assertEquals(HandMade.finding(0, 3).signature(), equal.signature());
    assertEquals("", equal.region());
    assertEquals(List.of(), asked);
    Region other = HandMade.region("S1", "R2", List.of(is(A, Comparison.LESS)), 2, 1);
    Finding border =
        at(atlas(List.of(), List.of(whole()), List.of(up, other)), HandMade.finding(2, 1), 0, 1);
    assertEquals(HandMade.finding(2, 1).signature(), border.signature());
    assertTrue(border.direct());
    assertEquals(1, asked.size());
  }

  /**
   * Between two regions of one semisimple algebra lies the same algebra (rigidity: Nijenhuis and
   * Richardson 1967); between regions of the Euclidean plane, rank 1, nothing is concluded.
   */
  @Test
  void aNameIsGivenBetweenRegionsOfOneSemisimpleAlgebraOnly() {
    Region up = named("R1", Comparison.GREATER, 0, 3, "so(3)");
    Region down = named("R2", Comparison.LESS, 0, 3, "so(3)");
    Atlas semisimple = atlas(List.of(), List.of(whole()), List.of(up, down));
    assertEquals("so(3)", at(semisimple, HandMade.finding(0, 3), 0, 1).type());
    Region one = named("R1", Comparison.GREATER, 0, 1, "iso(2)");
    Region other = named("R2", Comparison.LESS, 0, 1, "iso(2)");
    Stratum planes = HandMade.stratum("S1", List.of(), List.of(), 1);
    Atlas solvable = atlas(List.of(), List.of(planes), List.of(one, other));
    assertEquals("", at(solvable, HandMade.finding(0, 1), 0, 1).type());
    assertEquals("iso(2)", at(solvable, HandMade.finding(0, 1), 1, 1).type());
    assertEquals(List.of(), asked);
  }

  private static Region named(String name, Comparison c, int plus, int minus, String type) {
    Region r = HandMade.region("S1", name, List.of(is(A, c)), plus, minus);
    return new Region(
        r.stratum(),
        r.name(),
        r.conditions(),
        r.signature(),
        Optional.of(new AlgebraType(type, List.of(), true)),
        true,
        List.of());
  }

  /** a^2 + b^2 = 0 has one real point, at which it is no curve: regions near it say nothing. */
  @Test
  void anIsolatedPointIsAskedFor() {
    Polynomial circle = A.times(A).plus(B.times(B));
    Stratum point = HandMade.stratum("S1", List.of(circle), List.of(), 1);
    Region r = HandMade.region("S1", "R1", List.of(), 1, 0);
    Finding f = at(atlas(List.of(), List.of(point), List.of(r)), HandMade.finding(0, 1), 0, 0);
    assertEquals(HandMade.finding(0, 1).signature(), f.signature());
    assertEquals("", f.region(), "the region has another signature");
    assertEquals(1, asked.size());
  }

  /** a^2 + b^2 = 25 is a curve at (3, 4). */
  @Test
  void aSmoothPointOfACurveHasTheSignatureOfItsRegion() {
    Polynomial circle = A.times(A).plus(B.times(B)).minus(Polynomial.constant(HandMade.RING, 25));
    Stratum curve = HandMade.stratum("S1", List.of(circle), List.of(), 1);
    Region r = HandMade.region("S1", "R1", List.of(), 1, 0);
    Atlas atlas = atlas(List.of(), List.of(curve), List.of(r));
    assertEquals("R1", at(atlas, HandMade.finding(0, 1), 3, 4).region());
    assertEquals(Status.OPEN, at(atlas, HandMade.finding(0, 1), 3, 3).status());
    assertEquals(List.of(), asked);
  }

  /** b >= 0 allows b = 0, where the domain may end in a single point. */
  @Test
  void theEdgeOfTheDomainIsAskedFor() {
    Region r = HandMade.region("S1", "R1", List.of(), 0, 3);
    Atlas atlas = atlas(List.of(is(B, Comparison.NOT_LESS)), List.of(whole()), List.of(r));
    assertEquals("R1", at(atlas, HandMade.finding(0, 3), 1, 1).region());
    assertEquals(List.of(), asked);
    assertEquals("R1", at(atlas, HandMade.finding(0, 3), 1, 0).region());
    assertEquals(1, asked.size());
  }

  @Test
  void sampledRegionsAreNotBelieved() {
    Region exact = HandMade.region("S1", "R1", List.of(), 0, 3);
    Region sampled =
        new Region("S1", "R1", List.of(), exact.signature(), Optional.empty(), false, List.of());
    Atlas atlas = atlas(List.of(), List.of(whole()), List.of(sampled));
    Finding same = at(atlas, HandMade.finding(0, 3), 1, 1);
    assertTrue(same.direct());
    assertEquals("R1", same.region());
    Finding other = at(atlas, HandMade.finding(2, 1), 1, 1);
    assertEquals(HandMade.finding(2, 1).signature(), other.signature());
    assertEquals("", other.region());
  }

  @Test
  void withoutStrataEveryPointIsAskedFor() {
    Finding f = at(atlas(List.of(), List.of(), List.of()), HandMade.finding(2, 1), 1, 1);
    assertEquals(HandMade.finding(2, 1).directly(), f);
  }

  /** A stratum of rank 3 cannot hold a point whose form has rank 1. */
  @Test
  void anAnswerThatContradictsTheStratumIsAFailure() {
    Atlas atlas = atlas(List.of(), List.of(whole()), List.of());
    assertThrows(IllegalStateException.class, () -> at(atlas, HandMade.finding(0, 1), 1, 1));
  }
}
