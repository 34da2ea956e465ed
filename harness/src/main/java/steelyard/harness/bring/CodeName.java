package steelyard.harness.bring;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The name of code in a class: {@code com.acme.Totals#net}, {@code com.acme.Totals#net(float[])},
 * or {@code com.acme.Total} alone.
 *
 * @param className the binary name of the class
 * @param method the method; empty where the class itself implements the task's interface
 * @param parameters the method's parameter types as they are written in Java; empty where any that
 *     fit will do
 */
record CodeName(String className, Optional<String> method, Optional<String> parameters) {
  private static final String NAME = "[\\p{L}_$][\\p{L}\\p{N}_$]*";
  private static final Pattern TEXT =
      Pattern.compile("(" + NAME + "(?:\\." + NAME + ")*)(?:#(" + NAME + ")(?:\\(([^()]*)\\))?)?");

  /**
   * Reads a name.
   *
   * @throws BringException if it is none
   */
  static CodeName parse(String text) {
    Matcher matcher = TEXT.matcher(text.strip());
    if (!matcher.matches()) {
      throw new BringException(
          "'"
              + text
              + "' is not the name of code; it must look like com.acme.Totals#net, a method, or"
              + " com.acme.Total, a class that implements the task's interface");
    }
    return new CodeName(
        matcher.group(1),
        Optional.ofNullable(matcher.group(2)),
        Optional.ofNullable(matcher.group(3)).map(types -> types.replace(" ", "")));
  }
}
