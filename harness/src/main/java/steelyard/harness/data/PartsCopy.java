package steelyard.harness.data;

import java.util.List;
import steelyard.problems.Data;

/**
 * Copies of an input's parts, so that a candidate gets arrays of its own, and their comparison bit
 * for bit, so that a candidate that wrote to its input is found out.
 */
public final class PartsCopy {

  private PartsCopy() {}

  /** Returns parts that share no array with the given ones. */
  public static List<Data.Part> of(List<Data.Part> parts) {
    return parts.stream().map(PartsCopy::copy).toList();
  }

  /** Says whether two inputs have the same names, shapes and bits. */
  public static boolean sameBits(List<Data.Part> left, List<Data.Part> right) {
    if (left.size() != right.size()) {
      return false;
    }
    for (int i = 0; i < left.size(); i++) {
      if (!same(left.get(i), right.get(i))) {
        return false;
      }
    }
    return true;
  }

  private static Data.Part copy(Data.Part part) {
    if (part instanceof Data.Matrix matrix) {
      double[][] rows = new double[matrix.rows().length][];
      for (int i = 0; i < rows.length; i++) {
        rows[i] = matrix.rows()[i].clone();
      }
      return new Data.Matrix(matrix.name(), rows);
    }
    Data.Vector vector = (Data.Vector) part;
    return new Data.Vector(vector.name(), vector.values().clone());
  }

  private static boolean same(Data.Part left, Data.Part right) {
    if (!left.name().equals(right.name())) {
      return false;
    }
    if (left instanceof Data.Vector a && right instanceof Data.Vector b) {
      return same(a.values(), b.values());
    }
    return left instanceof Data.Matrix a
        && right instanceof Data.Matrix b
        && same(a.rows(), b.rows());
  }

  private static boolean same(double[][] left, double[][] right) {
    if (left.length != right.length) {
      return false;
    }
    for (int i = 0; i < left.length; i++) {
      if (!same(left[i], right[i])) {
        return false;
      }
    }
    return true;
  }

  /** Compares raw bits, which {@link java.util.Arrays#equals(double[], double[])} does not. */
  private static boolean same(double[] left, double[] right) {
    if (left.length != right.length) {
      return false;
    }
    for (int i = 0; i < left.length; i++) {
      if (Double.doubleToRawLongBits(left[i]) != Double.doubleToRawLongBits(right[i])) {
        return false;
      }
    }
    return true;
  }
}
