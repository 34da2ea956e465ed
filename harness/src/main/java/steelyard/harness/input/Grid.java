package steelyard.harness.input;

/**
 * A matrix that was read from a file.
 *
 * @param rows its rows, all of one length, all entries finite
 * @param inexact how many of the entries that stand in the file were rounded
 */
record Grid(double[][] rows, Inexact inexact) {}
