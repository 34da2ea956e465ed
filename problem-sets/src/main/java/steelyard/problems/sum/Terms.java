package steelyard.problems.sum;

import java.util.List;
import steelyard.problems.Data;

/**
 * The input of a sum.
 *
 * @param values the terms, in the order in which they are to be added
 */
public record Terms(double[] values) implements Data {

  @Override
  public List<Part> parts() {
    return List.of(new Vector("terms", values));
  }
}
