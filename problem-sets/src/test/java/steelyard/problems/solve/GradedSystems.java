package steelyard.problems.solve;

import java.util.Arrays;
import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.exact.ExactAccumulator;

/**
 * Random systems whose difficulty rises in steps, past the reach of the families: every entry is
 * stored exactly as constructed.
 */
enum GradedSystems {

  /**
   * Products of unit triangular matrices of integers: the determinant is 1, and the inverse grows
   * with the powers of their entries.
   */
  UNIMODULAR {
    @Override
    double[][] matrix(int size, int difficulty, UniformRandomProvider random) {
      int largest = size <= 5 ? 1 << difficulty : 1 + 40 * difficulty / size;
      double[][] lower = new double[size][size];
      double[][] upper = new double[size][size];
      double[][] a = new double[size][size];
      for (int i = 0; i < size; i++) {
        lower[i][i] = 1;
        upper[i][i] = 1;
        for (int j = 0; j < i; j++) {
          lower[i][j] = integer(random, largest);
          upper[j][i] = integer(random, largest);
        }
      }
      for (int i = 0; i < size; i++) {
        for (int j = 0; j < size; j++) {
          for (int k = 0; k <= Math.min(i, j); k++) {
            a[i][j] += lower[i][k] * upper[k][j];
          }
        }
      }
      return a;
    }
  },

  /** Integers whose last row is a combination of the others but for 2^-3 to 2^-41. */
  NEARLY_DEPENDENT {
    @Override
    double[][] matrix(int size, int difficulty, UniformRandomProvider random) {
      double[][] a = new double[size][size];
      for (int i = 0; i < size - 1; i++) {
        int factor = 1 + random.nextInt(2);
        for (int j = 0; j < size; j++) {
          // With a dominant diagonal nothing but the last row is nearly dependent.
          a[i][j] = i == j ? 10 * size : integer(random, 9);
          a[size - 1][j] += factor * a[i][j];
        }
      }
      a[size - 1][size - 1] += Math.scalb(1.0, -2 * difficulty - 3 - difficulty / 2);
      return a;
    }
  },

  /** Random matrices whose rows and columns have units up to 2^64 apart. */
  SCALED {
    @Override
    double[][] matrix(int size, int difficulty, UniformRandomProvider random) {
      double[][] a = new double[size][size];
      for (double[] row : a) {
        Arrays.setAll(row, j -> 2 * random.nextDouble() - 1);
      }
      return scaled(a, 4 * difficulty, random);
    }
  },

  /** Nearly dependent rows hidden behind units. */
  SCALED_NEARLY_DEPENDENT {
    @Override
    double[][] matrix(int size, int difficulty, UniformRandomProvider random) {
      return scaled(NEARLY_DEPENDENT.matrix(size, difficulty, random), 3 * difficulty + 1, random);
    }
  },

  /** Entries of all magnitudes. */
  SCATTERED {
    @Override
    double[][] matrix(int size, int difficulty, UniformRandomProvider random) {
      double[][] a = new double[size][size];
      int range = 1 + 6 * difficulty;
      for (double[] row : a) {
        Arrays.setAll(
            row, j -> Math.scalb(2 * random.nextDouble() - 1, random.nextInt(range) - range / 2));
      }
      return a;
    }
  };

  /** The hardest step; the easiest is 0. */
  static final int HARDEST = 15;

  abstract double[][] matrix(int size, int difficulty, UniformRandomProvider random);

  /** Makes a system; the right-hand side is of integers, or the row sums where they are doubles. */
  LinearSystem make(int size, int difficulty, UniformRandomProvider random) {
    double[][] a = matrix(size, difficulty, random);
    boolean sums = random.nextInt(4) == 0;
    double[] b = new double[size];
    Arrays.setAll(b, i -> sums ? ExactAccumulator.sum(a[i]).doubleValue() : integer(random, 1000));
    b[0] = b[0] == 0 ? 1 : b[0];
    return new LinearSystem(a, b);
  }

  private static int integer(UniformRandomProvider random, int largest) {
    return random.nextInt(2 * largest + 1) - largest;
  }

  private static double[][] scaled(double[][] a, int range, UniformRandomProvider random) {
    int[] columns = random.ints(a.length, 0, range + 1).toArray();
    for (double[] row : a) {
      int unit = random.nextInt(range + 1);
      Arrays.setAll(row, j -> Math.scalb(row[j], unit - columns[j]));
    }
    return a;
  }
}
