package steelyard.harness.cli;

/**
 * What the process was told about the screen it writes to. The launcher knows whether standard
 * error is a terminal; Java cannot tell reliably on every version.
 */
record Screen(boolean terminal, boolean colour) {

  static Screen ofProcess() {
    boolean terminal = Boolean.getBoolean("steelyard.terminal");
    String noColour = System.getenv("NO_COLOR");
    return new Screen(terminal, terminal && (noColour == null || noColour.isEmpty()));
  }
}
