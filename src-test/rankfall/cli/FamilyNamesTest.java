package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.List;
import org.junit.jupiter.api.Test;
import rankfall.spec.SpecResult;

final class FamilyNamesTest {
  @Test
  void differentNamesPass() {
    List<SpecResult> documents =
        List.of(Specs.read("a", "x.yaml", 1), Specs.read("b", "x.yaml", 9));
    assertEquals(documents, FamilyNames.distinct(documents));
  }

  @Test
  void theSecondOfTwoNamesBothPlaces() {
    List<SpecResult> checked =
        FamilyNames.distinct(
            List.of(
                Specs.read("a", "x.yaml", 1),
                Specs.read("b", "x.yaml", 5),
                Specs.read("a", "y.yaml", 3)));
    assertInstanceOf(SpecResult.Read.class, checked.get(0));
    assertInstanceOf(SpecResult.Read.class, checked.get(1));
    SpecResult.Faulty second = assertInstanceOf(SpecResult.Faulty.class, checked.get(2));
    assertEquals(
        "y.yaml:3:9: the family 'a' is described at x.yaml:1:9 already;"
            + " give one of them another name",
        second.diagnostics().get(0).headline());
  }
}
