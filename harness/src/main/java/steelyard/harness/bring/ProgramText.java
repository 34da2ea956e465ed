package steelyard.harness.bring;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import steelyard.problems.Data;

/** What is said between the harness and a program, as {@code harness/PROTOCOL.md} describes it. */
final class ProgramText {

  /** What either side says first. */
  static final String GREETING = "steelyard 1";

  private static final Pattern ANSWER = Pattern.compile("answer\\s+(\\d{1,18})\\s+(\\d{1,9})");
  private static final Pattern ERROR = Pattern.compile("error\\s+(\\d{1,18})\\s*(.*)");
  private static final int LARGEST_ANSWER = 10_000_000;
  private static final int LONGEST_QUOTE = 80;

  private ProgramText() {}

  /** A line is not what the protocol asks for. */
  static final class GarbledException extends Exception {
    private static final long serialVersionUID = 1L;

    GarbledException(String message) {
      super(message);
    }
  }

  /**
   * The first line of an answer.
   *
   * @param count how many numbers follow
   * @param complaint why there is no answer, if so
   */
  record Header(int count, Optional<String> complaint) {}

  static String greeting(String task) {
    return GREETING + " " + task + "\n";
  }

  static boolean isGreeting(String line) {
    return line.strip().equals(GREETING);
  }

  static String problem(long number, List<Data.Part> parts) {
    StringBuilder text = new StringBuilder("problem ").append(number).append('\n');
    for (Data.Part part : parts) {
      if (part instanceof Data.Matrix matrix) {
        int columns = matrix.rows().length == 0 ? 0 : matrix.rows()[0].length;
        text.append("matrix ").append(part.name()).append(' ').append(matrix.rows().length);
        text.append(' ').append(columns).append('\n');
        for (double[] row : matrix.rows()) {
          append(text, row, ' ');
          text.append('\n');
        }
      } else {
        double[] values = ((Data.Vector) part).values();
        text.append("vector ").append(part.name()).append(' ').append(values.length).append('\n');
        append(text, values, '\n');
        text.append('\n');
      }
    }
    return text.append("end\n").toString();
  }

  private static void append(StringBuilder text, double[] values, char separator) {
    for (int i = 0; i < values.length; i++) {
      if (i > 0) {
        text.append(separator);
      }
      text.append(Double.toHexString(values[i]));
    }
  }

  static Header header(String line, long problem) throws GarbledException {
    Matcher error = ERROR.matcher(line.strip());
    if (error.matches()) {
      requireNumber(error.group(1), problem);
      String complaint = error.group(2).isBlank() ? "the program gives no reason" : error.group(2);
      return new Header(0, Optional.of(complaint));
    }
    Matcher answer = ANSWER.matcher(line.strip());
    if (!answer.matches()) {
      throw new GarbledException("it says '" + quoted(line) + "', not 'answer' and two numbers");
    }
    requireNumber(answer.group(1), problem);
    int count = Integer.parseInt(answer.group(2));
    if (count > LARGEST_ANSWER) {
      throw new GarbledException("an answer of " + count + " numbers is too long");
    }
    return new Header(count, Optional.empty());
  }

  // The numbers are not named: they depend on which thread asked what before.
  private static void requireNumber(String number, long problem) throws GarbledException {
    if (Long.parseLong(number) != problem) {
      throw new GarbledException("it answers another problem than the one that it was given");
    }
  }

  /**
   * Reads the numbers of a line.
   *
   * @return how much of the answer is filled then
   */
  static int numbers(String line, double[] answer, int filled) throws GarbledException {
    int next = filled;
    for (String word : line.strip().split("\\s+", -1)) {
      if (word.isEmpty()) {
        continue;
      }
      if (next == answer.length) {
        throw new GarbledException("more numbers than the " + answer.length + " it announced");
      }
      answer[next] = number(word);
      next++;
    }
    return next;
  }

  private static double number(String word) throws GarbledException {
    String plain = word.toLowerCase(Locale.ROOT);
    boolean isNegative = plain.startsWith("-");
    String magnitude = isNegative || plain.startsWith("+") ? plain.substring(1) : plain;
    if (magnitude.matches("nan(\\(.*\\))?")) {
      return Double.NaN;
    }
    if (magnitude.matches("inf(inity)?")) {
      return isNegative ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
    }
    try {
      // A suffix for float or double, which Java takes, is no number elsewhere.
      if (magnitude.matches("[0-9.].*[0-9.]|[0-9]")) {
        return Double.parseDouble(plain);
      }
    } catch (NumberFormatException none) {
      // Said below.
    }
    throw new GarbledException("'" + quoted(word) + "' is no number");
  }

  private static String quoted(String text) {
    String shown = text.strip().replaceAll("\\p{Cntrl}", "?");
    return shown.length() > LONGEST_QUOTE ? shown.substring(0, LONGEST_QUOTE) + "…" : shown;
  }
}
