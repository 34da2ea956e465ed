package steelyard.problems;

import java.util.List;

/** The input of a problem: named arrays of doubles. */
public interface Data {

  /** Returns the arrays, in the order in which the task takes them. Callers do not modify them. */
  List<Part> parts();

  /** A named array. */
  sealed interface Part {
    /** Returns the name that the task gives it, such as {@code terms}, {@code a} or {@code b}. */
    String name();
  }

  /**
   * A vector.
   *
   * @param name its name
   * @param values its entries
   */
  record Vector(String name, double[] values) implements Part {}

  /**
   * A matrix.
   *
   * @param name its name
   * @param rows its rows, all of the same length
   */
  record Matrix(String name, double[][] rows) implements Part {}
}
