package steelyard.harness.timing;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import steelyard.harness.data.DataFile;
import steelyard.harness.plan.TimingEffort;
import steelyard.harness.run.Interruption;
import steelyard.harness.run.Progress;
import steelyard.problems.Data;
import steelyard.results.Timing;

/** Times candidates one after the other, with nothing else running. */
public final class TimingPhase {

  private static final String NAME = "time";

  private final Stopwatch stopwatch;
  private final TimingEffort effort;
  private final Progress progress;
  private final Interruption interruption;

  /** Prepares the phase. */
  public TimingPhase(
      Stopwatch stopwatch, TimingEffort effort, Progress progress, Interruption interruption) {
    this.stopwatch = stopwatch;
    this.effort = effort;
    this.progress = progress;
    this.interruption = interruption;
  }

  /**
   * What the phase found.
   *
   * @param timings the rows, in the order of the jobs
   * @param complete whether every candidate was measured or had an obstacle
   * @param busy why the machine could not be used, if that is why it is incomplete
   */
  public record Outcome(List<Timing> timings, boolean complete, Optional<String> busy) {

    /** Nothing was to be timed. */
    public static final Outcome NONE = new Outcome(List.of(), true, Optional.empty());
  }

  /**
   * Times every candidate.
   *
   * @throws IOException if the inputs cannot be handed over through the temporary directory
   */
  public Outcome run(List<TimingJob<?, ?>> jobs) throws IOException {
    int total = jobs.stream().mapToInt(job -> job.candidates().size()).sum();
    List<Timing> rows = new ArrayList<>();
    int done = 0;
    for (TimingJob<?, ?> job : jobs) {
      if (interruption.requested()) {
        break;
      }
      Path file = Files.createTempFile("steelyard-input", ".bin");
      try {
        DataFile.write(file, job.input().parts());
        Map<String, Measured> measured = measure(job, file, done, total);
        done += measured.size();
        rows.addAll(rows(job, measured));
      } catch (MachineBusyException busy) {
        return new Outcome(rows, false, Optional.of(busy.getMessage()));
      } finally {
        Files.deleteIfExists(file);
      }
    }
    if (total > 0 && done == total) {
      progress.step(NAME, "", done, total);
    }
    return new Outcome(rows, done == total, Optional.empty());
  }

  private record Measured(Optional<Score> score, String detail) {}

  private Map<String, Measured> measure(TimingJob<?, ?> job, Path file, int before, int total) {
    Map<String, Measured> measured = new LinkedHashMap<>();
    for (TimingJob.Entry entry : job.candidates()) {
      progress.step(
          NAME, job.id().toString() + " " + entry.candidate(), before + measured.size(), total);
      Measured result = measure(job, entry, file);
      boolean interrupted = interruption.requested();
      // An interrupt reaches the fork as well: that it failed then says nothing of the candidate.
      if (!interrupted || result.score().isPresent()) {
        measured.put(entry.candidate(), result);
      }
      if (interrupted) {
        break;
      }
    }
    return measured;
  }

  private Measured measure(TimingJob<?, ?> job, TimingJob.Entry entry, Path file) {
    if (entry.obstacle().isPresent()) {
      return new Measured(Optional.empty(), entry.obstacle().get());
    }
    try {
      Score score = stopwatch.measure(job.task().id(), entry.candidate(), file, effort);
      return new Measured(Optional.of(score), "");
    } catch (TimingException none) {
      return new Measured(Optional.empty(), none.getMessage());
    }
  }

  private List<Timing> rows(TimingJob<?, ?> job, Map<String, Measured> measured) {
    Optional<Score> textbook =
        Optional.ofNullable(measured.get(job.textbook())).flatMap(Measured::score);
    List<Timing> rows = new ArrayList<>();
    measured.forEach((candidate, result) -> rows.add(row(job, candidate, result, textbook)));
    return rows;
  }

  private <K, D extends Data> Timing row(
      TimingJob<K, D> job, String candidate, Measured measured, Optional<Score> textbook) {
    int elements = Math.max(1, job.task().elements(job.input()));
    Optional<Score> score = measured.score();
    Optional<Ratio> ratio =
        candidate.equals(job.textbook())
            ? score.map(own -> Ratio.ONE)
            : score.flatMap(own -> textbook.map(base -> Ratio.of(own, base)));
    return new Timing(
        job.task().id(),
        job.id().family(),
        job.id().toString(),
        candidate,
        job.id().size(),
        optional(score.map(Score::ns)),
        optional(score.map(Score::lowNs)),
        optional(score.map(Score::highNs)),
        optional(score.map(s -> s.ns() / elements)),
        score.map(Score::allocatedBytes).orElse(OptionalDouble.empty()),
        job.textbook(),
        optional(ratio.map(Ratio::value)),
        optional(ratio.map(Ratio::low)),
        optional(ratio.map(Ratio::high)),
        effort.forks(),
        effort.warmup(),
        effort.measurement(),
        effort.iterationMs(),
        measured.detail());
  }

  /** A ratio of times; its ends are those of the intervals taken the unfavourable way round. */
  private record Ratio(double value, double low, double high) {
    static final Ratio ONE = new Ratio(1, 1, 1);

    static Ratio of(Score own, Score base) {
      return new Ratio(
          own.ns() / base.ns(), own.lowNs() / base.highNs(), own.highNs() / base.lowNs());
    }
  }

  private static OptionalDouble optional(Optional<Double> value) {
    return value.isPresent() ? OptionalDouble.of(value.get()) : OptionalDouble.empty();
  }
}
