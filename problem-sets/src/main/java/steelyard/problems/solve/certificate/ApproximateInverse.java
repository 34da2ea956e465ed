package steelyard.problems.solve.certificate;

/**
 * An approximate inverse R of a scaled matrix A, and the proof of how good it is. This is all that
 * {@link InverseBounds} and {@link Refinement} know of an arithmetic.
 */
interface ApproximateInverse {
  /**
   * Returns upper bounds on the row sums of |I - R A|, rounding errors of their own computation
   * included; a NaN or an infinity where overflow left nothing proved.
   */
  double[] residualRowSums();

  /**
   * Returns |R|, row by row in one array, each entry with a relative error of at most 2^-52, or an
   * absolute one of 2^-1074 where it underflows.
   */
  double[] magnitudes();

  /** Returns how many doubles, of which the sum is meant, stand for a number in this arithmetic. */
  int parts();

  /**
   * Returns R v approximately. Nothing is claimed of its accuracy.
   *
   * @param v as many vectors as a number has parts
   * @return as many vectors
   */
  double[][] times(double[][] v);
}
