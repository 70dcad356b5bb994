package rankfall.scan;

/**
 * A polynomial made ready to tell its sign at the points of a line, what is the same along the line
 * being computed once. One thread at a time.
 */
abstract class SignForm {
  private final boolean varies;
  private long line = -1;
  private int onLine;

  /**
   * A form.
   *
   * @param varies whether the coordinate along the line occurs
   */
  SignForm(boolean varies) {
    this.varies = varies;
  }

  /** The exact sign, -1, 0 or 1. */
  final int sign(Coordinates at) {
    if (line != at.line()) {
      line = at.line();
      enter(at);
      onLine = varies ? 0 : here(at);
    }
    return varies ? here(at) : onLine;
  }

  /** Prepares the line. */
  abstract void enter(Coordinates at);

  /** The sign at a point of the line. */
  abstract int here(Coordinates at);
}
