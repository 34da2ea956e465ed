package steelyard.problems.solve.certificate;

/**
 * A matrix of unevaluated sums of two doubles, row by row in two arrays. The operations are those
 * of {@link DoubleDouble}, written out because the elimination spends its time here; the addition
 * is the shorter one, whose error is small relative to the operands but not always to the sum,
 * which suffices for an inverse that is proved afterwards.
 */
final class DoubleDoubleRows implements Rows {
  private final int size;
  private final double[] high;
  private final double[] low;

  /** Makes one that changes the given arrays. */
  DoubleDoubleRows(int size, double[] high, double[] low) {
    this.size = size;
    this.high = high;
    this.low = low;
  }

  @Override
  public int size() {
    return size;
  }

  @Override
  public double magnitude(int row, int column) {
    return Math.abs(high[row * size + column]);
  }

  @Override
  public void swapRows(int first, int second) {
    for (int j = 0; j < size; j++) {
      swap(first * size + j, second * size + j);
    }
  }

  @Override
  public void swapColumns(int first, int second) {
    for (int i = 0; i < size; i++) {
      swap(i * size + first, i * size + second);
    }
  }

  @Override
  public void normalize(int k, int from, int to) {
    int pivotAt = k * size + k;
    DoubleDouble pivot = new DoubleDouble(high[pivotAt], low[pivotAt]);
    high[pivotAt] = 1;
    low[pivotAt] = 0;
    for (int j = k * size + from; j < k * size + to; j++) {
      DoubleDouble quotient = new DoubleDouble(high[j], low[j]).dividedBy(pivot);
      high[j] = quotient.high();
      low[j] = quotient.low();
    }
  }

  @Override
  public void eliminate(int i, int k, int from, int to) {
    double factorHigh = high[i * size + k];
    double factorLow = low[i * size + k];
    if (factorHigh == 0) {
      return;
    }
    high[i * size + k] = 0;
    low[i * size + k] = 0;
    int target = i * size;
    int source = k * size;
    for (int j = from; j < to; j++) {
      double x = high[source + j];
      double product = factorHigh * x;
      double productLow =
          Math.fma(factorHigh, x, -product) + (factorHigh * low[source + j] + factorLow * x);
      double y = high[target + j];
      double sum = y - product;
      double part = sum - y;
      double sumLow = (y - (sum - part)) - (product + part) + (low[target + j] - productLow);
      double rounded = sum + sumLow;
      high[target + j] = rounded;
      low[target + j] = sumLow - (rounded - sum);
    }
  }

  private void swap(int first, int second) {
    double kept = high[first];
    high[first] = high[second];
    high[second] = kept;
    kept = low[first];
    low[first] = low[second];
    low[second] = kept;
  }
}
