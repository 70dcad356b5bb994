package rankfall.locus;

import java.time.Duration;

/**
 * Counts branches and watches the time of one family; asked often, ends a computation by throwing.
 */
public final class Meter {
  private final long deadline;
  private final int limit;
  private int branches;

  /**
   * Starts the clock.
   *
   * @param time wall-clock time from now
   * @param branches how many branches may be looked at
   */
  public Meter(Duration time, int branches) {
    this.deadline = System.nanoTime() + time.toNanos();
    this.limit = branches;
  }

  /**
   * Counts one branch.
   *
   * @throws Exhausted if the time or the branches are used up
   */
  public void branch() {
    if (++branches > limit) {
      throw new Exhausted("more than " + limit + " branches");
    }
    check();
  }

  /**
   * Looks at the clock.
   *
   * @throws Exhausted if the time is used up
   */
  public void check() {
    if (System.nanoTime() > deadline) {
      throw new Exhausted("out of time");
    }
  }

  /** How many branches were looked at. */
  public int branches() {
    return branches;
  }

  /** The budget is used up; the message says of what. */
  public static final class Exhausted extends RuntimeException {
    private static final long serialVersionUID = 1L;

    Exhausted(String what) {
      super(what);
    }
  }
}
