package steelyard.harness.bring;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * The command of a program that is a candidate: {@code exec: ./total --fast 'two words'}.
 *
 * @param words the program and its arguments
 */
record ProgramCommand(List<String> words) {
  private static final String PREFIX = "exec:";

  /** Says whether a use is a program. */
  static boolean isProgram(String use) {
    return use.strip().startsWith(PREFIX);
  }

  /**
   * Returns the command of a use; empty if it is no program.
   *
   * @throws BringException if it names none that can be started
   */
  static Optional<ProgramCommand> find(String use) {
    if (!isProgram(use)) {
      return Optional.empty();
    }
    List<String> words = split(use.strip().substring(PREFIX.length()));
    if (words.isEmpty()) {
      throw new BringException("'" + use + "' names no program; it must look like exec: ./total");
    }
    requireExecutable(words.get(0));
    return Optional.of(new ProgramCommand(List.copyOf(words)));
  }

  private static void requireExecutable(String program) {
    try {
      Path path = Path.of(program);
      if (path.getNameCount() > 1 || path.isAbsolute()) {
        if (!Files.isExecutable(path) || Files.isDirectory(path)) {
          throw new BringException("there is no program '" + program + "' that may be executed");
        }
        return;
      }
    } catch (InvalidPathException wrong) {
      throw new BringException("'" + program + "' is no path to a program", wrong);
    }
    for (String folder :
        System.getenv().getOrDefault("PATH", "").split(Pattern.quote(File.pathSeparator), -1)) {
      if (!folder.isEmpty() && Files.isExecutable(Path.of(folder, program))) {
        return;
      }
    }
    throw new BringException(
        "there is no program '"
            + program
            + "' on the search path; one in this folder is ./"
            + program);
  }

  /** Splits at blanks that stand outside of quotation marks. */
  private static List<String> split(String text) {
    List<String> words = new ArrayList<>();
    StringBuilder word = new StringBuilder();
    boolean isWord = false;
    char quote = 0;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (quote != 0) {
        if (c == quote) {
          quote = 0;
        } else {
          word.append(c);
        }
      } else if (c == '"' || c == '\'') {
        quote = c;
        isWord = true;
      } else if (Character.isWhitespace(c)) {
        if (isWord) {
          words.add(word.toString());
        }
        word.setLength(0);
        isWord = false;
      } else {
        word.append(c);
        isWord = true;
      }
    }
    if (quote != 0) {
      throw new BringException("a quotation mark in 'exec:" + text + "' is not closed");
    }
    if (isWord) {
      words.add(word.toString());
    }
    return words;
  }
}
