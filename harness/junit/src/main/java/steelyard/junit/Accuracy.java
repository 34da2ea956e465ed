package steelyard.junit;

import java.time.Duration;
import java.util.List;
import java.util.Objects;
import java.util.function.Predicate;
import org.opentest4j.AssertionFailedError;
import steelyard.algorithms.Bound;
import steelyard.algorithms.Candidate;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.Status;

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
 * <p>The problems are the same every time: they follow from the families, the sizes and the seed.
 * Objects are immutable.
 *
 * @param <K> the interface of the task
 */
public final class Accuracy<K> {
  static final String SUBJECT = "subject";
  private static final String BASELINE = "baseline";

  private final Class<K> kernelType;
  private final K kernel;
  private final Trial trial;

  private Accuracy(Class<K> kernelType, K kernel, Trial trial) {
    this.kernelType = kernelType;
    this.kernel = kernel;
    this.trial = trial;
  }

  /**
   * Begins an assertion; as it stands, on every family of the task.
   *
   * @param kernelType the interface of the task, such as {@code Summation.class}
   * @param kernel the kernel
   */
  public static <K> Accuracy<K> of(Class<K> kernelType, K kernel) {
    return new Accuracy<>(
        Objects.requireNonNull(kernelType, "kernelType"),
        Objects.requireNonNull(kernel, "kernel"),
        Trial.STANDARD);
  }

  /** Tries these families of problems only. */
  public Accuracy<K> on(String... families) {
    return with(trial.onFamilies(List.of(families)));
  }

  /**
   * Tries condition numbers up to this one, two decades apart; unless it is said, a few up to 1e12
   * as far as each family reaches.
   */
  public Accuracy<K> upToCondition(double condition) {
    return with(trial.upToCondition(condition));
  }

  /** Tries problems of these sizes; unless it is said, of 100 or what the family has next to it. */
  public Accuracy<K> sizes(int... sizes) {
    return with(trial.ofSizes(sizes));
  }

  /** Tries so many problems of each kind; 3 unless it is said. */
  public Accuracy<K> repeats(int repeats) {
    return with(trial.withRepeats(repeats));
  }

  /** Takes the problems of another seed than 1. */
  public Accuracy<K> seed(long seed) {
    return with(trial.withSeed(seed));
  }

  /** Allows one call so long; 10 seconds unless it is said. */
  public Accuracy<K> timeout(Duration timeout) {
    return with(trial.withTimeout(timeout));
  }

  private Accuracy<K> with(Trial other) {
    return new Accuracy<>(kernelType, kernel, other);
  }

  /**
   * Asserts that the kernel is of this grade or a better one on all problems together.
   *
   * @throws AssertionFailedError if it is not
   * @throws IllegalArgumentException if there is no such family, or it makes no such problems
   */
  public void isAtLeast(Grade grade) {
    Measured<K> measured = measured(List.of(subject()));
    Grade found = measured.grade(SUBJECT);
    if (found.compareTo(grade) > 0) {
      throw measured.failure(
          SUBJECT,
          "to be at least " + grade.words() + ", but it is " + found.words(),
          row -> measured.isWorse(row, grade));
    }
  }

  /**
   * Asserts that a bound holds on every problem of which it says anything.
   *
   * @throws AssertionFailedError if it does not, or nothing was tried that it speaks of
   * @throws IllegalArgumentException if there is no such family, or it makes no such problems
   */
  public void staysWithin(Bound bound) {
    Measured<K> measured = measured(List.of(subject().claiming(bound)));
    measured.requireAnswers(SUBJECT);
    if (measured.rows(SUBJECT).stream().noneMatch(row -> row.claim().isPresent())) {
      throw new AssertionFailedError(
          "Expected the bound " + bound.text() + " to be tried, but it speaks of no problem here");
    }
    measured.require(
        SUBJECT,
        "to stay within " + bound.text(),
        row -> row.claim().isEmpty() || row.claim().get().held());
  }

  /**
   * Asserts that no relative forward error exceeds a limit.
   *
   * @throws AssertionFailedError if one does
   * @throws IllegalArgumentException if there is no such family, or it makes no such problems
   */
  public void hasForwardErrorUpTo(double limit) {
    Measured<K> measured = measured(List.of(subject()));
    measured.requireAnswers(SUBJECT);
    measured.require(
        SUBJECT,
        "to have forward errors up to " + limit,
        row -> !(row.forwardError().orElse(0) > limit));
  }

  /**
   * Asserts that no backward error exceeds a limit.
   *
   * @throws AssertionFailedError if one does
   * @throws IllegalArgumentException if there is no such family, or it makes no such problems
   */
  public void hasBackwardErrorUpTo(double limit) {
    Measured<K> measured = measured(List.of(subject()));
    measured.requireAnswers(SUBJECT);
    measured.require(
        SUBJECT,
        "to have backward errors up to " + limit,
        row -> !(row.backwardError().orElse(0) > limit));
  }

  /**
   * Asserts that on no family the kernel's largest forward error exceeds that of another kernel.
   *
   * @throws AssertionFailedError if it does somewhere
   * @throws IllegalArgumentException if there is no such family, or it makes no such problems
   */
  public void isNoLessAccurateThan(K baseline) {
    Candidate<K> other = candidate(BASELINE, baseline);
    Measured<K> measured = measured(List.of(subject(), other));
    measured.requireAnswers(SUBJECT);
    for (String family : measured.families()) {
      double allowed = measured.worst(BASELINE, family);
      Predicate<Observation> holds =
          row ->
              !row.family().equals(family)
                  || (row.status() != Status.OK && !row.status().isFailure())
                  || row.forwardError().orElse(0) <= allowed;
      measured.require(
          SUBJECT,
          "to be no less accurate than its baseline, whose worst error on "
              + family
              + " is "
              + allowed,
          holds);
    }
  }

  private Measured<K> measured(List<Candidate<K>> candidates) {
    return Measured.of(kernelType, trial, candidates);
  }

  private Candidate<K> subject() {
    return candidate(SUBJECT, kernel);
  }

  private static <K> Candidate<K> candidate(String id, K kernel) {
    return Candidate.of(id, kernel, "a kernel under test", "not stated", "this test");
  }
}
