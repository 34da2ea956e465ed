package steelyard.harness.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;

/** Runs the built jar as a process of its own, for tests. */
record Program(Path java, List<String> jvmOptions, Path directory) {

  private static final long PATIENCE_SECONDS = 120;

  /** What a finished process left behind. */
  record Result(int exitCode, String out, String err) {}

  static Program in(Path directory) {
    return new Program(
        Path.of(System.getProperty("java.home"), "bin", "java"), List.of(), directory);
  }

  Program withJvmOptions(String... options) {
    return new Program(java, List.of(options), directory);
  }

  Program withJava(Path other) {
    return new Program(other, jvmOptions, directory);
  }

  Result run(String... arguments) {
    try {
      Path out = Files.createTempFile(directory, "out", ".txt");
      Path err = Files.createTempFile(directory, "err", ".txt");
      Process process =
          builder(arguments).redirectOutput(out.toFile()).redirectError(err.toFile()).start();
      if (!process.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS)) {
        process.destroyForcibly();
        throw new IllegalStateException("the program did not end: " + List.of(arguments));
      }
      Result result = new Result(process.exitValue(), text(out), text(err));
      Files.delete(out);
      Files.delete(err);
      return result;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException(e);
    }
  }

  ProcessBuilder builder(String... arguments) {
    List<String> command = new ArrayList<>();
    command.add(java.toString());
    command.addAll(jvmOptions);
    command.add("-jar");
    command.add(System.getProperty("steelyard.jar"));
    command.addAll(List.of(arguments));
    ProcessBuilder builder = new ProcessBuilder(command).directory(directory.toFile());
    Map<String, String> environment = builder.environment();
    environment.remove("JAVA_TOOL_OPTIONS");
    environment.remove("NO_COLOR");
    return builder;
  }

  private static String text(Path file) throws IOException {
    return Files.readString(file, StandardCharsets.UTF_8);
  }
}
