package steelyard.problems.solve.certificate;

import java.math.BigInteger;

/** A matrix of integers that stand for themselves times 2^-p, row by row in one array. */
final class FixedPointRows implements Rows {
  private final int size;
  private final int fractionBits;
  private final BigInteger[] entries;

  /** Makes one that changes the given array. */
  FixedPointRows(int size, int fractionBits, BigInteger[] entries) {
    this.size = size;
    this.fractionBits = fractionBits;
    this.entries = entries;
  }

  @Override
  public int size() {
    return size;
  }

  @Override
  public double magnitude(int row, int column) {
    return magnitude(entries[row * size + column], fractionBits);
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
    BigInteger pivot = entries[k * size + k];
    entries[k * size + k] = BigInteger.ONE.shiftLeft(fractionBits);
    for (int j = k * size + from; j < k * size + to; j++) {
      entries[j] = entries[j].shiftLeft(fractionBits).divide(pivot);
    }
  }

  @Override
  public void eliminate(int i, int k, int from, int to) {
    BigInteger factor = entries[i * size + k];
    if (factor.signum() == 0) {
      return;
    }
    entries[i * size + k] = BigInteger.ZERO;
    int target = i * size;
    int source = k * size;
    for (int j = from; j < to; j++) {
      BigInteger x = entries[source + j];
      if (x.signum() != 0) {
        entries[target + j] =
            entries[target + j].subtract(factor.multiply(x).shiftRight(fractionBits));
      }
    }
  }

  /** Returns roughly |x| times 2^-p, without overflow on the way. */
  static double magnitude(BigInteger x, int fractionBits) {
    int dropped = Math.max(0, x.bitLength() - 64);
    return Math.scalb(x.abs().shiftRight(dropped).doubleValue(), dropped - fractionBits);
  }

  private void swap(int first, int second) {
    BigInteger kept = entries[first];
    entries[first] = entries[second];
    entries[second] = kept;
  }
}
