package steelyard.harness.benchmark;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** The naive sum as one would time it by hand. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class HandWritten {

  /** The number of terms. */
  @Param("0")
  public int size;

  private double[] terms;

  /** Makes the terms. */
  @Setup
  public void prepare() {
    terms = Vectors.random("narrow", String.valueOf(size), 1);
  }

  /** Adds them up. */
  @Benchmark
  public double sum() {
    double sum = 0;
    for (double term : terms) {
      sum += term;
    }
    return sum;
  }
}
