package rankfall.house;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.EvaluationResult;
import java.net.URL;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import rankfall.Analysis;

/** The house keeps its laws, and each law can be broken. */
final class HouseLawsTest {
  @TestFactory
  Stream<DynamicTest> theHouseKeepsEachLaw() {
    JavaClasses house = house();
    return new HouseLaws("rankfall")
        .all().stream()
            .map(law -> DynamicTest.dynamicTest(law.getDescription(), () -> law.check(house)));
  }

  @TestFactory
  Stream<DynamicTest> aHouseThatBreaksAllLawsIsRefusedByEach() {
    JavaClasses broken =
        new ClassFileImporter().importUrl(HouseLawsTest.class.getResource("broken"));
    return new HouseLaws("rankfall.house.broken")
        .all().stream()
            .map(law -> DynamicTest.dynamicTest(law.getDescription(), () -> refused(law, broken)));
  }

  @Test
  void theLawsSeeTheWholeHouse() {
    JavaClasses house = house();
    assertTrue(house.contain("rankfall.Analysis"));
    assertTrue(house.contain("rankfall.cli.Rankfall"));
    assertFalse(house.contain("rankfall.house.HouseLawsTest"));
  }

  private static JavaClasses house() {
    URL classes = Analysis.class.getProtectionDomain().getCodeSource().getLocation();
    return new ClassFileImporter().importUrl(classes);
  }

  private static void refused(ArchRule law, JavaClasses broken) {
    EvaluationResult result = law.evaluate(broken);
    assertTrue(result.hasViolation(), "nothing in the broken house breaks: " + law);
  }
}
