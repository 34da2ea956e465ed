package steelyard.harness.timing;

import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Collection;
import java.util.OptionalDouble;
import org.openjdk.jmh.profile.GCProfiler;
import org.openjdk.jmh.results.Result;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.format.OutputFormat;
import org.openjdk.jmh.runner.format.OutputFormatFactory;
import org.openjdk.jmh.runner.options.Options;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.TimeValue;
import org.openjdk.jmh.runner.options.VerboseMode;
import org.openjdk.jmh.util.Statistics;
import steelyard.harness.plan.TimingEffort;

/** Measures with JMH in forked JVMs, and reads its result objects. */
public final class JmhStopwatch implements Stopwatch {

  /**
   * The forks get nothing of this JVM's own flags. Their heap is touched before anything is timed
   * and its young part is small: otherwise a candidate that allocates is charged for pages that the
   * system hands out for the first time, several times its own time.
   */
  private static final String[] FORK_FLAGS = {"-Xms256m", "-Xmn64m", "-XX:+AlwaysPreTouch"};

  private static final double CONFIDENCE = 0.999;
  private static final String ALLOCATION = "gc.alloc.rate.norm";

  /** Makes a stopwatch. */
  public JmhStopwatch() {}

  @Override
  public Score measure(String task, String candidate, Path data, TimingEffort effort)
      throws TimingException {
    try {
      Collection<RunResult> results =
          new Runner(options(task, candidate, data, effort), nowhere()).run();
      if (results.isEmpty()) {
        throw new TimingException("JMH gave no result", null);
      }
      return score(results.iterator().next());
    } catch (RunnerException failed) {
      throw new TimingException(sentence(failed), failed);
    }
  }

  /** What a fork prints must not get among the results. */
  private static OutputFormat nowhere() {
    PrintStream sink =
        new PrintStream(OutputStream.nullOutputStream(), false, StandardCharsets.UTF_8);
    return OutputFormatFactory.createFormatInstance(sink, VerboseMode.SILENT);
  }

  private static Options options(String task, String candidate, Path data, TimingEffort effort) {
    TimeValue iteration = TimeValue.milliseconds(effort.iterationMs());
    return new OptionsBuilder()
        .jvmArgs(FORK_FLAGS)
        .include("^" + KernelBenchmark.class.getName().replace(".", "\\.") + "\\.call$")
        .param("task", task)
        .param("candidate", candidate)
        .param("data", data.toString())
        .forks(effort.forks())
        .warmupIterations(effort.warmup())
        .warmupTime(iteration)
        .measurementIterations(effort.measurement())
        .measurementTime(iteration)
        .addProfiler(GCProfiler.class)
        .verbosity(VerboseMode.SILENT)
        .shouldFailOnError(true)
        .build();
  }

  private static Score score(RunResult result) {
    Statistics statistics = result.getPrimaryResult().getStatistics();
    double mean = statistics.getMean();
    double[] interval = statistics.getConfidenceIntervalAt(CONFIDENCE);
    Result<?> allocation = result.getSecondaryResults().get(ALLOCATION);
    return new Score(
        mean,
        Math.max(0, finiteOr(interval[0], mean)),
        finiteOr(interval[1], mean),
        allocation == null ? OptionalDouble.empty() : OptionalDouble.of(allocation.getScore()));
  }

  /** A single iteration has no interval; its ends are then the figure itself. */
  private static double finiteOr(double value, double otherwise) {
    return Double.isFinite(value) ? value : otherwise;
  }

  private static String sentence(RunnerException failed) {
    String message = String.valueOf(failed.getMessage());
    if (message.contains("lock")) {
      return "another timing run is under way on this machine; wait for it, or use --no-timing";
    }
    return "the timed program failed: " + message.lines().findFirst().orElse("no reason given");
  }
}
