package rankfall.cli;

/** Says in one line what an exception says; nobody outside the project reads a stack. */
final class Cause {
  private Cause() {}

  /**
   * Names the kind of an exception and its message.
   *
   * @param thrown what was thrown
   * @return one line without a line end
   */
  static String oneLine(Throwable thrown) {
    String message = thrown.getMessage();
    String kind = thrown.getClass().getSimpleName();
    return message == null || message.isBlank()
        ? kind
        : kind + ": " + message.strip().replaceAll("\\s+", " ");
  }
}
