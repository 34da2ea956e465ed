package steelyard.harness.bring;

import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import steelyard.algorithms.Candidate;
import steelyard.results.text.NearestName;

/** Finds code by its name, without running any of it, and says what is wrong where none fits. */
final class CodeFinder {
  private static final int FIRST_CLASS_FILE_VERSION = 44;

  private final ClassLoader loader;
  private final Class<?> kernelType;
  private final Signature signature;

  CodeFinder(ClassLoader loader, Class<?> kernelType) {
    this.loader = loader;
    this.kernelType = kernelType;
    this.signature = Signature.of(kernelType);
  }

  /**
   * Finds code.
   *
   * @throws BringException if there is none, or it does not fit the task
   */
  FoundCode find(CodeName name) {
    Class<?> type = load(name.className());
    try {
      if (name.method().isEmpty()) {
        return implementation(type);
      }
      Method method = method(type, name.method().get(), name.parameters());
      if (!Modifier.isStatic(method.getModifiers())) {
        requireInstantiable(type, "method " + method.getName() + " is not static");
      }
      return new FoundCode(type, Optional.of(method), signature.precisionBits(method));
    } catch (LinkageError | TypeNotPresentException missing) {
      throw broken(name.className(), missing);
    }
  }

  private Class<?> load(String className) {
    try {
      return Class.forName(className, false, loader);
    } catch (ClassNotFoundException none) {
      throw new BringException(
          "there is no class "
              + className
              + "; name it with its package, and give the jar that has it",
          none);
    } catch (LinkageError wrong) {
      throw broken(className, wrong);
    }
  }

  private static BringException broken(String className, Throwable wrong) {
    String message = String.valueOf(wrong.getMessage());
    if (wrong instanceof UnsupportedClassVersionError) {
      String version = message.replaceFirst("(?s).*class file version (\\d+).*", "$1");
      String needed =
          version.matches("\\d+")
              ? "JDK " + (Integer.parseInt(version) - FIRST_CLASS_FILE_VERSION)
              : "a newer JDK";
      return new BringException(
          "class "
              + className
              + " was compiled for "
              + needed
              + ", and this is JDK "
              + Runtime.version().feature(),
          wrong);
    }
    if (wrong instanceof NoClassDefFoundError || wrong instanceof TypeNotPresentException) {
      String missing = message.replaceFirst("^Type (\\S+) not present$", "$1").replace('/', '.');
      return new BringException(
          "class " + className + " needs the class " + missing + ", which is in none of its jars",
          wrong);
    }
    return new BringException("class " + className + " cannot be loaded: " + message, wrong);
  }

  private FoundCode implementation(Class<?> type) {
    if (!kernelType.isAssignableFrom(type)) {
      throw new BringException(
          "class "
              + type.getName()
              + " does not implement "
              + kernelType.getName()
              + "; name a method of it as "
              + type.getName()
              + "#METHOD"
              + methodsThatFit(type));
    }
    requireInstantiable(type, "it is to be used as a " + kernelType.getSimpleName());
    return new FoundCode(type, Optional.empty(), Candidate.BINARY64);
  }

  private Method method(Class<?> type, String name, Optional<String> parameters) {
    List<Method> named = named(type, name);
    if (named.isEmpty()) {
      List<String> names =
          Arrays.stream(type.getMethods()).map(Method::getName).distinct().toList();
      throw new BringException(
          "class "
              + type.getName()
              + " has no method "
              + name
              + methodsThatFit(type)
              + (methodsThatFit(type).isEmpty() ? "; " + NearestName.hint(name, names) : ""));
    }
    List<Method> fitting =
        named.stream()
            .filter(method -> Modifier.isPublic(method.getModifiers()))
            .filter(signature::fits)
            .filter(method -> parameters.isEmpty() || isWritten(method, parameters.get()))
            .sorted(
                (one, other) -> Boolean.compare(signature.isSingle(one), signature.isSingle(other)))
            .toList();
    if (fitting.isEmpty()) {
      throw new BringException(
          "no method "
              + name
              + parameters.map(types -> "(" + types + ")").orElse("")
              + " of class "
              + type.getName()
              + " fits: a public "
              + signature.wanted(name)
              + " is wanted, and there is "
              + named.stream().map(CodeFinder::declared).collect(Collectors.joining(", ")));
    }
    return fitting.get(0);
  }

  private static boolean isWritten(Method method, String types) {
    return Signature.parameters(method).replace(" ", "").equals("(" + types + ")");
  }

  private static String declared(Method method) {
    boolean isHidden =
        (method.getModifiers() & (Modifier.PUBLIC | Modifier.PROTECTED | Modifier.PRIVATE)) == 0;
    return (isHidden ? "package-private " : "") + Signature.text(method);
  }

  // Those that may be called, and those that are merely declared, for the message.
  private static List<Method> named(Class<?> type, String name) {
    List<Method> methods = new ArrayList<>(Arrays.asList(type.getMethods()));
    Arrays.stream(type.getDeclaredMethods())
        .filter(method -> !Modifier.isPublic(method.getModifiers()))
        .forEach(methods::add);
    return methods.stream()
        .filter(method -> method.getName().equals(name) && !method.isBridge())
        .toList();
  }

  private String methodsThatFit(Class<?> type) {
    List<String> fitting =
        Arrays.stream(type.getMethods())
            .filter(signature::fits)
            .map(Method::getName)
            .distinct()
            .sorted()
            .toList();
    return fitting.isEmpty() ? "" : "; what fits is " + String.join(", ", fitting);
  }

  private static void requireInstantiable(Class<?> type, String why) {
    boolean isConcrete = !type.isInterface() && !Modifier.isAbstract(type.getModifiers());
    boolean isConstructible =
        Arrays.stream(type.getConstructors()).anyMatch(each -> each.getParameterCount() == 0);
    if (!isConcrete || !isConstructible) {
      throw new BringException(
          "class "
              + type.getName()
              + " must be concrete and have a public constructor without arguments, because "
              + why);
    }
  }
}
