package steelyard.harness.benchmark;

import java.util.concurrent.TimeUnit;
import java.util.function.Supplier;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** Times one kernel in a fork of its own, in which the call has one target and is inlined. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class KernelTiming {

  /** The kernel's name, as {@link Kernels} reads it. */
  @Param("")
  public String kernel;

  private Supplier<?> work;

  /** Makes the input. */
  @Setup
  public void prepare() {
    work = Kernels.prepare(kernel);
  }

  /** Does the work once. */
  @Benchmark
  public Object run() {
    return work.get();
  }
}
