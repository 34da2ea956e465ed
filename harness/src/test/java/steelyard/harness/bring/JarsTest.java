package steelyard.harness.bring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import steelyard.algorithms.sum.Summation;
import steelyard.harness.plan.Addition;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;

/** Code in jars, compiled here. */
class JarsTest {
  @TempDir private Path folder;

  @Test
  void twoVersionsOfAClassStandSideBySide() throws IOException {
    Path older = jar("older", "acme.Totals", totals("1"), "");
    Path newer = jar("newer", "acme.Totals", totals("2"), "");
    Summation one = kernel("acme.Totals#net", older);
    Summation two = kernel("acme.Totals#net", newer);
    assertThat(one.sum(new double[0])).isEqualTo(1);
    assertThat(two.sum(new double[0])).isEqualTo(2);
    assertThat(one.sum(new double[0])).isEqualTo(1);
  }

  @Test
  void aClassThatIsNotPublicWillDo() throws IOException {
    Path jar = jar("hidden", "acme.Totals", totals("3").replace("public class", "class"), "");
    assertThat(kernel("acme.Totals#net", jar).sum(new double[0])).isEqualTo(3);
  }

  @Test
  void servicesAreFoundByTheirInterface() throws IOException {
    String source =
        """
        package acme;
        public class FastTotal implements steelyard.algorithms.sum.Summation {
          public double sum(double[] terms) { return 4; }
        }
        """;
    String services = "acme.FastTotal # the quick one\n\njava.lang.Object\n";
    Path jar = jar("services", "acme.FastTotal", source, services);
    List<Addition> found =
        Bringing.expanded(
            List.of(new Addition("sum", "acme", "services", List.of(jar.toString()))));
    assertThat(found).extracting(Addition::id).containsExactly("acme-fast-total", "acme-object");
    assertThat(kernel(found.get(0).use(), jar).sum(new double[0])).isEqualTo(4);
    assertThatThrownBy(() -> kernel(found.get(1).use(), jar))
        .hasMessageStartingWith("class java.lang.Object does not implement");
    assertThatThrownBy(
            () ->
                Bringing.expanded(
                    List.of(new Addition("dot", "acme", "services", List.of(jar.toString())))))
        .hasMessage(
            "no jar of 'acme' provides the service steelyard.algorithms.dot.DotProduct in"
                + " META-INF/services");
  }

  @Test
  void saysWhichJdkAClassWantsThatIsTooNew() throws IOException {
    Path jar = jar("new", "acme.Totals", totals("1"), "");
    Path classFile = folder.resolve("new").resolve("acme/Totals.class");
    byte[] bytes = Files.readAllBytes(classFile);
    bytes[7] = 99;
    Files.write(classFile, bytes);
    assertThat(jar).exists();
    assertThatThrownBy(() -> kernel("acme.Totals#net", folder.resolve("new")))
        .hasMessage(
            "class acme.Totals was compiled for JDK 55, and this is JDK "
                + Runtime.version().feature());
  }

  @Test
  void namesTheClassThatIsMissing() throws IOException {
    String source =
        """
        package acme;
        public class Totals {
          public static class Silo {}
          public static double net(double[] terms) { return 0; }
          public static void fill(Silo silo) {}
        }
        """;
    jar("missing", "acme.Totals", source, "");
    Files.delete(folder.resolve("missing/acme/Totals$Silo.class"));
    assertThatThrownBy(() -> kernel("acme.Totals#net", folder.resolve("missing")))
        .hasMessage(
            "class acme.Totals needs the class acme.Totals$Silo, which is in none of its jars");
  }

  @Test
  void refusesWhatIsNoJar() throws IOException {
    Path text = folder.resolve("notes.jar");
    Files.writeString(text, "no zip");
    assertThatThrownBy(() -> kernel("acme.Totals", text))
        .hasMessage("'" + text + "' is no jar: a zip file with classes is wanted, or a folder");
    Path none = folder.resolve("none.jar");
    assertThatThrownBy(() -> kernel("acme.Totals", none))
        .hasMessage("there is no jar or folder '" + none + "'");
  }

  private static String totals(String answer) {
    return "package acme; public class Totals { public static double net(double[] t) { return "
        + answer
        + "; } }";
  }

  private static Summation kernel(String code, Path jar) {
    @SuppressWarnings("unchecked")
    Task<Summation, ?> sum = (Task<Summation, ?>) Tasks.find("sum").orElseThrow();
    return Bringing.kernel(sum, new Addition("sum", "mine", code, List.of(jar.toString())), false);
  }

  private Path jar(String name, String className, String source, String services)
      throws IOException {
    Path classes = folder.resolve(name);
    Path file = folder.resolve(name + "-source").resolve(className.replace('.', '/') + ".java");
    Files.createDirectories(file.getParent());
    Files.writeString(file, source);
    int code =
        ToolProvider.getSystemJavaCompiler()
            .run(null, null, null, "--release", "17", "-d", classes.toString(), file.toString());
    assertThat(code).isZero();
    if (!services.isEmpty()) {
      Path entry = classes.resolve("META-INF/services/" + Summation.class.getName());
      Files.createDirectories(entry.getParent());
      Files.writeString(entry, services);
    }
    Path jar = folder.resolve(name + ".jar");
    try (OutputStream out = Files.newOutputStream(jar);
        ZipOutputStream zip = new ZipOutputStream(out);
        Stream<Path> files = Files.walk(classes)) {
      for (Path each : files.filter(Files::isRegularFile).toList()) {
        zip.putNextEntry(new ZipEntry(classes.relativize(each).toString().replace('\\', '/')));
        zip.write(Files.readAllBytes(each));
        zip.closeEntry();
      }
    }
    return jar;
  }
}
