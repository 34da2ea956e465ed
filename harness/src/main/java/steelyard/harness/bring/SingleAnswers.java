package steelyard.harness.bring;

import java.lang.invoke.MethodHandle;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import steelyard.problems.Data;

/**
 * A method in single precision as a kernel in double: the input is rounded to float, and what the
 * method writes to it is written back, so that it shows.
 */
final class SingleAnswers implements Function<List<Data.Part>, double[]> {
  private final SpreadMethod method;
  private final boolean keepsInput;
  private List<Object> kept = List.of();
  private Object[] rounded = {};

  /** Makes one of a method whose receiver, if any, is bound. */
  SingleAnswers(MethodHandle method, boolean keepsInput) {
    this.method = new SpreadMethod(method, keepsInput);
    this.keepsInput = keepsInput;
  }

  @Override
  public double[] apply(List<Data.Part> parts) {
    if (!keepsInput) {
      Object[] arguments = rounded(parts);
      double[] answer = call(arguments);
      writeBack(parts, arguments);
      return answer;
    }
    if (!isKept(parts)) {
      kept = new ArrayList<>();
      parts.forEach(part -> kept.add(array(part)));
      rounded = rounded(parts);
    }
    return call(rounded);
  }

  private boolean isKept(List<Data.Part> parts) {
    for (int i = 0; i < parts.size(); i++) {
      if (i >= kept.size() || kept.get(i) != array(parts.get(i))) {
        return false;
      }
    }
    return true;
  }

  private double[] call(Object[] arguments) {
    Object answer = method.call(arguments);
    if (answer instanceof Float number) {
      return new double[] {number};
    }
    return answer == null ? null : widened((float[]) answer);
  }

  private static Object array(Data.Part part) {
    return part instanceof Data.Matrix matrix ? matrix.rows() : ((Data.Vector) part).values();
  }

  private static Object[] rounded(List<Data.Part> parts) {
    return parts.stream()
        .map(
            part ->
                part instanceof Data.Matrix matrix
                    ? (Object) rounded(matrix.rows())
                    : rounded(((Data.Vector) part).values()))
        .toArray();
  }

  private static float[][] rounded(double[][] rows) {
    float[][] result = new float[rows.length][];
    for (int i = 0; i < rows.length; i++) {
      result[i] = rounded(rows[i]);
    }
    return result;
  }

  private static float[] rounded(double[] values) {
    float[] result = new float[values.length];
    for (int i = 0; i < values.length; i++) {
      result[i] = (float) values[i];
    }
    return result;
  }

  private static double[] widened(float[] values) {
    double[] result = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      result[i] = values[i];
    }
    return result;
  }

  private static void writeBack(List<Data.Part> parts, Object[] arguments) {
    for (int i = 0; i < arguments.length; i++) {
      if (parts.get(i) instanceof Data.Matrix matrix) {
        for (int row = 0; row < matrix.rows().length; row++) {
          writeBack(matrix.rows()[row], ((float[][]) arguments[i])[row]);
        }
      } else {
        writeBack(((Data.Vector) parts.get(i)).values(), (float[]) arguments[i]);
      }
    }
  }

  private static void writeBack(double[] values, float[] after) {
    for (int i = 0; i < values.length; i++) {
      if (Float.floatToRawIntBits((float) values[i]) != Float.floatToRawIntBits(after[i])) {
        values[i] = after[i];
      }
    }
  }
}
