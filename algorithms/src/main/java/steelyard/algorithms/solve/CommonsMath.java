package steelyard.algorithms.solve;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.DecompositionSolver;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.SingularMatrixException;
import org.apache.commons.math3.linear.SingularValueDecomposition;

/**
 * The solvers of Apache Commons Math, with the thresholds that the library sets by default. The
 * library copies the matrix before it works on it.
 */
enum CommonsMath implements LinearSolver {
  /** Partial pivoting; a pivot smaller than 1e-11, whatever the matrix's scale, is singular. */
  LU {
    @Override
    DecompositionSolver decompose(RealMatrix a) {
      return new LUDecomposition(a).getSolver();
    }
  },

  /** Householder reflections; only an exact zero on R's diagonal is singular. */
  QR {
    @Override
    DecompositionSolver decompose(RealMatrix a) {
      return new QRDecomposition(a).getSolver();
    }
  },

  /**
   * Singular values; those below a threshold are dropped, so that a singular system gets the least
   * squares solution of smallest norm and no exception.
   */
  SVD {
    @Override
    DecompositionSolver decompose(RealMatrix a) {
      return new SingularValueDecomposition(a).getSolver();
    }
  };

  abstract DecompositionSolver decompose(RealMatrix a);

  @Override
  public double[] solve(double[][] a, double[] b) {
    if (b.length == 0) {
      // The library has no matrices without rows.
      return new double[0];
    }
    try {
      return decompose(new Array2DRowRealMatrix(a, false))
          .solve(new ArrayRealVector(b, false))
          .toArray();
    } catch (SingularMatrixException cause) {
      throw Unsolvable.because(cause);
    }
  }
}
