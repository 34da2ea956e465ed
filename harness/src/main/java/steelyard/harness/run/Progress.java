package steelyard.harness.run;

/** Hears how far a phase has come. Calls may come from several threads, never two at a time. */
@FunctionalInterface
public interface Progress {

  /** Hears nothing. */
  Progress SILENT = (phase, current, done, total) -> {};

  /**
   * Hears of a step.
   *
   * @param phase the phase, such as {@code accuracy} or {@code time}
   * @param current what is being measured
   * @param done how many steps are done
   * @param total how many there are
   */
  void step(String phase, String current, int done, int total);
}
