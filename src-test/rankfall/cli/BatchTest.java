package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentSkipListSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import rankfall.Analysis;
import rankfall.spec.Spec;
import rankfall.spec.SpecResult;

final class BatchTest {
  private static final List<SpecResult> DOCUMENTS =
      List.of(
          Specs.read("slow", "x.yaml", 1),
          Specs.faulty("bad", "x.yaml"),
          Specs.read("quick", "x.yaml", 3));

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 8})
  void outcomesStandInTheOrderOfTheDocuments(int threads) throws InterruptedException {
    Set<String> ended = new ConcurrentSkipListSet<>();
    List<Outcome> outcomes =
        new Batch(
                spec -> {
                  Thread.sleep(spec.family().equals("slow") ? 50 : 0);
                  return complete(spec);
                },
                threads,
                ended::add)
            .run(DOCUMENTS);
    assertEquals("slow", analysed(outcomes.get(0)).spec().family());
    assertInstanceOf(Outcome.Refused.class, outcomes.get(1));
    assertEquals("quick", analysed(outcomes.get(2)).spec().family());
    assertEquals(Set.of("quick", "slow"), ended);
  }

  @Test
  void anExceptionFailsItsFamilyOnly() throws InterruptedException {
    List<Outcome> outcomes =
        new Batch(
                spec -> {
                  if (spec.family().equals("slow")) {
                    throw new IllegalStateException("pivot\n is 0");
                  }
                  return complete(spec);
                },
                1,
                family -> {})
            .run(DOCUMENTS);
    Analysis failed = analysed(outcomes.get(0));
    assertEquals(Analysis.Status.FAILED, failed.status());
    assertEquals(
        "internal error in family slow: IllegalStateException: pivot is 0", failed.message());
    assertEquals(Analysis.Status.COMPLETE, analysed(outcomes.get(2)).status());
  }

  @Test
  void aStackThatOverflowsFailsItsFamilyOnly() throws InterruptedException {
    List<Outcome> outcomes =
        new Batch(spec -> endless(spec, 0), 2, family -> {}).run(DOCUMENTS.subList(0, 1));
    assertEquals(
        "internal error in family slow: StackOverflowError", analysed(outcomes.get(0)).message());
  }

  private static Analysis endless(Spec spec, int depth) {
    return depth < 0 ? complete(spec) : endless(spec, (depth + 1) & Integer.MAX_VALUE);
  }

  private static Analysis analysed(Outcome outcome) {
    return assertInstanceOf(Outcome.Analysed.class, outcome).analysis();
  }

  private static Analysis complete(Spec spec) {
    return new Analysis(
        spec, "1", Analysis.Status.COMPLETE, "", List.of(), List.of(), Optional.empty());
  }
}
