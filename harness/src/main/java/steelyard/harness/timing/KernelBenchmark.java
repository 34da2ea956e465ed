package steelyard.harness.timing;

import java.io.IOException;
import java.nio.file.Path;
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
import steelyard.harness.data.DataFile;
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

  private Call<?, ?> call;

  /** Reads the input and finds the candidate. */
  @Setup
  public void prepare() throws IOException {
    call = Call.of(Tasks.find(task).orElseThrow(), candidate, Path.of(data));
  }

  /** Calls the candidate once. */
  @Benchmark
  public void call(Blackhole sink) {
    call.into(sink);
  }

  private record Call<K, D extends Data>(Task<K, D> task, K kernel, D input) {

    static <K, D extends Data> Call<K, D> of(Task<K, D> task, String candidate, Path file)
        throws IOException {
      K kernel =
          task.candidates().stream()
              .filter(each -> each.id().equals(candidate))
              .findFirst()
              .orElseThrow()
              .kernel();
      return new Call<>(task, kernel, task.data(DataFile.read(file)));
    }

    void into(Blackhole sink) {
      task.time(kernel, input, sink);
    }
  }
}
