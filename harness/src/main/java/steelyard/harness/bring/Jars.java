package steelyard.harness.bring;

import java.io.IOException;
import java.net.MalformedURLException;
import java.net.URL;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.zip.ZipException;
import java.util.zip.ZipFile;

/** The jars and folders of one candidate. Each candidate has a loader of its own. */
final class Jars {
  private Jars() {}

  /**
   * Returns a loader of their classes, which sees the harness as well.
   *
   * @throws BringException if one is neither a readable jar nor a folder
   */
  static CandidateLoader loader(List<String> jars) {
    URL[] urls = jars.stream().map(Jars::url).toArray(URL[]::new);
    return new CandidateLoader(urls);
  }

  private static URL url(String jar) {
    Path path;
    try {
      path = Path.of(jar);
    } catch (InvalidPathException wrong) {
      throw new BringException("'" + jar + "' is no path to a jar", wrong);
    }
    if (!Files.exists(path)) {
      throw new BringException("there is no jar or folder '" + jar + "'");
    }
    if (!Files.isDirectory(path)) {
      requireJar(jar, path);
    }
    try {
      return path.toUri().toURL();
    } catch (MalformedURLException wrong) {
      throw new BringException("'" + jar + "' is no path to a jar", wrong);
    }
  }

  private static void requireJar(String name, Path path) {
    try (ZipFile jar = new ZipFile(path.toFile())) {
      if (jar.size() == 0) {
        throw new BringException("'" + name + "' is an empty jar");
      }
    } catch (ZipException wrong) {
      throw new BringException(
          "'" + name + "' is no jar: a zip file with classes is wanted, or a folder", wrong);
    } catch (IOException unreadable) {
      throw new BringException("'" + name + "' cannot be read", unreadable);
    }
  }
}
