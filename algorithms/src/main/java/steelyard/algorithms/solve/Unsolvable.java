package steelyard.algorithms.solve;

/** The sentences with which a solver declines a system. */
final class Unsolvable {

  private Unsolvable() {}

  static ArithmeticException zeroPivot(int column) {
    return new ArithmeticException(
        "the matrix is singular to this candidate: the pivot of column "
            + (column + 1)
            + " is zero, and it must not be");
  }

  static ArithmeticException notSymmetric(int row, int column) {
    return new ArithmeticException(
        "the matrix is not symmetric: entry ("
            + (row + 1)
            + ", "
            + (column + 1)
            + ") must equal the entry across the diagonal");
  }

  static ArithmeticException notPositiveDefinite(int column) {
    return new ArithmeticException(
        "the matrix is not positive definite to this candidate: the pivot of column "
            + (column + 1)
            + " must be positive");
  }

  /** Returns what a library's own exception means, and keeps it as the cause. */
  static ArithmeticException because(RuntimeException cause) {
    ArithmeticException declined =
        new ArithmeticException("the library declines the matrix: " + cause.getMessage());
    declined.initCause(cause);
    return declined;
  }
}
