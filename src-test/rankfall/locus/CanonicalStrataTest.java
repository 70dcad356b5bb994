package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.Analysis;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.Term;
import rankfall.exact.Variables;

/**
 * The strata do not depend on the basis, on the order of generators and parameters, or on names:
 * closed sets are compared as ideals, and random points lie in strata of the same profile.
 */
class CanonicalStrataTest {
  private static final Residues FIELD = new Residues(2_147_483_629L);

  static Stream<Arguments> families() {
    return Stream.of(
            "bianchi-general",
            "bianchi-class-a-full",
            "three-dim-sums-of-squares-wall",
            "so3-metric-diagonal",
            "so3-metric-full",
            "so4-cso-brackets",
            "flat-group-boost-and-rotation",
            "oscillator-two-frequencies",
            "twisted-torus-six",
            "heisenberg-dependent",
            "closed-but-not-at-dependence",
            "closure-two-components",
            "jacobi-two-components",
            "stretched-rotors-vanishing",
            "tilted-generator",
            "pswz-a5-19",
            "pswz-a4-11",
            "wall-crossing",
            "shipped bianchi-types",
            "shipped flux-six")
        .flatMap(id -> Stream.of(Arguments.of(id, 1L), Arguments.of(id, 2L)));
  }

  private static Analysed family(String id) {
    return id.startsWith("shipped ") ? Analysed.shipped(id.substring(8)) : Analysed.published(id);
  }

  @ParameterizedTest(name = "{0}, seed {1}")
  @MethodSource("families")
  void aDisguisedFamilyHasTheSameStrata(String id, long seed) {
    Analysed family = family(id);
    Disguise disguise = Disguise.of(family.spec(), new Random(seed + id.hashCode()));
    Analysed other = Analysed.text(disguise.yaml());
    Variables own = new Variables(family.spec().parameters());
    GroebnerBasis bases = new GroebnerBasis(family.constants());
    TreeSet<String> expected = new TreeSet<>();
    for (Analysis.Stratum s : family.strata()) {
      expected.add(Analysed.text(bases.reduced(s.equations())) + " " + Analysed.profile(s));
    }
    TreeSet<String> found = new TreeSet<>();
    for (Analysis.Stratum s : other.strata()) {
      List<Polynomial> back =
          s.equations().stream().map(p -> renamed(p, own, disguise.parameters())).toList();
      found.add(Analysed.text(bases.reduced(back)) + " " + Analysed.profile(s));
    }
    assertEquals(expected, found, "seed " + seed + "\n" + disguise.yaml());
    assertEquals(family.strata().size(), other.strata().size());
    samePoints(family, other, disguise.parameters(), seed);
  }

  /** The polynomial in the old variables. */
  private static Polynomial renamed(Polynomial p, Variables own, Map<String, String> names) {
    List<Term> terms = new ArrayList<>();
    for (Term t : p.terms()) {
      List<Integer> exponents =
          own.names().stream()
              .map(name -> t.exponents().get(p.variables().index(names.get(name))))
              .toList();
      terms.add(new Term(t.coefficient(), exponents));
    }
    return Polynomial.of(own, terms);
  }

  private static void samePoints(
      Analysed family, Analysed other, Map<String, String> names, long seed) {
    Random random = new Random(seed);
    Whereabouts here = new Whereabouts(family.strata(), FIELD);
    Whereabouts there = new Whereabouts(other.strata(), FIELD);
    for (int k = 0; k < 300; k++) {
      int spread = 1 + k % 3;
      List<Long> point =
          family.spec().parameters().stream()
              .map(
                  p -> Math.floorMod((long) random.nextInt(2 * spread + 1) - spread, FIELD.prime()))
              .toList();
      List<Long> moved =
          other.spec().parameters().stream()
              .map(
                  p ->
                      point.get(
                          family.spec().parameters().stream().map(names::get).toList().indexOf(p)))
              .toList();
      assertEquals(
          here.of(point).stream().map(Analysed::profileOf).toList(),
          there.of(moved).stream().map(Analysed::profileOf).toList(),
          "seed " + seed + ", at " + point);
    }
  }

  /** A seed gives one disguise, another seed another one. */
  @Test
  void everySeedHasItsDisguise() {
    Analysed family = Analysed.published("bianchi-general");
    String first = Disguise.of(family.spec(), new Random(1)).yaml();
    assertNotEquals(first, Disguise.of(family.spec(), new Random(2)).yaml());
    assertEquals(first, Disguise.of(family.spec(), new Random(1)).yaml());
  }
}
