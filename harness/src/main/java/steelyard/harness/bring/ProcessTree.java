package steelyard.harness.bring;

/** A process with those that it started. */
final class ProcessTree {
  private ProcessTree() {}

  /** Ends all of them, at once. */
  static void end(Process process) {
    process.descendants().forEach(ProcessHandle::destroyForcibly);
    process.destroyForcibly();
  }
}
