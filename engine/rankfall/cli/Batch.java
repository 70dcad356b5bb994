package rankfall.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;
import rankfall.Analysis;
import rankfall.Version;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecResult;

/** Families side by side, each on one thread; what goes wrong in one never reaches another. */
final class Batch {
  private final Work work;
  private final int threads;
  private final Consumer<String> done;

  /** What is done with each family: analysed, and its folder written. */
  interface Work {
    /** Called on several threads at once, each family once. */
    Analysis on(Spec spec) throws Exception;
  }

  /**
   * A batch that has not begun.
   *
   * @param work what is done with each family
   * @param threads how many families at the same time, at least 1
   * @param done hears the name of each family that has ended, on the thread that did the work
   */
  Batch(Work work, int threads, Consumer<String> done) {
    this.work = work;
    this.threads = threads;
    this.done = done;
  }

  /**
   * Works through the documents.
   *
   * @param documents in the order of the call
   * @return one outcome each, in the same order whatever the number of threads
   * @throws InterruptedException if this thread was interrupted while it waited
   */
  List<Outcome> run(List<SpecResult> documents) throws InterruptedException {
    ExecutorService pool = Executors.newFixedThreadPool(threads, Batch::daemon);
    try {
      List<Future<Outcome>> running = new ArrayList<>();
      for (SpecResult document : documents) {
        running.add(pool.submit(() -> outcome(document)));
      }
      List<Outcome> outcomes = new ArrayList<>();
      for (int i = 0; i < running.size(); i++) {
        outcomes.add(await(running.get(i), documents.get(i)));
      }
      return List.copyOf(outcomes);
    } finally {
      pool.shutdownNow();
    }
  }

  private Outcome outcome(SpecResult document) throws Exception {
    if (document instanceof SpecResult.Read read) {
      try {
        return new Outcome.Analysed(work.on(read.spec()));
      } catch (SpecException e) {
        return new Outcome.Refused(
            new SpecResult.Faulty(Optional.of(read.spec().family()), e.diagnostics()));
      } finally {
        done.accept(read.spec().family());
      }
    }
    return new Outcome.Refused((SpecResult.Faulty) document);
  }

  private static Outcome await(Future<Outcome> running, SpecResult document)
      throws InterruptedException {
    try {
      return running.get();
    } catch (ExecutionException e) {
      if (document instanceof SpecResult.Read read) {
        return new Outcome.Analysed(broken(read.spec(), e.getCause()));
      }
      throw new IllegalStateException(e.getCause());
    }
  }

  private static Analysis broken(Spec spec, Throwable cause) {
    return new Analysis(
        spec,
        Version.text(),
        Analysis.Status.FAILED,
        "internal error in family " + spec.family() + ": " + Cause.oneLine(cause),
        List.of(),
        List.of(),
        Optional.empty());
  }

  private static Thread daemon(Runnable task) {
    Thread thread = new Thread(task, "family");
    thread.setDaemon(true);
    return thread;
  }
}
