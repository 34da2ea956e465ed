package steelyard.problems;

import java.util.Set;

/**
 * One instance of a task: the input as stored doubles, its certified answer, its achieved condition
 * number, and the judging of any answer. Nothing outside a problem computes an error.
 *
 * @param <D> the kind of input
 */
public interface Problem<D extends Data> {

  /** Returns the input. Callers do not modify it. */
  D data();

  /** Returns n, the number that error bounds depend on. */
  int size();

  /** Returns the achieved condition number of the stored data. */
  Condition condition();

  /** Returns the certified answer. */
  Reference reference();

  /**
   * Returns what was verified of the input, each a short phrase such as {@code positive-definite}
   * or {@code no-underflow}.
   */
  Set<String> traits();

  /**
   * Judges an answer. Errors are computed exactly or with a certified enclosure, and only then
   * rounded.
   *
   * @param answer the candidate's answer, one entry for a scalar task; may be null, of the wrong
   *     length, or not finite, which the judgement then says
   */
  Judgement judge(double[] answer);
}
