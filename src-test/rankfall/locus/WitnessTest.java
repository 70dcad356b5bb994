package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.Engine;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** No stratum goes without a witness: real ones where there are, else complex ones. */
class WitnessTest {
  private static List<Analysis.Stratum> strata(String... lines) throws SpecException {
    String text = String.join("\n", lines) + "\n";
    var result = SpecReader.read("witness.yaml", text.getBytes(StandardCharsets.UTF_8)).get(0);
    Analysis a = Engine.analyse(result.orThrow(), new Budget(Duration.ofSeconds(60), 5000));
    assertEquals(Analysis.Status.COMPLETE, a.status(), a.message());
    return a.findings().orElseThrow().strata();
  }

  private static String told(List<Analysis.Stratum> strata) {
    return strata.stream()
        .map(
            s ->
                s.equations()
                    + " "
                    + s.realPoints()
                    + " "
                    + s.witness().stream()
                        .map(c -> c.variable() + "=" + c.value())
                        .collect(Collectors.joining("; ")))
        .collect(Collectors.joining("\n"));
  }

  /** The discriminant of m^2 - m + 1 is -3; its roots are (1 +- i*sqrt(3))/2. */
  @Test
  void aWallWithoutRealPointsHasAComplexWitness() throws SpecException {
    List<Analysis.Stratum> s =
        strata(
            "family: far-wall",
            "parameters: [m]",
            "brackets: |",
            "  [X, Y] = (m^2 - m + 1)*Z",
            "  [Y, Z] = X",
            "  [Z, X] = Y",
            "generators: [X, Y, Z]");
    assertEquals(
        "[] YES m=1\n[m^2 - m + 1] NO m=root(x^2 - x + 1, 0.50000000 + 0.86602540*i)", told(s));
  }

  /** Free parameters get values at which the stratum's exclusions are met. */
  @Test
  void unrelatedRootsAndFreeParameters() throws SpecException {
    List<Analysis.Stratum> s =
        strata(
            "family: two-walls",
            "parameters: [a, b]",
            "brackets: |",
            "  [X, Y] = (a^2 - 2)*Z",
            "  [Y, Z] = (b^2 - 3)*X",
            "  [Z, X] = Y",
            "generators: [X, Y, Z]");
    String told = told(s);
    for (Analysis.Stratum x : s) {
      assertFalse(x.witness().isEmpty(), told);
      assertEquals(Analysis.RealPoints.YES, x.realPoints(), told);
    }
    assertEquals(
        1,
        s.stream()
            .filter(x -> x.equations().size() == 2)
            .filter(
                x ->
                    x.witness().get(0).value().startsWith("root(x^2 - 2,")
                        && x.witness().get(1).value().startsWith("root(x^2 - 3,"))
            .count(),
        told);
  }
}
