package steelyard.harness.timing;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import steelyard.harness.data.DataFile;
import steelyard.harness.plan.TimingEffort;
import steelyard.harness.run.Interruption;
import steelyard.harness.run.Progress;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Data;
import steelyard.problems.ProblemId;
import steelyard.results.Timing;

final class TimingPhaseTest {

  private static final TimingEffort EFFORT = new TimingEffort(1, 1, 3, 10, List.of());
  private static final Data.Vector X = new Data.Vector("x", new double[] {1, 2, 3, 4});
  private static final Data.Vector Y = new Data.Vector("y", new double[] {5, 6, 7, 8});

  private final List<Path> files = new ArrayList<>();

  @Test
  void ratiosCompareToTheTextbookCandidateWithTheIntervalsTakenTheUnfavourableWay()
      throws IOException {
    Map<String, Score> scores =
        Map.of(
            "recursive", new Score(100, 80, 125, OptionalDouble.of(0)),
            "dot2", new Score(300, 250, 400, OptionalDouble.of(16)));
    List<Timing> rows = run(scores, entry("recursive"), entry("dot2")).timings();

    Timing textbook = rows.get(0);
    assertThat(textbook.ratio()).hasValue(1);
    assertThat(textbook.timePerElementNs()).hasValue(25);
    Timing other = rows.get(1);
    assertThat(other.textbook()).isEqualTo("recursive");
    assertThat(other.ratio()).hasValue(3);
    assertThat(other.ratioLow()).hasValue(2);
    assertThat(other.ratioHigh()).hasValue(5);
    assertThat(other.allocatedBytes()).hasValue(16);
    assertThat(other.timeLowNs()).hasValue(250);
  }

  @Test
  void aCandidateWithAnObstacleOrAFailureHasARowWithoutAFigure() throws IOException {
    Map<String, Score> scores = Map.of("recursive", new Score(1, 1, 1, OptionalDouble.empty()));
    TimingPhase.Outcome outcome =
        run(
            scores,
            entry("recursive"),
            entry("dot2"),
            new TimingJob.Entry("exact", Optional.of("not applicable")));
    assertThat(outcome.complete()).isTrue();
    assertThat(outcome.timings().get(1).timeNs()).isEmpty();
    assertThat(outcome.timings().get(1).detail()).isEqualTo("it broke");
    assertThat(outcome.timings().get(2).timeNs()).isEmpty();
    assertThat(outcome.timings().get(2).detail()).isEqualTo("not applicable");
  }

  @Test
  void aBusyMachineLeavesThePhaseIncompleteAndSaysWhy() throws IOException {
    Stopwatch stopwatch =
        (task, candidate, data, effort) -> {
          throw new MachineBusyException("somebody else is measuring", null);
        };
    TimingPhase.Outcome outcome =
        new TimingPhase(stopwatch, EFFORT, Progress.SILENT, new Interruption())
            .run(List.of(job(entry("recursive"))));
    assertThat(outcome.complete()).isFalse();
    assertThat(outcome.busy()).contains("somebody else is measuring");
    assertThat(outcome.timings()).isEmpty();
  }

  @Test
  void withoutTheTextbookCandidateThereIsNoRatio() throws IOException {
    Map<String, Score> scores = Map.of("dot2", new Score(300, 250, 400, OptionalDouble.empty()));
    Timing row = run(scores, entry("dot2")).timings().get(0);
    assertThat(row.timeNs()).hasValue(300);
    assertThat(row.ratio()).isEmpty();
  }

  @Test
  void theInputIsHandedOverBitForBitAndLeavesNoFileBehind() throws IOException {
    run(Map.of(), entry("dot2"));
    assertThat(files).hasSize(1);
    assertThat(Files.exists(files.get(0))).isFalse();
  }

  @Test
  void anInterruptedPhaseKeepsWhatWasMeasured() throws IOException {
    Interruption interruption = new Interruption();
    Stopwatch stopwatch =
        (task, candidate, data, effort) -> {
          if (candidate.equals("dot2")) {
            interruption.request();
          }
          return new Score(1, 1, 1, OptionalDouble.empty());
        };
    TimingPhase.Outcome outcome =
        new TimingPhase(stopwatch, EFFORT, Progress.SILENT, interruption)
            .run(List.of(job(entry("recursive")), job(entry("dot2"), entry("exact"))));
    assertThat(outcome.complete()).isFalse();
    assertThat(outcome.timings())
        .extracting(Timing::candidate)
        .containsExactly("recursive", "dot2");
  }

  private TimingPhase.Outcome run(Map<String, Score> scores, TimingJob.Entry... entries)
      throws IOException {
    Stopwatch stopwatch =
        (task, candidate, data, effort) -> {
          files.add(data);
          assertThat(readBits(data)).isEqualTo(List.of(1.0, 2.0, 3.0, 4.0, 5.0, 6.0, 7.0, 8.0));
          Score score = scores.get(candidate);
          if (score == null) {
            throw new TimingException("it broke", null);
          }
          return score;
        };
    return new TimingPhase(stopwatch, EFFORT, Progress.SILENT, new Interruption())
        .run(List.of(job(entries)));
  }

  private static List<Double> readBits(Path file) {
    List<Double> values = new ArrayList<>();
    try {
      for (Data.Part part : DataFile.read(file)) {
        for (double value : ((Data.Vector) part).values()) {
          values.add(value);
        }
      }
    } catch (IOException unreadable) {
      throw new AssertionError(unreadable);
    }
    return values;
  }

  private static TimingJob.Entry entry(String candidate) {
    return new TimingJob.Entry(candidate, Optional.empty());
  }

  private static TimingJob<?, ?> job(TimingJob.Entry... entries) {
    return job(Tasks.find("dot").orElseThrow(), List.of(entries));
  }

  private static <K, D extends Data> TimingJob<K, D> job(
      Task<K, D> task, List<TimingJob.Entry> entries) {
    ProblemId id = new ProblemId("dot", "same-sign", OptionalDouble.empty(), 4, 1, 1);
    return new TimingJob<>(task, id, task.data(List.of(X, Y)), entries);
  }
}
