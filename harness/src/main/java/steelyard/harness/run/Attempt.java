package steelyard.harness.run;

import java.util.Arrays;
import steelyard.algorithms.Candidate;
import steelyard.harness.data.PartsCopy;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.results.Status;

/**
 * What a candidate did with an input: an answer, or the way in which it gave none.
 *
 * @param status {@link Status#OK} if there is an answer to judge, which may still be null
 * @param detail what went wrong, in a few words; empty where nothing did
 * @param answer the answer, if there is one
 */
public record Attempt(Status status, String detail, double[] answer) {

  /** What a table says of a candidate that changed its input. */
  public static final String MODIFIED = "the input differs after the call";

  /**
   * Calls a candidate twice, each time on a copy of its own, and lets nothing that it throws
   * escape.
   *
   * <p>The second call is made because an answer that varies between calls cannot be judged by one
   * of them. A candidate that says its answer depends on the number of cores is called once.
   */
  static <K, D extends Data> Attempt of(Task<K, D> task, Candidate<K> candidate, D data) {
    D copy = task.data(PartsCopy.of(data.parts()));
    try {
      double[] first = task.apply(candidate.kernel(), copy);
      if (!PartsCopy.sameBits(data.parts(), copy.parts())) {
        return new Attempt(Status.MODIFIED_INPUT, MODIFIED, null);
      }
      if (!candidate.dependsOnCores() && !sameBits(first, task.apply(candidate.kernel(), copy))) {
        return new Attempt(
            Status.NONDETERMINISTIC, "two calls on the same input gave different answers", null);
      }
      return new Attempt(Status.OK, "", first);
    } catch (Mishap elsewhere) {
      return new Attempt(elsewhere.status(), elsewhere.getMessage(), null);
    } catch (Throwable thrown) {
      return new Attempt(Status.EXCEPTION, describe(thrown), null);
    }
  }

  static Attempt timedOut(long millis) {
    return new Attempt(Status.TIMEOUT, "no answer within " + millis + " ms", null);
  }

  static Attempt notApplicable() {
    return new Attempt(Status.NOT_APPLICABLE, "", null);
  }

  private static boolean sameBits(double[] one, double[] other) {
    if (one == null || other == null) {
      return one == other;
    }
    long[] left = Arrays.stream(one).mapToLong(Double::doubleToLongBits).toArray();
    long[] right = Arrays.stream(other).mapToLong(Double::doubleToLongBits).toArray();
    return Arrays.equals(left, right);
  }

  /**
   * Returns what a table says of something that was thrown, whatever that does when it is asked.
   */
  public static String describe(Throwable thrown) {
    String message;
    try {
      message = thrown.getMessage();
    } catch (Throwable hostile) {
      message = null;
    }
    String name = thrown.getClass().getSimpleName();
    return message == null || message.isBlank() ? name : name + ": " + message;
  }
}
