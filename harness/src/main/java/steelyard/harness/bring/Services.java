package steelyard.harness.bring;

import java.io.IOException;
import java.io.InputStream;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import steelyard.harness.plan.Addition;

/** Finds the implementations of a task's interface that jars provide as services. */
final class Services {
  private Services() {}

  /**
   * Returns one addition for each, in the order of the jars; where there are several, each is named
   * after its class as well.
   *
   * @throws BringException if there is none
   */
  static List<Addition> expand(Addition addition, Class<?> kernelType) {
    List<String> names = names(addition.jars(), kernelType);
    if (names.isEmpty()) {
      throw new BringException(
          "no jar of '"
              + addition.id()
              + "' provides the service "
              + kernelType.getName()
              + " in META-INF/services");
    }
    return names.stream()
        .map(
            name ->
                new Addition(
                    addition.task(),
                    names.size() == 1 ? addition.id() : addition.id() + "-" + hyphened(name),
                    name,
                    addition.jars()))
        .toList();
  }

  private static List<String> names(List<String> jars, Class<?> kernelType) {
    List<String> names = new ArrayList<>();
    try (URLClassLoader loader = Jars.loader(jars)) {
      // Those of the jars alone, not of the harness.
      for (URL file :
          Collections.list(loader.findResources("META-INF/services/" + kernelType.getName()))) {
        try (InputStream in = file.openStream()) {
          String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
          text.lines()
              .map(line -> line.replaceFirst("#.*", "").strip())
              .filter(line -> !line.isEmpty() && !names.contains(line))
              .forEach(names::add);
        }
      }
    } catch (IOException unreadable) {
      throw new BringException("a jar cannot be read: " + unreadable.getMessage(), unreadable);
    }
    return names;
  }

  private static String hyphened(String className) {
    return className
        .substring(className.lastIndexOf('.') + 1)
        .replaceAll("(?<=[a-z0-9])(?=[A-Z])", "-")
        .replaceAll("[^A-Za-z0-9]+", "-")
        .toLowerCase(Locale.ROOT);
  }
}
