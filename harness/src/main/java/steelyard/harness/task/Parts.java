package steelyard.harness.task;

import java.util.List;
import steelyard.problems.Data;

/** Takes the arrays of an input by position, for the bindings. */
final class Parts {

  private Parts() {}

  static double[] vector(List<Data.Part> parts, int index) {
    if (index < parts.size() && parts.get(index) instanceof Data.Vector vector) {
      return vector.values();
    }
    throw new IllegalArgumentException("part " + (index + 1) + " must be a vector");
  }

  static double[][] matrix(List<Data.Part> parts, int index) {
    if (index < parts.size() && parts.get(index) instanceof Data.Matrix matrix) {
      return matrix.rows();
    }
    throw new IllegalArgumentException("part " + (index + 1) + " must be a matrix");
  }
}
