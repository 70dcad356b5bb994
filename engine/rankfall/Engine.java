package rankfall;

import java.time.Duration;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BiFunction;
import rankfall.lie.AdjointTraces;
import rankfall.lie.Family;
import rankfall.locus.Meter;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/**
 * The front door of the library: a spec in, an analysis out.
 *
 * <p>Calls may run side by side. Each works on a thread of its own, which is left behind where a
 * computation that cannot be interrupted does not end in time.
 */
public final class Engine {
  private static final Duration GRACE = Duration.ofSeconds(2);

  private Engine() {}

  /** Loads what the first analysis needs, so that it may happen while specs are read. */
  public static void warmUp() {
    AdjointTraces.warmUp();
  }

  /**
   * Analyses a family, and counts its default grid, if it has one.
   *
   * @param spec as read
   * @param budget what it may cost
   * @return complete, or incomplete with what was left undecided, or failed with the reason
   * @throws SpecException if the spec describes no family: what is wrong, with places
   */
  public static Analysis analyse(Spec spec, Budget budget) throws SpecException {
    return analyse(spec, budget, ScanFindings::added);
  }

  /**
   * Analyses a family for somebody who asks for points: the default grid is left alone.
   *
   * @param spec as read
   * @param budget what it may cost
   * @return as {@link #analyse}, without the counts of a grid
   * @throws SpecException if the spec describes no family: what is wrong, with places
   */
  public static Analysis withoutGrid(Spec spec, Budget budget) throws SpecException {
    return analyse(spec, budget, (analysis, meter) -> analysis);
  }

  private static Analysis analyse(
      Spec spec, Budget budget, BiFunction<Analysis, Meter, Analysis> last) throws SpecException {
    Family family = Family.of(spec);
    Meter meter = new Meter(budget.time(), budget.branches());
    AtomicReference<Analysis> latest =
        new AtomicReference<>(FamilyFindings.nothingYet(spec, family));
    FutureTask<Analysis> task =
        new FutureTask<>(
            () -> {
              Analysis found = FamilyFindings.of(spec, family, meter, latest::set);
              latest.set(found);
              return last.apply(found, meter);
            });
    Thread thread = new Thread(task, "analysis");
    thread.setDaemon(true);
    thread.start();
    try {
      return task.get(budget.time().plus(GRACE).toMillis(), TimeUnit.MILLISECONDS);
    } catch (TimeoutException e) {
      return latest.get();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return latest.get();
    } catch (ExecutionException e) {
      throw unchecked(e.getCause());
    }
  }

  private static RuntimeException unchecked(Throwable cause) {
    if (cause instanceof Error error) {
      throw error;
    }
    return cause instanceof RuntimeException r ? r : new IllegalStateException(cause);
  }
}
