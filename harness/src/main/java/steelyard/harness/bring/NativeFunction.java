package steelyard.harness.bring;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * A function in a shared library: {@code native: libfoo.so!foo_sum(double*, long)}.
 *
 * @param library the library
 * @param name the function
 * @param isLong whether the number of entries is a {@code long}; else it is an {@code int}
 */
record NativeFunction(Path library, String name, boolean isLong) {
  private static final String PREFIX = "native:";
  private static final Pattern TEXT =
      Pattern.compile("(.+)!\\s*([A-Za-z_][A-Za-z_0-9]*)\\s*\\(([^()]*)\\)");
  private static final Pattern ARRAY =
      Pattern.compile("double\\s*(\\*\\s*\\w*|\\s\\w+\\s*\\[\\]|\\[\\])");
  private static final Pattern COUNT =
      Pattern.compile("(long|int)(\\s+(?!int\\b|long\\b|double\\b)\\w+)?");
  private static final int FIRST_JDK = 22;

  /** Says whether a use is a function in a shared library. */
  static boolean isNative(String use) {
    return use.strip().startsWith(PREFIX);
  }

  /**
   * Reads a use.
   *
   * @param signature of the task's interface
   * @throws BringException if it names no function of a library, or the function does not fit
   */
  static NativeFunction parse(String use, Signature signature) {
    Matcher matcher = TEXT.matcher(use.strip().substring(PREFIX.length()).strip());
    if (!matcher.matches()) {
      throw new BringException(
          "'" + use + "' must look like native: libfoo.so!foo_sum(double*, long)");
    }
    List<String> types =
        Stream.of(matcher.group(3).split(",", -1)).map(NativeFunction::canonical).toList();
    String last = types.get(types.size() - 1);
    List<String> wanted = wanted(signature, last.equals("int") ? "int" : "long");
    if (!types.equals(wanted)) {
      throw new BringException(
          "function "
              + matcher.group(2)
              + " does not fit: the task needs "
              + (signature.isScalar() ? "double " : "void ")
              + matcher.group(2)
              + wanted.stream().collect(Collectors.joining(", ", "(", ")"))
              + ", the number of entries as long or int"
              + (signature.isScalar() ? "" : ", matrices row by row, the answer before it"));
    }
    if (Runtime.version().feature() < FIRST_JDK) {
      throw new BringException(
          "a function in a shared library needs JDK "
              + FIRST_JDK
              + " or newer, and this is JDK "
              + Runtime.version().feature());
    }
    return new NativeFunction(
        library(matcher.group(1).strip()), matcher.group(2), last.equals("long"));
  }

  /** Returns the type of a parameter, which may have a name, as in a header of C. */
  private static String canonical(String parameter) {
    String plain = parameter.replaceAll("\\b(const|restrict)\\b", " ").strip();
    if (ARRAY.matcher(plain).matches()) {
      return "double*";
    }
    Matcher count = COUNT.matcher(plain);
    return count.matches() ? count.group(1) : plain;
  }

  private static List<String> wanted(Signature signature, String count) {
    List<String> types = new ArrayList<>();
    for (int i = 0; i < signature.kernelMethod().getParameterCount(); i++) {
      types.add("double*");
    }
    if (!signature.isScalar()) {
      types.add("double*");
    }
    types.add(count);
    return types;
  }

  private static Path library(String text) {
    try {
      Path path = Path.of(text).toAbsolutePath();
      if (!Files.isReadable(path) || Files.isDirectory(path)) {
        throw new BringException("there is no shared library '" + text + "'");
      }
      return path;
    } catch (InvalidPathException wrong) {
      throw new BringException("'" + text + "' is no path to a shared library", wrong);
    }
  }
}
