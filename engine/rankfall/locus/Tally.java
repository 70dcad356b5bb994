package rankfall.locus;

/**
 * Counts products of terms, so that a computation which grows too long ends after the same steps on
 * every machine.
 */
final class Tally {
  private final long limit;
  private long products;

  /** Starts at 0. */
  Tally(long limit) {
    this.limit = limit;
  }

  /** The count has reached its limit. */
  static final class Reached extends RuntimeException {
    private static final long serialVersionUID = 1L;

    Reached() {
      super("too long", null, false, false);
    }
  }

  /**
   * Counts products.
   *
   * @throws Reached at the limit
   */
  void add(long more) {
    products += more;
    if (products > limit) {
      throw new Reached();
    }
  }
}
