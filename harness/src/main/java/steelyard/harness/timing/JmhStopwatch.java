package steelyard.harness.timing;

import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
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
import steelyard.harness.bring.Bringing;
import steelyard.harness.plan.Addition;
import steelyard.harness.plan.TimingEffort;

/** Measures with JMH in forked JVMs, and reads its result objects. */
public final class JmhStopwatch implements Stopwatch {

  /**
   * The forks get nothing of this JVM's own flags. Their heap is touched before anything is timed,
   * its young part is small, and its collector has no threads of its own and does not resize it:
   * otherwise a candidate that allocates is charged for pages that the system hands out for the
   * first time, several times its own time on a virtual machine.
   */
  private static final List<String> FORK_FLAGS =
      List.of("-XX:+UseSerialGC", "-Xms96m", "-Xmn32m", "-XX:+AlwaysPreTouch");

  // What the start of a fork and a single call may take at most.
  private static final Duration START = Duration.ofSeconds(30);
  private static final Duration LONGEST_CALL = Duration.ofSeconds(10);

  private static final long PAUSE_MS = 500;
  private static final double CONFIDENCE = 0.999;
  private static final String ALLOCATION = "gc.alloc.rate.norm";

  private final Duration patience;
  private final List<Addition> additions;

  /**
   * Makes a stopwatch.
   *
   * @param patience how long it waits for another timing run on this machine
   * @param additions the candidates from outside
   */
  public JmhStopwatch(Duration patience, List<Addition> additions) {
    this.patience = patience;
    this.additions = List.copyOf(additions);
  }

  /** Returns the flags of the JVMs in which it measures, for who wants to compare with it. */
  public static List<String> forkFlags() {
    return FORK_FLAGS;
  }

  @Override
  public Score measure(String task, String candidate, Path data, TimingEffort effort)
      throws TimingException {
    Optional<Addition> added = added(task, candidate);
    if (added.isPresent() && !Bringing.isTimed(added.get())) {
      throw new TimingException("not timed: a program answers through pipes", null);
    }
    Duration limit = limit(effort);
    ForkWatch watch = new ForkWatch(limit);
    try (watch) {
      Collection<RunResult> results = run(options(task, candidate, data, effort));
      if (results.isEmpty()) {
        throw new TimingException("JMH gave no result", null);
      }
      return score(results.iterator().next());
    } catch (RunnerException failed) {
      if (watch.hasFired()) {
        throw new TimingException(
            "a call did not return within " + limit.toSeconds() + " s of timing", failed);
      }
      throw new TimingException(
          "the timed program failed: "
              + String.valueOf(failed.getMessage()).lines().findFirst().orElse("no reason given"),
          failed);
    }
  }

  private static Duration limit(TimingEffort effort) {
    long iterations = (long) effort.warmup() + effort.measurement();
    return START
        .plus(LONGEST_CALL.plusMillis(effort.iterationMs()).multipliedBy(iterations))
        .multipliedBy(effort.forks());
  }

  /** Waits its turn: JMH lets one run at a time measure on a machine. */
  private Collection<RunResult> run(Options options) throws RunnerException {
    long waitedMs = 0;
    while (true) {
      try {
        return new Runner(options, nowhere()).run();
      } catch (RunnerException failed) {
        if (!String.valueOf(failed.getMessage()).contains("lock")) {
          throw failed;
        }
        if (waitedMs >= patience.toMillis() || !pause()) {
          throw new MachineBusyException(
              "another timing run holds this machine; run again when it is done, or with --no-timing",
              failed);
        }
        waitedMs += PAUSE_MS;
      }
    }
  }

  private static boolean pause() {
    try {
      Thread.sleep(PAUSE_MS);
      return true;
    } catch (InterruptedException impatient) {
      Thread.currentThread().interrupt();
      return false;
    }
  }

  /** What a fork prints must not get among the results. */
  private static OutputFormat nowhere() {
    PrintStream sink =
        new PrintStream(OutputStream.nullOutputStream(), false, StandardCharsets.UTF_8);
    return OutputFormatFactory.createFormatInstance(sink, VerboseMode.SILENT);
  }

  private Options options(String task, String candidate, Path data, TimingEffort effort) {
    Optional<Addition> added = added(task, candidate);
    TimeValue iteration = TimeValue.milliseconds(effort.iterationMs());
    return new OptionsBuilder()
        .jvmArgs(flags(added).toArray(String[]::new))
        .include("^" + KernelBenchmark.class.getName().replace(".", "\\.") + "\\.call$")
        .param("task", task)
        .param("candidate", candidate)
        .param("data", data.toString())
        .param("use", added.map(Addition::use).orElse(""))
        .param("jars", added.map(each -> String.join("\n", each.jars())).orElse(""))
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

  private static List<String> flags(Optional<Addition> added) {
    return Stream.concat(FORK_FLAGS.stream(), added.stream().flatMap(Bringing::jvmFlags)).toList();
  }

  private Optional<Addition> added(String task, String candidate) {
    return additions.stream()
        .filter(each -> each.task().equals(task) && each.id().equals(candidate))
        .findFirst();
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
}
