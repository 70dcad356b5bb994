package rankfall;

import java.time.Duration;

/**
 * What one family may cost.
 *
 * @param time wall-clock time
 * @param branches number of irreducible sets looked at
 */
public record Budget(Duration time, int branches) {
  /** Five minutes and 20 000 branches. */
  public static final Budget DEFAULT = new Budget(Duration.ofMinutes(5), 20_000);

  /** Checks that both are positive. */
  public Budget {
    if (time.isNegative() || time.isZero() || branches < 1) {
      throw new IllegalArgumentException("a budget must be positive");
    }
  }
}
