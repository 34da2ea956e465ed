package steelyard.problems.solve;

import java.util.List;
import steelyard.problems.Data;

/**
 * A square system of linear equations a x = b.
 *
 * @param a the matrix, n rows of n finite entries
 * @param b the right-hand side, n finite entries
 */
public record LinearSystem(double[][] a, double[] b) implements Data {

  /**
   * Checks the shape and the entries.
   *
   * @throws IllegalArgumentException if the matrix is empty or not square, b has another length, or
   *     an entry is not finite
   */
  public LinearSystem {
    if (a.length == 0 || a.length != b.length) {
      throw new IllegalArgumentException(
          "a has "
              + a.length
              + " rows and b "
              + b.length
              + " entries; both must be the same n >= 1");
    }
    requireFinite("b", b);
    for (int i = 0; i < a.length; i++) {
      if (a[i].length != a.length) {
        throw new IllegalArgumentException(
            "row " + (i + 1) + " of a has " + a[i].length + " entries; it must have " + a.length);
      }
      requireFinite("row " + (i + 1) + " of a", a[i]);
    }
  }

  /** Returns n. */
  public int size() {
    return b.length;
  }

  @Override
  public List<Part> parts() {
    return List.of(new Matrix("a", a), new Vector("b", b));
  }

  private static void requireFinite(String name, double[] entries) {
    for (int i = 0; i < entries.length; i++) {
      if (!Double.isFinite(entries[i])) {
        throw new IllegalArgumentException(
            "entry " + (i + 1) + " of " + name + " is not finite; every entry must be");
      }
    }
  }
}
