package steelyard.harness.api;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.lang.reflect.GenericArrayType;
import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.Type;
import java.lang.reflect.WildcardType;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** Holds the public surface to what the README says of it. */
final class PublicSurfaceTest {

  private static final List<Class<?>> SURFACE = List.of(Steelyard.class, RunText.class);

  @Test
  void theReadmeNamesEveryTypeThatASignatureNames() throws IOException {
    String section = section(Files.readString(Path.of("../README.md")), "## From Java");

    assertThat(named())
        .isNotEmpty()
        .allSatisfy(name -> assertThat(section).contains("`" + name + "`"));
  }

  private static String section(String text, String heading) {
    int start = text.indexOf("\n" + heading + "\n");
    assertThat(start).as(heading).isPositive();
    int end = text.indexOf("\n## ", start + 1);
    return text.substring(start, end < 0 ? text.length() : end);
  }

  private static Set<String> named() {
    Set<String> names = new TreeSet<>();
    for (Class<?> type : SURFACE) {
      for (Method method : type.getDeclaredMethods()) {
        if (Modifier.isPublic(method.getModifiers())) {
          collect(method.getGenericReturnType(), names);
          for (Type parameter : method.getGenericParameterTypes()) {
            collect(parameter, names);
          }
        }
      }
    }
    return names;
  }

  private static void collect(Type type, Set<String> names) {
    if (type instanceof Class<?> plain) {
      if (plain.getName().startsWith("steelyard.") && !SURFACE.contains(plain)) {
        names.add(plain.getSimpleName());
      }
    } else if (type instanceof ParameterizedType generic) {
      collect(generic.getRawType(), names);
      for (Type argument : generic.getActualTypeArguments()) {
        collect(argument, names);
      }
    } else if (type instanceof WildcardType wildcard) {
      for (Type bound : wildcard.getUpperBounds()) {
        collect(bound, names);
      }
    } else if (type instanceof GenericArrayType array) {
      collect(array.getGenericComponentType(), names);
    }
  }
}
