package steelyard.problems.solve.certificate;

/** A matrix of doubles, row by row in one array. */
final class DoubleRows implements Rows {
  private final int size;
  private final double[] entries;

  /** Makes one that changes the given array. */
  DoubleRows(int size, double[] entries) {
    this.size = size;
    this.entries = entries;
  }

  @Override
  public int size() {
    return size;
  }

  @Override
  public double magnitude(int row, int column) {
    return Math.abs(entries[row * size + column]);
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
  public void normalize(int k) {
    double pivot = entries[k * size + k];
    entries[k * size + k] = 1;
    for (int j = k * size; j < (k + 1) * size; j++) {
      entries[j] /= pivot;
    }
  }

  @Override
  public void eliminate(int i, int k) {
    double factor = entries[i * size + k];
    if (factor == 0) {
      return;
    }
    entries[i * size + k] = 0;
    int target = i * size;
    int source = k * size;
    for (int j = 0; j < size; j++) {
      entries[target + j] -= factor * entries[source + j];
    }
  }

  private void swap(int first, int second) {
    double kept = entries[first];
    entries[first] = entries[second];
    entries[second] = kept;
  }
}
