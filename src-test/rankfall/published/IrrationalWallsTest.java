package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.Analysis;
import rankfall.Analysis.RealPoints;
import rankfall.Budget;
import rankfall.Engine;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;
import rankfall.spec.SpecResult;

/**
 * Walls at algebraic numbers stand where the positive root, or the root that the spec is near to,
 * stands, and nowhere else: no conjugate, no norm.
 */
class IrrationalWallsTest {

  /** [X,Y] = p Z, [Y,Z] = q X, [Z,X] = r Y: K = diag(-2 p r, -2 p q, -2 q r) up to order. */
  @ParameterizedTest
  @CsvSource({"root-two-wall, u, t - sqrt(2)", "cubic-threshold, t - w,"})
  void aWallStandsAtOneRoot(String family, String first, String second)
      throws IOException, SpecException {
    Analysis analysis = Engine.analyse(spec(family), Budget.DEFAULT);
    assertEquals(Analysis.Status.COMPLETE, analysis.status(), analysis.message());
    List<Analysis.Condition> conditions =
        analysis.findings().orElseThrow().components().get(0).conditions();
    List<String> due = second == null ? List.of(first) : List.of(first, second);
    assertEquals(due, conditions.stream().map(c -> c.equations().get(0).toString()).toList());
    for (Analysis.Condition c : conditions) {
      assertEquals(1, c.equations().size());
      assertEquals(2, c.multiplicity().orElseThrow());
      assertEquals(1, c.rank().orElseThrow());
      assertEquals(RealPoints.YES, c.realPoints());
    }
  }

  private static Spec spec(String family) throws IOException, SpecException {
    try (InputStream in = IrrationalWallsTest.class.getResourceAsStream("irrational-walls.yaml")) {
      for (SpecResult result : SpecReader.read("irrational-walls.yaml", in.readAllBytes())) {
        Spec spec = result.orThrow();
        if (spec.family().equals(family)) {
          return spec;
        }
      }
    }
    throw new IllegalArgumentException("no family " + family);
  }
}
