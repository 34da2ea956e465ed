package steelyard.harness.plan;

import java.util.List;

/**
 * How long each candidate is timed.
 *
 * @param forks JVMs that are started, one after the other
 * @param warmup iterations in each that do not count
 * @param measurement iterations in each that count
 * @param iterationMs length of an iteration in milliseconds
 * @param sizes the sizes at which candidates are timed; empty: the sizes at which they are weighed
 */
public record TimingEffort(
    int forks, int warmup, int measurement, int iterationMs, List<Integer> sizes) {

  /** Copies the list. */
  public TimingEffort {
    sizes = List.copyOf(sizes);
  }
}
