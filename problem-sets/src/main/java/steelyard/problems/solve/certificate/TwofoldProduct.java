package steelyard.problems.solve.certificate;

/**
 * The rows of a product of two square matrices, H X + L X + H Y without L Y, in twofold precision.
 *
 * <p>The n products of H and X that make an entry are added up in blocks, and the blocks to each
 * other, each by a {@link TwofoldRow}; every product and every sum is split without error into its
 * rounded value and its rounding error. These corrections are summed in double, together with the
 * products of L and Y, which are no larger. Let S be |H| |X|, enlarged by the magnitude of what the
 * entry starts from, and let |L| |X| + |H| |Y| be at most 2u S. Then
 *
 * <ul>
 *   <li>the errors of the products amount to at most u S, those of the sums to at most &gamma;_d (1
 *       + u) S, where no product takes part in more than d = {@link #sums} of them;
 *   <li>so the corrections amount to at most (3u + &gamma;_d (1 + u)) S &lt;= &gamma;_{d+4} S, and
 *       their sum is computed with an error of at most &gamma;_e &gamma;_{d+4} S, where none takes
 *       part in more than e = {@link #corrections} operations.
 * </ul>
 *
 * <p>This is the argument of Ogita, Rump and Oishi (2005, Proposition 5.5) with shorter chains.
 * Each of the three kinds of products may be wrong by another 2^-1074 where it underflows.
 */
final class TwofoldProduct {
  private static final int BLOCK = 16;

  private final int size;
  private final TwofoldRow block;
  private final TwofoldRow row;

  TwofoldProduct(int size) {
    this.size = size;
    block = new TwofoldRow(size);
    row = new TwofoldRow(size);
  }

  /** Returns d. */
  static int sums(int size) {
    return BLOCK + blocks(size);
  }

  /** Returns e. */
  static int corrections(int size) {
    return 2 * BLOCK + blocks(size) + 4;
  }

  private static int blocks(int size) {
    return (size + BLOCK - 1) / BLOCK;
  }

  /**
   * Returns row i of (H + L) X, to which a start value is added on the diagonal.
   *
   * @return the row, until the next one is made
   */
  TwofoldRow row(int i, double start, double[] high, double[] low, double[][] x) {
    row.clear();
    row.start(i, start);
    for (int from = 0; from < size; from += BLOCK) {
      block.clear();
      for (int k = from; k < Math.min(size, from + BLOCK); k++) {
        block.add(high[k], low[k], x[k]);
      }
      row.add(block);
    }
    return row;
  }

  /**
   * Returns a row of H (X + Y).
   *
   * @return the row, until the next one is made
   */
  TwofoldRow row(double[] factors, double[][] x, double[][] y) {
    row.clear();
    for (int from = 0; from < size; from += BLOCK) {
      block.clear();
      for (int k = from; k < Math.min(size, from + BLOCK); k++) {
        block.add(factors[k], 0, x[k]);
        block.addSmall(factors[k], y[k]);
      }
      row.add(block);
    }
    return row;
  }
}
