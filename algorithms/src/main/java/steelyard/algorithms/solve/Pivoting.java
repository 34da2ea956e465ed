package steelyard.algorithms.solve;

/**
 * How Gaussian elimination chooses its pivots. Comparisons with NaN are false, so a NaN is never
 * preferred and no search can go round in circles.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 9.1</a>
 */
enum Pivoting {
  /** Takes the diagonal entry as it comes. */
  NONE {
    @Override
    Position choose(double[][] a, int k) {
      return new Position(k, k);
    }
  },

  /** Takes the entry of largest modulus in the column. */
  PARTIAL {
    @Override
    Position choose(double[][] a, int k) {
      return new Position(largestInColumn(a, k, k), k);
    }
  },

  /**
   * Takes an entry of largest modulus in both its row and its column, found by turning from columns
   * to rows and back for as long as the entry grows (Neal and Poole 1992).
   */
  ROOK {
    @Override
    Position choose(double[][] a, int k) {
      Position here = new Position(largestInColumn(a, k, k), k);
      while (true) {
        Position inRow = new Position(here.row, largestInRow(a[here.row], k, here.column));
        Position inColumn = new Position(largestInColumn(a, k, inRow.column), inRow.column);
        if (!larger(a, inColumn, here)) {
          return here;
        }
        here = larger(a, inColumn, inRow) ? inColumn : inRow;
      }
    }
  },

  /** Takes an entry of largest modulus in all that is left. */
  COMPLETE {
    @Override
    Position choose(double[][] a, int k) {
      Position best = new Position(k, k);
      for (int i = k; i < a.length; i++) {
        Position here = new Position(i, largestInRow(a[i], k, k));
        best = larger(a, here, best) ? here : best;
      }
      return best;
    }
  };

  /** Where an entry stands. */
  record Position(int row, int column) {}

  /**
   * Returns the place of the pivot for step k, at or after row k and column k.
   *
   * @param a the matrix of which k rows and columns are eliminated
   */
  abstract Position choose(double[][] a, int k);

  private static boolean larger(double[][] a, Position one, Position other) {
    return Math.abs(a[one.row][one.column]) > Math.abs(a[other.row][other.column]);
  }

  private static int largestInColumn(double[][] a, int from, int column) {
    int best = from;
    for (int i = from + 1; i < a.length; i++) {
      if (Math.abs(a[i][column]) > Math.abs(a[best][column])) {
        best = i;
      }
    }
    return best;
  }

  /** Prefers the given column among equals, so that a search moves only to a larger entry. */
  private static int largestInRow(double[] row, int from, int preferred) {
    int best = preferred;
    for (int j = from; j < row.length; j++) {
      if (Math.abs(row[j]) > Math.abs(row[best])) {
        best = j;
      }
    }
    return best;
  }
}
