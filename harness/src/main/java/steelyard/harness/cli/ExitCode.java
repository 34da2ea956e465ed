package steelyard.harness.cli;

/** The exit codes of every command. */
final class ExitCode {

  static final int DONE = 0;

  /** A requirement that no candidate meets, or a claimed bound that was broken. */
  static final int FINDING = 1;

  static final int BAD_INPUT = 2;
  static final int INTERNAL_ERROR = 3;

  /** Interrupted, so that some cells are missing. */
  static final int INCOMPLETE = 4;

  private ExitCode() {}
}
