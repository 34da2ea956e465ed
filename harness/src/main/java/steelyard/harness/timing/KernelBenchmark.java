package steelyard.harness.timing;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.infra.Blackhole;
import steelyard.harness.bring.Bringing;
import steelyard.harness.data.DataFile;
import steelyard.harness.plan.Addition;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Data;

/**
 * Times one candidate on one input. A fork loads a single candidate, so that the calls through the
 * two interfaces have one target each and are inlined.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class KernelBenchmark {

  /** The task's id. */
  @Param("")
  public String task;

  /** The candidate's id. */
  @Param("")
  public String candidate;

  /** The file with the input. */
  @Param("")
  public String data;

  /** What the candidate is, if it comes from outside. */
  @Param("")
  public String use;

  /** Its jars, one in a line. */
  @Param("")
  public String jars;

  private Call<?, ?> call;

  /** Reads the input and finds the candidate. */
  @Setup
  public void prepare() throws IOException {
    call =
        Call.of(
            Tasks.find(task).orElseThrow(),
            new Addition(task, candidate, use, jars.isEmpty() ? List.of() : jars.lines().toList()),
            Path.of(data));
  }

  /** Calls the candidate once. */
  @Benchmark
  public void call(Blackhole sink) {
    call.into(sink);
  }

  private record Call<K, D extends Data>(Task<K, D> task, K kernel, D input) {

    static <K, D extends Data> Call<K, D> of(Task<K, D> task, Addition candidate, Path file)
        throws IOException {
      K kernel =
          candidate.use().isEmpty()
              ? kernel(task, candidate.id())
              : Bringing.kernel(task, candidate, true);
      return new Call<>(task, kernel, task.data(DataFile.read(file)));
    }

    private static <K> K kernel(Task<K, ?> task, String candidate) {
      return task.candidates().stream()
          .filter(each -> each.id().equals(candidate))
          .findFirst()
          .orElseThrow()
          .kernel();
    }

    void into(Blackhole sink) {
      task.time(kernel, input, sink);
    }
  }
}
