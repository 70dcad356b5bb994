package rankfall.locus;

import java.time.Duration;
import java.util.Optional;

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
    branches++;
    check();
  }

  /**
   * Looks at the clock and the count.
   *
   * @throws Exhausted if the time or the branches are used up
   */
  public void check() {
    Optional<String> spent = spent();
    if (spent.isPresent()) {
      throw new Exhausted(spent.get());
    }
  }

  /**
   * What is used up.
   *
   * @return time or branches, in words; empty while there is some of both
   */
  public Optional<String> spent() {
    if (branches > limit) {
      return Optional.of("more than " + limit + " branches");
    }
    return System.nanoTime() > deadline ? Optional.of("out of time") : Optional.empty();
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
