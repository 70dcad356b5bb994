package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.Analysis;

/**
 * Ten thousand rational points of a family: each lies in exactly one stratum, which has its
 * profile, or in none where there is no algebra. The values are small, so that the points meet the
 * loci; from point to point more or fewer coordinates are 0. Membership is exact: modulo a prime
 * near 2^31, greater than any value that a printed polynomial takes at these points.
 */
class EveryPointTest {
  private static final int POINTS = 10_000;
  private static final Residues FIELD = new Residues(2_147_483_629L);
  private static final List<BigFraction> VALUES =
      List.of(
          BigFraction.of(-2),
          BigFraction.of(-1),
          BigFraction.of(-1, 2),
          BigFraction.of(1, 2),
          BigFraction.ONE,
          BigFraction.of(2));

  private static BigFraction value(Random random, boolean plainly) {
    return plainly
        ? BigFraction.of(random.nextBoolean() ? 1 : -1)
        : VALUES.get(random.nextInt(VALUES.size()));
  }

  /** Family, where from, number of strata that rational points of small height reach. */
  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "bianchi-types,shipped,5",
    "metric-rotations-4,shipped,4",
    "flux-six,shipped,13",
    "metric-rotations-3,shipped,4",
    "bianchi-general,published,9",
    "stretched-rotors-vanishing,published,20",
    "closure-two-components,published,5",
    "kinematical-five-parameters,published,8",
    "so5-cso-brackets,published,32",
  })
  void liesInOneStratum(String name, String from, int reached) {
    long seed = name.hashCode();
    Analysed family = from.equals("shipped") ? Analysed.shipped(name) : Analysed.published(name);
    PlainProfile plain = new PlainProfile(family.spec(), FIELD);
    Whereabouts strata = new Whereabouts(family.strata(), FIELD);
    assertTrue(Whereabouts.bound(family.strata()).longValueExact() < FIELD.prime());
    Random random = new Random(seed);
    Set<String> hit = new TreeSet<>();
    List<String> differences = new ArrayList<>();
    for (int k = 0; k < POINTS; k++) {
      int zeros = k % 6;
      boolean plainly = k % 5 < 3;
      List<BigFraction> point =
          family.spec().parameters().stream()
              .map(p -> random.nextInt(6) < zeros ? BigFraction.ZERO : value(random, plainly))
              .toList();
      List<Long> residues = point.stream().map(FIELD::of).toList();
      List<Analysis.Stratum> found = strata.of(residues);
      found.forEach(s -> hit.add(s.name()));
      List<Profile> said = found.stream().map(Analysed::profileOf).toList();
      List<Profile> is = plain.at(residues).stream().toList();
      if (!said.equals(is)) {
        differences.add(point + ": strata say " + said + ", it is " + is);
      }
    }
    assertEquals(List.of(), differences, "seed " + seed);
    assertTrue(hit.size() >= reached, "seed " + seed + " reached only " + hit);
  }
}
