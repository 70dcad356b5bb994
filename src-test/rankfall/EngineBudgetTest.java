package rankfall;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import rankfall.Analysis.Component;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Status;
import rankfall.Analysis.Stratum;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** Whatever the budget, what is said is what an unhurried analysis says; what is not is listed. */
class EngineBudgetTest {

  @ParameterizedTest
  @ValueSource(strings = {"metric-rotations-3", "bianchi-types", "merging-frames"})
  void whatASmallBudgetLeavesIsTrue(String name) throws IOException, SpecException {
    Path file = Path.of("specs", name + ".yaml");
    Spec spec = SpecReader.read(file.toString(), Files.readAllBytes(file)).get(0).orThrow();
    Analysis whole = Engine.analyse(spec, Budget.DEFAULT);
    assertEquals(Status.COMPLETE, whole.status(), whole.message());
    Findings all = whole.findings().orElseThrow();
    int branches = 1;
    Analysis part = Engine.analyse(spec, new Budget(Duration.ofHours(1), branches));
    assertEquals(Status.INCOMPLETE, part.status());
    while (part.status() == Status.INCOMPLETE) {
      Findings some = part.findings().orElseThrow();
      assertEquals(part.undecided().get(0), part.message());
      assertTrue(part.message().contains("more than " + branches + " branches"), part.message());
      some.components()
          .forEach(c -> assertTrue(all.components().stream().anyMatch(d -> isPart(c, d))));
      assertTrue(some.strata().isEmpty() || areParts(some.strata(), all.strata()));
      assertTrue(all.coverings().containsAll(some.coverings()));
      assertEquals(all.poles(), some.poles());
      branches += 1 + branches / 3;
      part = Engine.analyse(spec, new Budget(Duration.ofHours(1), branches));
    }
    assertEquals(whole, part);
  }

  /**
   * Whether the same is said of a component, conditions and signature apart that are still open.
   */
  private static boolean isPart(Component some, Component all) {
    return some.equations().equals(all.equations())
        && some.basis().equals(all.basis())
        && some.structure().equals(all.structure())
        && some.killing().entries().equals(all.killing().entries())
        && some.killing().rank() == all.killing().rank()
        && some.killing().determinant().equals(all.killing().determinant())
        && some.dual().equals(all.dual())
        && some.conditions().stream()
            .allMatch(c -> all.conditions().stream().anyMatch(d -> isSame(c, d)));
  }

  /** The same locus and rank; a kernel has many bases. */
  private static boolean isSame(Condition c, Condition d) {
    return c.equations().equals(d.equations())
        && c.multiplicity().equals(d.multiplicity())
        && c.rank().equals(d.rank())
        && c.kernel().size() == d.kernel().size()
        && c.realPoints() == d.realPoints();
  }

  /** The same strata, of which names and invariant forms may be missing. */
  private static boolean areParts(List<Stratum> some, List<Stratum> all) {
    if (some.size() != all.size()) {
      return false;
    }
    for (int k = 0; k < some.size(); k++) {
      if (!bare(some.get(k)).equals(bare(all.get(k)))
          || some.get(k).type().isPresent() && !some.get(k).type().equals(all.get(k).type())) {
        return false;
      }
    }
    return true;
  }

  private static List<Object> bare(Stratum s) {
    return List.of(
        s.name(),
        s.equations(),
        s.exclusions(),
        s.codimension(),
        s.dimension(),
        s.rank(),
        s.derived(),
        s.centre(),
        s.radical(),
        s.nilradical(),
        s.kind(),
        s.realPoints(),
        s.witness(),
        s.basis(),
        s.kernel(),
        s.remarks());
  }
}
