package steelyard.harness.export;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import steelyard.harness.data.DoubleText;
import steelyard.problems.Data;

/** Renders a problem as texts, by file name: each part, the answer, and the description last. */
final class ProblemFiles {

  static final String DESCRIPTION = "problem.json";

  private static final int ANSWER_DIGITS = 50;
  private static final Pattern FILE_NAME = Pattern.compile("[A-Za-z0-9_-]+\\.[a-z]+");

  private ProblemFiles() {}

  static Map<String, byte[]> of(ExportedProblem exported) {
    Map<String, String> texts = new LinkedHashMap<>();
    for (Data.Part part : exported.problem().data().parts()) {
      if (part instanceof Data.Vector vector) {
        put(texts, vector.name() + ".csv", csv(vector));
      } else if (part instanceof Data.Matrix matrix) {
        put(texts, matrix.name() + ".mtx", MatrixMarket.text(matrix, exported.id()));
      }
    }
    put(texts, "answer.csv", answer(exported));
    put(texts, DESCRIPTION, ProblemDescription.json(exported, texts.keySet()));
    Map<String, byte[]> files = new LinkedHashMap<>();
    texts.forEach((name, text) -> files.put(name, text.getBytes(StandardCharsets.UTF_8)));
    return files;
  }

  private static void put(Map<String, String> texts, String name, String text) {
    if (!FILE_NAME.matcher(name).matches()) {
      throw new ExportException("no file can be named after a part of the problem: " + name);
    }
    if (texts.putIfAbsent(name, text) != null) {
      throw new ExportException("two parts of the problem would be written to one file " + name);
    }
  }

  private static String csv(Data.Vector vector) {
    StringBuilder rows = new StringBuilder();
    rows.append(vector.name()).append("_hex,").append(vector.name()).append("\r\n");
    for (double value : vector.values()) {
      rows.append(Double.toHexString(value)).append(',');
      rows.append(DoubleText.full(value)).append("\r\n");
    }
    return rows.toString();
  }

  private static String answer(ExportedProblem exported) {
    MathContext precision = new MathContext(ANSWER_DIGITS, RoundingMode.HALF_EVEN);
    return exported.problem().reference().answer(precision).stream()
        .map((BigDecimal entry) -> DoubleText.scientific(entry, ANSWER_DIGITS) + "\r\n")
        .collect(Collectors.joining("", "answer\r\n", ""));
  }
}
