package rankfall;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import rankfall.Analysis.Region;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** The names of the algebras of regions. */
class RegionNamesTest {
  /**
   * On the circle a^2 + b^2 = 1 sample points of two quadrants may be conjugate, with the same
   * structure constants over the same field; only where a, b and 1 have one sign is it so(3)
   * (Milnor 1976, Curvatures of left invariant metrics on Lie groups, table of unimodular
   * algebras).
   */
  @Test
  void conjugatePointsHaveNamesOfTheirOwn() throws SpecException {
    String text =
        """
        family: circle
        parameters: [a, b]
        where: ["a^2 + b^2 = 1"]
        brackets: |
          [X, Y] = a*Z
          [Y, Z] = X
          [Z, X] = b*Y
        """;
    Spec spec = SpecReader.read("circle.yaml", text.getBytes(UTF_8)).get(0).orThrow();
    List<String> found =
        Engine.analyse(spec, Budget.DEFAULT).findings().orElseThrow().regions().stream()
            .filter(r -> r.stratum().equals("S1"))
            .map(RegionNamesTest::row)
            .toList();
    assertEquals(List.of("a < 0: sl(2,R)", "a > 0; b < 0: sl(2,R)", "a > 0; b > 0: so(3)"), found);
  }

  private static String row(Region r) {
    return String.join("; ", r.conditions().stream().map(Object::toString).toList())
        + ": "
        + r.type().orElseThrow().text();
  }
}
