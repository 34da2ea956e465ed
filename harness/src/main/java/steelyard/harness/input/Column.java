package steelyard.harness.input;

/**
 * A vector that was read from a file.
 *
 * @param values its entries, all finite
 * @param inexact how many of them were rounded
 */
record Column(double[] values, Inexact inexact) {}
