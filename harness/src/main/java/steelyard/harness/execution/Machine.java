package steelyard.harness.execution;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** The facts of the machine and the JVM that a run records. */
public final class Machine {

  private static final Path CPU_INFO = Path.of("/proc/cpuinfo");

  private Machine() {}

  /** Returns the processor's model, or its architecture where the system does not tell. */
  public static String processor() {
    try {
      for (String line : Files.readAllLines(CPU_INFO, StandardCharsets.UTF_8)) {
        if (line.startsWith("model name")) {
          return line.substring(line.indexOf(':') + 1).strip();
        }
      }
    } catch (IOException notLinux) {
      return System.getProperty("os.arch");
    }
    return System.getProperty("os.arch");
  }

  /** Returns the number of processor cores that the JVM may use. */
  public static int cores() {
    return Runtime.getRuntime().availableProcessors();
  }

  /** Returns the operating system's name and version. */
  public static String operatingSystem() {
    return System.getProperty("os.name") + " " + System.getProperty("os.version");
  }

  /** Returns the JVM's flags. */
  public static List<String> flags() {
    return List.copyOf(ManagementFactory.getRuntimeMXBean().getInputArguments());
  }
}
