package steelyard.harness.run;

import static org.assertj.core.api.Assertions.assertThat;
import static steelyard.harness.run.ToyTask.candidate;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Predicate;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.algorithms.Candidate;
import steelyard.results.Observation;
import steelyard.results.Status;

/** A candidate that misbehaves costs its own rows a status and nothing else. */
final class HostileCandidatesTest {

  private static final Duration TIMEOUT = Duration.ofMillis(300);
  private static final int PROBLEMS = 5;

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 4})
  void everyKindOfMisbehaviourHasItsStatus(int threads) {
    List<Observation> rows = run(threads, hostile()).observations();

    assertThat(statuses(rows, "good")).containsOnly(Status.OK);
    assertThat(statuses(rows, "throws")).containsOnly(Status.EXCEPTION);
    assertThat(statuses(rows, "throws-without-message")).containsOnly(Status.EXCEPTION);
    assertThat(statuses(rows, "message-throws")).containsOnly(Status.EXCEPTION);
    assertThat(statuses(rows, "recurses")).containsOnly(Status.EXCEPTION);
    assertThat(statuses(rows, "nan")).containsOnly(Status.NAN);
    assertThat(statuses(rows, "null")).containsOnly(Status.MALFORMED);
    assertThat(statuses(rows, "too-short")).containsOnly(Status.MALFORMED);
    assertThat(statuses(rows, "modifies")).containsOnly(Status.MODIFIED_INPUT);
    assertThat(statuses(rows, "keeps-state")).containsOnly(Status.NONDETERMINISTIC);
    assertThat(statuses(rows, "last")).containsOnly(Status.OK);
  }

  @Test
  void aCallThatNeverReturnsTimesOutAndTheRestGoesOn() {
    CountDownLatch never = new CountDownLatch(1);
    List<Candidate<UnaryOperator<double[]>>> candidates =
        List.of(
            candidate("good", double[]::clone),
            candidate("hangs", values -> hang(never)),
            candidate("last", double[]::clone));
    AccuracyPhase.Outcome outcome = run(2, candidates);
    never.countDown();

    assertThat(outcome.complete()).isTrue();
    assertThat(outcome.strayCalls()).isEqualTo(PROBLEMS);
    assertThat(outcome.observations()).hasSize(3 * PROBLEMS);
    assertThat(statuses(outcome.observations(), "hangs")).containsOnly(Status.TIMEOUT);
    assertThat(statuses(outcome.observations(), "last")).containsOnly(Status.OK);
  }

  @Test
  void theRowsOfTheOthersDoNotChange() {
    List<Observation> alone =
        run(1, List.of(candidate("good", double[]::clone), candidate("last", double[]::clone)))
            .observations();
    List<Observation> among =
        run(4, hostile()).observations().stream()
            .filter(row -> row.candidate().equals("good") || row.candidate().equals("last"))
            .toList();
    assertThat(among).isEqualTo(alone);
  }

  @Test
  void rowsComeInTheOrderOfTheAssignments() {
    List<Observation> rows = run(4, hostile()).observations();
    List<String> order = new ArrayList<>();
    for (int repeat = 0; repeat < PROBLEMS; repeat++) {
      for (Candidate<?> each : hostile()) {
        order.add("toy/plain/n3/r" + repeat + " " + each.id());
      }
    }
    assertThat(rows.stream().map(row -> row.problem() + " " + row.candidate()).toList())
        .isEqualTo(order);
  }

  @Test
  void anInterruptedRunKeepsWholeProblems() {
    Interruption interruption = new Interruption();
    AtomicInteger steps = new AtomicInteger();
    Progress stopAfterTwo =
        (phase, current, done, total) -> {
          if (steps.incrementAndGet() == 2) {
            interruption.request();
          }
        };
    AccuracyPhase.Outcome outcome =
        new AccuracyPhase(1, stopAfterTwo, interruption)
            .run(new ToyTask(hostile()).assignments(PROBLEMS, TIMEOUT));
    assertThat(outcome.complete()).isFalse();
    assertThat(outcome.observations()).hasSize(2 * hostile().size());
  }

  private static AccuracyPhase.Outcome run(
      int threads, List<Candidate<UnaryOperator<double[]>>> candidates) {
    return new AccuracyPhase(threads, Progress.SILENT, new Interruption())
        .run(new ToyTask(candidates).assignments(PROBLEMS, TIMEOUT));
  }

  private static List<Status> statuses(List<Observation> rows, String candidate) {
    Predicate<Observation> own = row -> row.candidate().equals(candidate);
    List<Status> statuses = rows.stream().filter(own).map(Observation::status).toList();
    assertThat(statuses).hasSize(PROBLEMS);
    return statuses;
  }

  private static List<Candidate<UnaryOperator<double[]>>> hostile() {
    AtomicInteger calls = new AtomicInteger();
    return List.of(
        candidate("good", double[]::clone),
        candidate(
            "throws",
            values -> {
              throw new IllegalStateException("no");
            }),
        candidate(
            "throws-without-message",
            values -> {
              throw new AssertionError();
            }),
        candidate(
            "message-throws",
            values -> {
              throw new HostileException();
            }),
        candidate("recurses", HostileCandidatesTest::recurse),
        candidate("nan", values -> new double[] {1, Double.NaN, 1}),
        candidate("null", values -> null),
        candidate("too-short", values -> new double[] {1}),
        candidate(
            "modifies",
            values -> {
              double[] answer = values.clone();
              Arrays.sort(values);
              values[0] = -values[0];
              return answer;
            }),
        candidate("keeps-state", values -> new double[] {calls.incrementAndGet(), 1, 1}),
        candidate("last", double[]::clone));
  }

  private static double[] hang(CountDownLatch never) {
    boolean released = false;
    while (!released) {
      try {
        never.await();
        released = true;
      } catch (InterruptedException deaf) {
        Thread.interrupted();
      }
    }
    return new double[0];
  }

  @SuppressWarnings("InfiniteRecursion")
  private static double[] recurse(double[] values) {
    return recurse(values.clone());
  }

  private static final class HostileException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    @Override
    public String getMessage() {
      throw new IllegalStateException("not even a message");
    }
  }
}
