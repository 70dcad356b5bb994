package rankfall.cli;

import java.io.PrintWriter;
import java.util.Locale;

/** How far a scan has come, on a terminal; says nothing where nobody watches. */
final class ScanProgress {
  private static final long PAUSE = 250_000_000L;
  private static final double SECOND = 1e9;

  private final PrintWriter err;
  private final boolean watched;
  private long begun;
  private long total;
  private long done;
  private long last;
  private boolean shown;

  ScanProgress(PrintWriter err, boolean watched) {
    this.err = err;
    this.watched = watched;
  }

  /** The clock starts; says how many points there will be. */
  void begin(long points) {
    begun = System.nanoTime();
    total = points;
  }

  /** Notes that points are done. */
  void add(long points) {
    done += points;
    long now = System.nanoTime();
    if (watched && now - last > PAUSE) {
      last = now;
      shown = true;
      double seconds = (now - begun) / SECOND;
      double rate = done / seconds;
      err.print(
          String.format(
              Locale.ROOT,
              "\r%,d of %,d points, %,.0f a second, %,.0f s left   ",
              done,
              total,
              rate,
              (total - done) / rate));
      err.flush();
    }
  }

  /** Leaves the line of the terminal free. */
  void end() {
    if (shown) {
      err.print("\r" + " ".repeat(78) + "\r");
      err.flush();
    }
  }
}
