package rankfall.cli;

/** What the process tells its caller; see the contract of the command line in the README. */
final class ExitStatus {
  /** All was done. */
  static final int DONE = 0;

  /** Some family or point failed, or stayed incomplete. */
  static final int INCOMPLETE = 1;

  /** The call itself was wrong; nothing was done. */
  static final int WRONG_CALL = 2;

  private ExitStatus() {}
}
