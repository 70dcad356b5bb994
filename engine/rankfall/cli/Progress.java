package rankfall.cli;

import java.io.PrintWriter;
import java.util.concurrent.atomic.AtomicInteger;

/** Counts ended families on a terminal; says nothing where nobody watches. */
final class Progress {
  private final PrintWriter err;
  private final boolean watched;
  private final int total;
  private final AtomicInteger ended = new AtomicInteger();

  Progress(PrintWriter err, boolean watched, int total) {
    this.err = err;
    this.watched = watched;
    this.total = total;
  }

  /** Notes that a family has ended; may be called on any thread. */
  void ended(String family) {
    int number = ended.incrementAndGet();
    if (watched) {
      err.print("[" + number + "/" + total + "] " + family + System.lineSeparator());
      err.flush();
    }
  }
}
