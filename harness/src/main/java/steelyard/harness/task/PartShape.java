package steelyard.harness.task;

/**
 * An array that an input of a task is made of.
 *
 * @param name the name that the task gives it
 * @param matrix whether it is a matrix; else a vector
 * @param largest the most rows, or entries of a vector, that the task can handle
 */
public record PartShape(String name, boolean matrix, int largest) {

  static PartShape vector(String name) {
    return vector(name, Integer.MAX_VALUE);
  }

  static PartShape vector(String name, int largest) {
    return new PartShape(name, false, largest);
  }

  static PartShape matrix(String name, int largest) {
    return new PartShape(name, true, largest);
  }
}
