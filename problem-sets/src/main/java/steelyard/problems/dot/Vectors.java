package steelyard.problems.dot;

import java.util.List;
import steelyard.problems.Data;

/**
 * The input of a dot product: two vectors of the same length.
 *
 * @param x the first
 * @param y the second
 */
public record Vectors(double[] x, double[] y) implements Data {

  @Override
  public List<Part> parts() {
    return List.of(new Vector("x", x), new Vector("y", y));
  }
}
