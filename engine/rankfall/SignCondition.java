package rankfall;

import rankfall.exact.Polynomial;

/**
 * A sign condition.
 *
 * @param polynomial primitive
 * @param comparison with 0
 */
public record SignCondition(Polynomial polynomial, Comparison comparison) {
  /** The text of the condition: {@code b - c < 0}. */
  @Override
  public String toString() {
    return polynomial + " " + comparison.symbol() + " 0";
  }
}
