package steelyard.harness.plan;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;

/** The plans that come with the program. */
public final class BuiltInPlans {

  private static final List<String> NAMES = List.of("tour", "nightly");

  private BuiltInPlans() {}

  /** Returns their names. */
  public static List<String> names() {
    return NAMES;
  }

  /** Returns the TOML of the built-in plan of this name, if there is one. */
  public static Optional<String> find(String name) {
    return NAMES.contains(name) ? Optional.of(text(name)) : Optional.empty();
  }

  private static String text(String name) {
    String resource = name + ".toml";
    try (InputStream in = BuiltInPlans.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException("the program lacks its resource " + resource);
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException("the program cannot read its resource " + resource, e);
    }
  }
}
