package steelyard.harness.benchmark;

import java.util.HashMap;
import java.util.Map;
import java.util.regex.Pattern;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.TimeValue;
import org.openjdk.jmh.runner.options.VerboseMode;
import org.openjdk.jmh.util.Statistics;

/** Times kernels with JMH, each once. */
final class KernelCosts {
  private static final double CONFIDENCE = 0.999;

  // A call takes seconds.
  private static final Pattern SLOW =
      Pattern.compile("bigdecimal/.*(/200|00000)$|^phase|rational|solve.*/1000$");

  private final int forks;
  private final Map<String, Cost> known = new HashMap<>();

  KernelCosts(int forks) {
    this.forks = forks;
  }

  Cost of(String kernel) throws RunnerException {
    Cost cost = known.get(kernel);
    if (cost == null) {
      cost = measure(kernel);
      known.put(kernel, cost);
    }
    return cost;
  }

  private Cost measure(String kernel) throws RunnerException {
    boolean slow = SLOW.matcher(kernel).find();
    RunResult result =
        new Runner(
                new OptionsBuilder()
                    .include(KernelTiming.class.getName().replace(".", "\\.") + ".run")
                    .param("kernel", kernel)
                    .jvmArgs("-Xms1g", "-Xmx4g", "-XX:+UseSerialGC")
                    .forks(slow ? 1 : forks)
                    .warmupIterations(slow ? 1 : 10)
                    .warmupTime(TimeValue.milliseconds(500))
                    .measurementIterations(slow ? 4 : 10)
                    .measurementTime(TimeValue.milliseconds(200))
                    .verbosity(VerboseMode.SILENT)
                    .shouldFailOnError(true)
                    .build())
            .runSingle();
    Statistics statistics = result.getPrimaryResult().getStatistics();
    double[] interval = statistics.getConfidenceIntervalAt(CONFIDENCE);
    return new Cost(statistics.getMean(), Math.max(0, interval[0]), interval[1]);
  }
}
