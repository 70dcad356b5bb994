package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.Analysis;
import rankfall.exact.Factorization;

/**
 * Brute force over a finite field of small order: every point of F_p^m has the profile that its
 * stratum says modulo p, and no stratum where there is no algebra.
 *
 * <p>A prime is of good reduction here if it is greater than 3 and divides no integer in the
 * printed equations and exclusions, nor numerator or denominator of the number before a factored
 * determinant.
 */
class PrimeFieldStrataTest {

  static boolean isGood(Analysis.Findings findings, long prime) {
    List<BigInteger> integers = new ArrayList<>(Whereabouts.coefficients(findings.strata()));
    for (Analysis.Component c : findings.components()) {
      c.killing()
          .determinant()
          .ifPresent(
              d -> {
                add(integers, d.numerator());
                add(integers, d.denominator());
              });
    }
    BigInteger p = BigInteger.valueOf(prime);
    return prime > 3 && integers.stream().noneMatch(n -> n.mod(p).signum() == 0);
  }

  private static void add(List<BigInteger> integers, Factorization f) {
    integers.add(f.unit().getNumerator());
    integers.add(f.unit().getDenominator());
  }

  /** Family, primes that are good for it: fixed, so that none drops out unseen. */
  static Stream<Arguments> families() {
    return Stream.of(
            "sl2-scaled:5,7,11,13",
            "so3-sheared-basis:5,7,11",
            "bianchi-vi-h:5,7,11,13",
            "bianchi-vii-h:5,7,11,13",
            "bianchi-class-a:5,7,11",
            "bianchi-general:5,7",
            "three-dim-sums-of-squares-wall:5,7",
            "pswz-a4-9:5,7,11",
            "pswz-a4-11:5,7,11",
            "pswz-a5-19:5,7,11,13",
            "pswz-a5-30:5,7,11",
            "pswz-a5-33:5,7,11",
            "pswz-a5-35:5,7,11",
            "so3-metric-diagonal:5,7,11",
            "so4-metric-diagonal:5,7",
            "so4-cso-brackets:5,7",
            "kinematical-bacry-levy-leblond:5,7",
            "oscillator-two-frequencies:5,7,11",
            "twisted-torus-six:5,7",
            "flat-group-masses:5,7,11",
            "flat-group-boost-and-rotation:5,7,11",
            "pole-at-dependence:5,7,11",
            "tilted-generator:5,7,11",
            "heisenberg-dependent:5,7,11",
            "diagonal-dependent:5,7,11",
            "dependent-irrational:5,7,11",
            "closed-but-not-at-dependence:5,7,11",
            "closure-open-locus:5,7,11",
            "closure-two-components:5,7",
            "closure-double-root:5,7,11",
            "closure-irrational-only:5,7,11",
            "jacobi-two-components:5,7",
            "relation-parameter:5,7,11",
            "wall-irrational:5,7,11",
            "wall-without-real-points:5,7,11",
            "wall-three-circle:5,7,11",
            "wall-crossing:5,7,11",
            "current-so3-quadratic:5,7",
            "pole-parameter:5,7,11")
        .flatMap(PrimeFieldStrataTest::byPrime);
  }

  private static Stream<Arguments> byPrime(String line) {
    String[] parts = line.split(":");
    return Stream.of(parts[1].split(",")).map(p -> Arguments.of(parts[0], Long.valueOf(p)));
  }

  @ParameterizedTest(name = "{0} modulo {1}")
  @MethodSource("families")
  void everyPointHasTheProfileOfItsStratum(String id, long prime) {
    Analysed family = Analysed.published(id);
    assertTrue(isGood(family.analysis().findings().orElseThrow(), prime), "a bad prime");
    assertEquals(List.of(), differences(family, prime));
  }

  private static List<String> differences(Analysed family, long prime) {
    Residues field = new Residues(prime);
    PlainProfile plain = new PlainProfile(family.spec(), field);
    Whereabouts strata = new Whereabouts(family.strata(), field);
    List<String> out = new ArrayList<>();
    for (List<Long> point : points(family.spec().parameters().size(), prime)) {
      List<Profile> said = strata.of(point).stream().map(Analysed::profileOf).toList();
      List<Profile> is = plain.at(point).stream().toList();
      if (!said.equals(is)) {
        out.add(point + ": strata say " + said + ", it is " + is);
      }
    }
    return out;
  }

  private static List<List<Long>> points(int dimension, long prime) {
    List<List<Long>> out = List.of(List.of());
    for (int k = 0; k < dimension; k++) {
      List<List<Long>> longer = new ArrayList<>();
      for (List<Long> p : out) {
        for (long v = 0; v < prime; v++) {
          List<Long> q = new ArrayList<>(p);
          q.add(v);
          longer.add(q);
        }
      }
      out = longer;
    }
    return out;
  }

  /** Modulo 5 the irreducible locus t^2 + 5 is a double point. */
  @Test
  void aPrimeThatDividesACoefficientIsRefused() {
    Analysis.Findings findings =
        Analysed.text(
                "family: five\nparameters: [t]\nbrackets: |\n  [J, X] = Y\n  [J, Y] = -X\n"
                    + "  [X, Y] = (t^2 + 5)*J\n")
            .analysis()
            .findings()
            .orElseThrow();
    assertFalse(isGood(findings, 5));
    assertFalse(isGood(findings, 3));
    assertTrue(isGood(findings, 7));
  }

  /** The plain path can tell: so(3) modulo 7, and what stretched brackets make of it. */
  @Test
  void thePlainPathKnowsKnownAlgebras() {
    Analysed so3 =
        Analysed.text(
            "family: so3\n"
                + "parameters: [t]\n"
                + "brackets: |\n"
                + "  [X, Y] = Z\n"
                + "  [Y, Z] = t*X\n"
                + "  [Z, X] = Y\n");
    PlainProfile plain = new PlainProfile(so3.spec(), new Residues(7));
    assertEquals(Optional.of(new Profile(3, 3, 3, 0)), plain.at(List.of(1L)));
    assertEquals(Optional.of(new Profile(3, 1, 2, 0)), plain.at(List.of(0L)));
  }
}
