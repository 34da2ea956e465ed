package steelyard.harness.execution;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Map;
import java.util.Properties;
import java.util.TreeMap;

/** The versions of the libraries whose code is weighed or takes part in the weighing. */
public final class Libraries {

  private static final String RESOURCE = "libraries.properties";

  private Libraries() {}

  /** Returns the version of each library by its name, sorted by name. */
  public static Map<String, String> versions() {
    Properties properties = new Properties();
    try (InputStream in = Libraries.class.getResourceAsStream(RESOURCE)) {
      properties.load(in);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
    Map<String, String> versions = new TreeMap<>();
    properties.forEach((name, version) -> versions.put((String) name, (String) version));
    return versions;
  }
}
