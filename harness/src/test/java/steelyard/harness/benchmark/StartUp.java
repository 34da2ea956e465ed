package steelyard.harness.benchmark;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;

/** The start of a small command against that of a JVM with nothing to do: medians. */
final class StartUp {
  static final String WORK = "start of list against a bare JVM";

  private static final int STARTS = 15;
  private static final double LIMIT = 6;
  private static final double NS_PER_MS = 1e6;

  private StartUp() {}

  /** A program that does nothing. */
  static final class Nothing {
    private Nothing() {}

    public static void main(String[] arguments) {}
  }

  static Row row(Path jar) throws IOException, InterruptedException {
    String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
    double[] list = new double[STARTS];
    double[] bare = new double[STARTS];
    for (int i = 0; i < STARTS; i++) {
      list[i] = time(List.of(java, "-jar", jar.toString(), "list"));
      bare[i] =
          time(
              List.of(java, "-cp", System.getProperty("java.class.path"), Nothing.class.getName()));
    }
    double listMs = median(list);
    double bareMs = median(bare);
    return new Row(
        WORK,
        Row.number(listMs / bareMs),
        "at most " + Row.number(LIMIT),
        listMs <= LIMIT * bareMs,
        Row.number(listMs) + " ms and " + Row.number(bareMs) + " ms");
  }

  private static double time(List<String> command) throws IOException, InterruptedException {
    long start = System.nanoTime();
    Process process =
        new ProcessBuilder(command)
            .redirectOutput(ProcessBuilder.Redirect.DISCARD)
            .redirectError(ProcessBuilder.Redirect.DISCARD)
            .start();
    if (process.waitFor() != 0) {
      throw new IllegalStateException("failed: " + String.join(" ", command));
    }
    return (System.nanoTime() - start) / NS_PER_MS;
  }

  private static double median(double[] values) {
    Arrays.sort(values);
    return values[values.length / 2];
  }
}
