package steelyard.junit;

import java.time.Duration;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import org.opentest4j.AssertionFailedError;
import steelyard.algorithms.Bound;
import steelyard.algorithms.Candidate;
import steelyard.harness.data.DoubleText;
import steelyard.results.Grade;
import steelyard.results.verdict.GradeLimit;

/**
 * An assertion on the accuracy of a kernel:
 *
 * <pre>{@code
 * Accuracy.of(Summation.class, Totals::net)
 *     .on("cancelling", "random-signs")
 *     .upToCondition(1e12)
 *     .isAtLeast(Grade.BACKWARD_STABLE);
 * }</pre>
 *
 * <p>Unless it is said otherwise, it tries every family of the task, condition numbers from 1 to
 * 1e12 by decades, and from the seed 1 three problems of each kind of vectors, of size 10, 100 and
 * 1000, or one of each kind of matrices, of size 5 and 20: a few hundred problems, and the same
 * ones every time. A family with fewer sizes or condition numbers takes part with those that it
 * has.
 *
 * <p>The kernel is called from a thread of its own, twice on every problem, and nothing is tried
 * before something is asserted. What does not hold is an {@link AssertionFailedError} that shows
 * the worst problem; so is an assertion that leaves no problem to try. A name that does not exist
 * and a number out of range are an {@link IllegalArgumentException}. Objects are immutable.
 *
 * @param <K> the interface of the task
 */
public final class Accuracy<K> {
  static final String SUBJECT = "kernel";

  /** Equally good algorithms differ by their luck with roundings; one decimal digit tells. */
  private static final double FACTOR = 10;

  private final Trial<K, ?> trial;

  private Accuracy(Trial<K, ?> trial) {
    this.trial = trial;
  }

  /**
   * Begins an assertion; as it stands, on every family of the task.
   *
   * @param kernelType the interface of the task, such as {@code Summation.class}
   * @param kernel the kernel
   */
  public static <K> Accuracy<K> of(Class<K> kernelType, K kernel) {
    return of(
        kernelType,
        Candidate.of(
            SUBJECT,
            Objects.requireNonNull(kernel, "kernel"),
            "a kernel under test",
            "not stated",
            "this test"));
  }

  /**
   * Begins an assertion on a candidate, which says of itself what a bare kernel cannot: the
   * problems that it is for, its precision, that its answer depends on the number of cores.
   *
   * @param kernelType the interface of the task, such as {@code Summation.class}
   * @param candidate the candidate
   */
  public static <K> Accuracy<K> of(Class<K> kernelType, Candidate<K> candidate) {
    return new Accuracy<>(Trial.usual(kernelType, candidate));
  }

  /** Tries these families of problems only. */
  public Accuracy<K> on(String... families) {
    return new Accuracy<>(trial.on(List.of(families)));
  }

  /** Leaves these families out. */
  public Accuracy<K> except(String... families) {
    return new Accuracy<>(trial.except(List.of(families)));
  }

  /** Tries condition numbers up to this one. */
  public Accuracy<K> upToCondition(double largest) {
    return new Accuracy<>(trial.with(scenario -> scenario.upToCondition(largest)));
  }

  /** Tries problems of these sizes; a family that is named must make them all. */
  public Accuracy<K> sizes(int... sizes) {
    List<Integer> wanted = Arrays.stream(sizes).boxed().toList();
    return new Accuracy<>(trial.with(scenario -> scenario.sizes(wanted)));
  }

  /** Tries so many problems of each family, condition number and size. */
  public Accuracy<K> repeats(int repeats) {
    return new Accuracy<>(trial.with(scenario -> scenario.repeats(repeats)));
  }

  /** Takes the problems of another seed than 1. */
  public Accuracy<K> seed(long seed) {
    return new Accuracy<>(trial.with(scenario -> scenario.seed(seed)));
  }

  /** Allows one call so long; two seconds unless it is said. */
  public Accuracy<K> timeout(Duration longest) {
    return new Accuracy<>(trial.with(scenario -> scenario.timeout(longest)));
  }

  /**
   * Says what must be true of a problem for the kernel to be meant for it, such as {@code
   * positive-definite}; other problems are skipped.
   */
  public Accuracy<K> requiring(String... traits) {
    return new Accuracy<>(trial.requiring(List.of(traits)));
  }

  /**
   * Asserts that the kernel is of this grade or a better one on all problems together. A grade of
   * rounding takes 20 problems to prove, one of k-fold precision takes condition numbers at which
   * less precision shows.
   */
  public void isAtLeast(Grade grade) {
    trial.check(new GradeCheck(new GradeLimit(grade)));
  }

  /** Asserts that a bound holds on every problem of which it says anything. */
  public void staysWithin(Bound bound) {
    trial.claiming(bound).check(new BoundCheck(bound));
  }

  /** Asserts that no relative forward error exceeds a limit. */
  public void hasForwardErrorUpTo(double limit) {
    staysWithin(Bound.forward((n, kappa, u) -> limit, text(limit), ""));
  }

  /** Asserts that no (normwise) backward error exceeds a limit. */
  public void hasBackwardErrorUpTo(double limit) {
    staysWithin(Bound.backward((n, kappa, u) -> limit, text(limit), ""));
  }

  /**
   * Asserts that no forward error is more than ten times as large as the worst that another kernel
   * has on problems of the same family, or than the unit roundoff where that is larger. An error of
   * the other on a harder problem counts in proportion to the condition numbers. So two kernels
   * that are equally good hold against each other, whichever has more luck with its roundings.
   * Problems on which the other gives no answer do not count.
   */
  public void isNoLessAccurateThan(K baseline) {
    isNoLessAccurateThan(baseline, FACTOR);
  }

  /**
   * Asserts the same with another factor than ten.
   *
   * @param factor at least 1
   */
  public void isNoLessAccurateThan(K baseline, double factor) {
    if (!(factor >= 1 && factor <= Double.MAX_VALUE)) {
      throw new IllegalArgumentException("the factor must be finite and at least 1");
    }
    trial.compare(Objects.requireNonNull(baseline, "baseline"), factor);
  }

  private static String text(double limit) {
    if (!(limit >= 0)) {
      throw new IllegalArgumentException("the largest error must be a number from 0");
    }
    return DoubleText.shortest(limit);
  }
}
