package steelyard.harness.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.TimeValue;
import org.openjdk.jmh.runner.options.VerboseMode;
import steelyard.harness.data.DataFile;
import steelyard.harness.plan.TimingEffort;
import steelyard.harness.timing.JmhStopwatch;
import steelyard.harness.timing.TimingException;
import steelyard.problems.sum.Terms;

/** What timing a candidate through the stopwatch adds to timing it by hand: the best of forks. */
final class StopwatchOverhead {
  static final String WORK = "timing through the stopwatch";

  private static final int FORKS = 5;
  private static final int LARGE = 1000;
  private static final int SMALL = 16;
  private static final double LARGEST_PERCENT = 3;
  private static final double LARGEST_NS = 1;

  private StopwatchOverhead() {}

  static List<Row> rows(Path folder) throws IOException, RunnerException {
    List<Row> rows = new ArrayList<>();
    for (int size : new int[] {LARGE, SMALL}) {
      double[] best = best(folder, size);
      double percent = 100 * (best[0] / best[1] - 1);
      double more = best[0] - best[1];
      boolean large = size == LARGE;
      rows.add(
          new Row(
              WORK + ", n = " + size,
              large ? Row.number(percent) + " %" : Row.number(more) + " ns",
              large ? "at most 3 %" : "at most 1 ns",
              large ? percent <= LARGEST_PERCENT : more <= LARGEST_NS,
              Row.number(best[0]) + " ns and " + Row.number(best[1]) + " ns, best of " + FORKS));
    }
    return rows;
  }

  private static double[] best(Path folder, int size) throws IOException, RunnerException {
    Files.createDirectories(folder);
    Path data = folder.resolve("terms-" + size);
    DataFile.write(data, new Terms(Vectors.random("narrow", String.valueOf(size), 1)).parts());
    TimingEffort effort = new TimingEffort(1, 4, 5, 300, List.of());
    double[] best = {Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY};
    for (int fork = 0; fork < FORKS; fork++) {
      best[0] = Math.min(best[0], throughStopwatch(data, effort));
      best[1] = Math.min(best[1], byHand(size));
    }
    return best;
  }

  private static double throughStopwatch(Path data, TimingEffort effort) {
    try {
      return new JmhStopwatch(Duration.ofMinutes(1), List.of())
          .measure("sum", "recursive", data, effort)
          .ns();
    } catch (TimingException failed) {
      throw new IllegalStateException(failed);
    }
  }

  private static double byHand(int size) throws RunnerException {
    return new Runner(
            new OptionsBuilder()
                .include(HandWritten.class.getName().replace(".", "\\.") + ".sum")
                .param("size", String.valueOf(size))
                .jvmArgs(JmhStopwatch.forkFlags().toArray(String[]::new))
                .forks(1)
                .warmupIterations(4)
                .warmupTime(TimeValue.milliseconds(300))
                .measurementIterations(5)
                .measurementTime(TimeValue.milliseconds(300))
                .verbosity(VerboseMode.SILENT)
                .shouldFailOnError(true)
                .build())
        .runSingle()
        .getPrimaryResult()
        .getScore();
  }
}
