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
 * Ten thousand rational points of a family: each lies in exactly one stratum, which has its profile, or
 * in none where there is no algebra. The values are small, so that the points meet the loci. A fraction
 * is looked at modulo a prime near 2^31: the same integers vanish, as they are smaller.
 */
class EveryPointTest {
  private static final int POINTS = 10_000;
  private static final Residues FIELD = new Residues(2_147_483_629L);
  private static final List<BigFraction> VALUES =
      List.of(
          BigFraction.of(-2),
          BigFraction.of(-1),
          BigFraction.of(-1, 2),
          BigFraction.ZERO,
          BigFraction.ZERO,
          BigFraction.of(1, 2),
          BigFraction.ONE,
          BigFraction.of(2));

  /** Family, where from, number of strata that rational points of small height reach. */
  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "bianchi-types,shipped,6",
    "metric-rotations-4,shipped,5",
    "flux-six,shipped,12",
    "metric-rotations-3,shipped,4",
    "bianchi-general,published,9",
    "stretched-rotors-vanishing,published,8",
    "closure-two-components,published,5",
    "kinematical-five-parameters,published,8",
    "so5-cso-brackets,published,32",
  })
  void liesInOneStratum(String name, String from, int reached) {
    long seed = name.hashCode();
    Analysed family =
        from.equals("shipped") ? Analysed.shipped(name) : Analysed.published(name);
    PlainProfile plain = new PlainProfile(family.spec(), FIELD);
    Whereabouts strata = new Whereabouts(family.strata(), FIELD);
    Random random = new Random(seed);
    Set<String> hit = new TreeSet<>();
    List<String> differences = new ArrayList<>();
    for (int k = 0; k < POINTS; k++) {
      List<BigFraction> point =
          family.spec().parameters().stream()
              .map(p -> VALUES.get(random.nextInt(VALUES.size())))
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
