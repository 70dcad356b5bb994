package rankfall;

/** How a polynomial compares with 0. */
public enum Comparison {
  EQUAL("="),
  UNEQUAL("!="),
  GREATER(">"),
  LESS("<"),
  NOT_LESS(">="),
  NOT_GREATER("<=");

  private final String symbol;

  Comparison(String symbol) {
    this.symbol = symbol;
  }

  /** As it is written between two numbers. */
  public String symbol() {
    return symbol;
  }

  /**
   * Whether a number of some sign compares so with 0.
   *
   * @param sign -1, 0 or 1
   */
  public boolean holds(int sign) {
    return switch (this) {
      case EQUAL -> sign == 0;
      case UNEQUAL -> sign != 0;
      case GREATER -> sign > 0;
      case LESS -> sign < 0;
      case NOT_LESS -> sign >= 0;
      case NOT_GREATER -> sign <= 0;
    };
  }
}
