package steelyard.problems;

import java.util.Set;

/**
 * What problems with one exactly known number as their answer have in common: they differ in how
 * that number and the scale of its errors follow from the input, and in nothing else.
 *
 * @param <D> the kind of input
 */
public abstract class ExactScalarProblem<D extends Data> implements Problem<D> {
  private final D data;
  private final int size;
  private final ScalarJudge judge;
  private final Set<String> traits;

  /**
   * Makes a problem.
   *
   * @param data the input
   * @param size n
   * @param judge the exact answer and the scale of its errors
   * @param traits what was verified of the input
   */
  protected ExactScalarProblem(D data, int size, ScalarJudge judge, Set<String> traits) {
    this.data = data;
    this.size = size;
    this.judge = judge;
    this.traits = Set.copyOf(traits);
  }

  @Override
  public final D data() {
    return data;
  }

  @Override
  public final int size() {
    return size;
  }

  @Override
  public final Condition condition() {
    return judge.condition();
  }

  @Override
  public final Reference reference() {
    return new ExactReference(judge.exact());
  }

  @Override
  public final Set<String> traits() {
    return traits;
  }

  @Override
  public final Judgement judge(double[] answer) {
    return judge.judge(answer);
  }
}
