package steelyard.junit;

import java.io.IOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/**
 * A copy of the sample project that Maven builds, from a local repository of its own: what lies in
 * the user's is reached by links, and what this build made lies beside them. So nothing is
 * downloaded, and nothing that is not released gets into the user's repository.
 */
final class SampleProject implements AutoCloseable {

  private static final Path ROOT = Path.of(System.getProperty("steelyard.root", "../.."));
  private static final String VERSION = System.getProperty("steelyard.version", "");
  private static final String GROUP = "steelyard";
  private static final int PATIENCE_MINUTES = 5;

  /** The folders of the modules, and what their artifacts are called. */
  private static final List<List<String>> MODULES =
      List.of(
          List.of("algorithms", "steelyard-algorithms"),
          List.of("problem-sets", "steelyard-problem-sets"),
          List.of("results", "steelyard-results"),
          List.of("harness", "steelyard-harness"),
          List.of("harness/junit", "steelyard-junit"));

  private final Path project;
  private final Path repository;

  private SampleProject(Path project, Path repository) {
    this.project = project;
    this.repository = repository;
  }

  /** What a build printed, and its exit code. */
  record Build(int exitCode, String output) {}

  static SampleProject in(Path folder) throws IOException {
    Path project = folder.resolve("depot-scales");
    copy(ROOT.resolve("harness/junit/sample"), project);
    Path repository = Files.createDirectory(folder.resolve("repository"));
    link(Path.of(System.getProperty("steelyard.repository")), repository);
    place(repository, "steelyard", ROOT.resolve("pom.xml"), "pom");
    for (List<String> module : MODULES) {
      Path home = ROOT.resolve(module.get(0));
      String artifact = module.get(1);
      place(repository, artifact, home.resolve("pom.xml"), "pom");
      place(
          repository,
          artifact,
          home.resolve("target").resolve(artifact + "-" + VERSION + ".jar"),
          "jar");
    }
    return new SampleProject(project, repository);
  }

  /** Runs Maven, which does not ask where the links lead. */
  Build maven(String... arguments) throws IOException, InterruptedException {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("steelyard.maven"), "bin", "mvn").toString());
    command.addAll(List.of("-o", "-q", "-B", "-Dmaven.repo.local=" + repository));
    command.add("-Daether.enhancedLocalRepository.trackingFilename=none.repositories");
    command.addAll(List.of(arguments));
    Path log = Files.createTempFile(project, "build", ".log");
    ProcessBuilder builder =
        new ProcessBuilder(command)
            .directory(project.toFile())
            .redirectErrorStream(true)
            .redirectOutput(log.toFile());
    builder.environment().put("JAVA_HOME", System.getProperty("java.home"));
    Process process = builder.start();
    if (!process.waitFor(PATIENCE_MINUTES, TimeUnit.MINUTES)) {
      process.destroyForcibly();
      throw new IOException("the build did not end: " + Files.readString(log));
    }
    return new Build(process.exitValue(), Files.readString(log));
  }

  /** Takes the links away before anybody deletes what they stand among. */
  @Override
  public void close() throws IOException {
    try (var links = Files.newDirectoryStream(repository, Files::isSymbolicLink)) {
      for (Path link : links) {
        Files.delete(link);
      }
    }
  }

  Path file(String name) {
    return project.resolve(name);
  }

  private static void place(Path repository, String artifact, Path file, String extension)
      throws IOException {
    Path folder = repository.resolve(GROUP).resolve(artifact).resolve(VERSION);
    Files.createDirectories(folder);
    Files.copy(file, folder.resolve(artifact + "-" + VERSION + "." + extension));
  }

  private static void link(Path from, Path to) throws IOException {
    try (var groups = Files.newDirectoryStream(from, Files::isDirectory)) {
      for (Path group : groups) {
        if (!group.getFileName().toString().equals(GROUP)) {
          Files.createSymbolicLink(to.resolve(group.getFileName()), group.toAbsolutePath());
        }
      }
    }
  }

  private static void copy(Path from, Path to) throws IOException {
    Files.walkFileTree(
        from,
        new SimpleFileVisitor<>() {
          @Override
          public FileVisitResult preVisitDirectory(Path folder, BasicFileAttributes attributes)
              throws IOException {
            if (folder.endsWith("target")) {
              return FileVisitResult.SKIP_SUBTREE;
            }
            Files.createDirectories(to.resolve(from.relativize(folder)));
            return FileVisitResult.CONTINUE;
          }

          @Override
          public FileVisitResult visitFile(Path file, BasicFileAttributes attributes)
              throws IOException {
            Files.copy(file, to.resolve(from.relativize(file)));
            return FileVisitResult.CONTINUE;
          }
        });
  }
}
