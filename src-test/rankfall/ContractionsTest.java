package rankfall;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.Test;
import rankfall.Analysis.Contracted;
import rankfall.Analysis.Contraction;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Stratum;
import rankfall.Analysis.StructureEntry;
import rankfall.Analysis.WithoutLimit;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** What the brackets of the general point become where the matrices are dependent. */
class ContractionsTest {

  private static Findings findings(String yaml) throws SpecException {
    return Engine.analyse(
            SpecReader.read("test.yaml", yaml.getBytes(StandardCharsets.UTF_8)).get(0).orThrow(),
            new Budget(Duration.ofMinutes(5), 100_000))
        .findings()
        .orElseThrow();
  }

  private static Findings shipped(String name) throws IOException, SpecException {
    return findings(Files.readString(Path.of("specs", name + ".yaml")));
  }

  private static Stratum stratum(Findings f, Contraction c) {
    return f.strata().stream().filter(s -> s.name().equals(c.stratum())).findFirst().orElseThrow();
  }

  /** The only contraction into a stratum with a span of the given dimension. */
  private static Contraction into(Findings f, int dimension) {
    List<Contraction> all =
        f.contractions().stream().filter(c -> stratum(f, c).dimension() == dimension).toList();
    assertEquals(1, all.size(), () -> "span of dimension " + dimension);
    return all.get(0);
  }

  private static String profile(Contraction c) {
    Contracted limit = assertInstanceOf(Contracted.class, c.outcome());
    return c.basis().size() + " " + limit.rank() + " " + limit.derived() + " " + limit.centre();
  }

  private static String type(Contraction c) {
    return assertInstanceOf(Contracted.class, c.outcome()).type().orElseThrow().name();
  }

  private static List<String> terms(Contraction c) {
    return c.outcome().structure().stream().map(s -> term(c, s)).toList();
  }

  private static String term(Contraction c, StructureEntry s) {
    return "["
        + c.basis().get(s.left())
        + ", "
        + c.basis().get(s.right())
        + "] "
        + s.coefficient()
        + " "
        + c.basis().get(s.target());
  }

  /**
   * Rotations of a metric of rank 1: as matrices R^2, as brackets Heisenberg, which alone among the
   * algebras of dimension 3 has a derived algebra and a centre of dimension 1 and no Killing form
   * (classification of Bianchi 1898, type II).
   */
  @Test
  void rotationsOfAMetricOfRankOneContractToHeisenberg() throws IOException, SpecException {
    Findings f = shipped("metric-rotations-3");
    assertEquals(0, stratum(f, into(f, 2)).derived());
    assertEquals("3 0 1 1", profile(into(f, 2)));
    assertEquals("3 0 0 3", profile(into(f, 0)));
    assertEquals("h3", type(into(f, 2)));
    assertEquals("R^3", type(into(f, 0)));
    assertEquals(2, f.contractions().size());
  }

  /**
   * Four axes, g = diag(1,1,0,0): a rotation over the Heisenberg algebra of dimension 5; g =
   * diag(1,0,0,0): the free two-step nilpotent algebra on three elements (worked out by hand from
   * [X_ij, X_kl]).
   */
  @Test
  void rotationsOfAMetricInFourDimensionsContractInSteps() throws IOException, SpecException {
    Findings f = shipped("metric-rotations-4");
    assertEquals("6 1 5 1", profile(into(f, 5)));
    assertEquals("6 0 3 3", profile(into(f, 3)));
    assertEquals("6 0 0 6", profile(into(f, 0)));
  }

  /**
   * Two rotations scaled by c: so(3) becomes the motions of the plane (Inonu and Wigner 1953, Proc.
   * Natl. Acad. Sci. 39, 510; the place within from memory). The span at c = 0 is a line.
   */
  @Test
  void rotationsContractToMotionsOfThePlane() throws SpecException {
    Findings f =
        findings(
            """
            family: so3-to-e2
            parameters: [c]
            order: 3
            matrices:
              P: "c*E(3,2) - c*E(2,3)"
              Q: "c*E(1,3) - c*E(3,1)"
              J: "E(2,1) - E(1,2)"
            """);
    Contraction c = into(f, 1);
    assertEquals("3 1 2 0", profile(c));
    assertEquals(List.of("[P, J] -1 Q", "[Q, J] 1 P"), terms(c));
  }

  /**
   * Scaled boosts: the Lorentz algebra becomes the homogeneous Galilei algebra (Inonu and Wigner
   * 1953, the place within from memory), as abstract algebra the motions of Euclidean space:
   * perfect, without centre, Killing form of the rotations alone.
   */
  @Test
  void lorentzBoostsContractToGalilei() throws SpecException {
    Findings f =
        findings(
            """
            family: lorentz-to-galilei
            parameters: [c]
            order: 4
            matrices:
              J1: "E(3,2) - E(2,3)"
              J2: "E(1,3) - E(3,1)"
              J3: "E(2,1) - E(1,2)"
              K1: "c*E(1,4) + c*E(4,1)"
              K2: "c*E(2,4) + c*E(4,2)"
              K3: "c*E(3,4) + c*E(4,3)"
            """);
    assertEquals("6 3 6 0", profile(into(f, 3)));
  }

  /**
   * sl(2) with a scaled pair: [H,E] = 2E, [H,F] = -2F, [E,F] = c H; c = 0 leaves E and F commuting.
   */
  @Test
  void scaledLadderContracts() throws SpecException {
    Findings f =
        findings(
            """
            family: ladder
            parameters: [c]
            matrices:
              H: [[1, 0], [0, -1]]
              R: [[0, 1], [0, 0]]
              L: [[0, 0], [c, 0]]
            """);
    Contraction c = into(f, 2);
    assertEquals("3 1 2 0", profile(c));
    assertEquals(List.of("[H, R] 2 R", "[H, L] -2 L"), terms(c));
  }

  /** [H, Y] = 2Y - 4(Z - Y)/a: the span is closed at a = 0, the brackets have a pole there. */
  @Test
  void poleMeansNoLimit() throws SpecException {
    Findings f =
        findings(
            """
            family: pole
            parameters: [a]
            matrices:
              H: [[1, 0], [0, -1]]
              Y: [[0, 1], [a, 0]]
              Z: [[0, 1], [a + a^2, 0]]
            """);
    Contraction c = into(f, 2);
    assertInstanceOf(WithoutLimit.class, c.outcome());
    assertTrue(terms(c).contains("[H, Y] -4/a Z"), () -> terms(c).toString());
  }

  /** The limits hold parameters that stay free: s = 0 leaves m. */
  @Test
  void mergingFramesKeepTheOtherParameter() throws IOException, SpecException {
    Findings f = shipped("merging-frames");
    List<Contraction> general =
        f.contractions().stream().filter(c -> stratum(f, c).equations().size() == 1).toList();
    assertEquals(1, general.size());
    assertEquals(
        List.of("[D, N] -m + 1 N", "[D, X] 1 X", "[D, Y] -m + 1 X", "[D, Y] m Y"),
        terms(general.get(0)));
    assertEquals("4 1 3 0", profile(general.get(0)));
    assertEquals(
        f.strata().stream().filter(s -> s.dimension() < 4).count(), f.contractions().size());
  }

  /** Brackets given as such lose no dimension: nothing is followed. */
  @Test
  void familiesOfBracketsHaveNone() throws IOException, SpecException {
    assertEquals(List.of(), shipped("scaled-ladder").contractions());
  }

  /** The component is a curve's cone with cos and sin on it; all is decided. */
  @Test
  void relationsBetweenParametersAreUsed() throws IOException, SpecException {
    for (var result :
        SpecReader.read(
            "doublet-couplings.yaml",
            Files.readAllBytes(Path.of("specs", "doublet-couplings.yaml")))) {
      Findings f =
          Engine.analyse(result.orThrow(), new Budget(Duration.ofMinutes(5), 100_000))
              .findings()
              .orElseThrow();
      assertEquals(
          f.strata().stream().filter(s -> s.dimension() < 4).count(), f.contractions().size());
      assertTrue(
          f.contractions().stream().noneMatch(c -> c.outcome() instanceof Analysis.Unfollowed));
    }
  }
}
