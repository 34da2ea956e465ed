package steelyard.algorithms.solve;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;

/**
 * The single-threaded dense solvers of EJML, as its factory chooses them for the size. The library
 * works on copies.
 */
enum Ejml implements LinearSolver {
  /** Partial pivoting. */
  LU {
    @Override
    LinearSolverDense<DMatrixRMaj> create(int n) {
      return LinearSolverFactory_DDRM.lu(n);
    }
  },

  /** Householder reflections. */
  QR {
    @Override
    LinearSolverDense<DMatrixRMaj> create(int n) {
      return LinearSolverFactory_DDRM.qr(n, n);
    }
  };

  abstract LinearSolverDense<DMatrixRMaj> create(int n);

  /**
   * {@inheritDoc}
   *
   * @throws ArithmeticException if the library's factorisation fails; some singular matrices pass
   *     it and give an answer that is not finite
   */
  @Override
  public double[] solve(double[][] a, double[] b) {
    int n = b.length;
    if (n == 0) {
      return new double[0];
    }
    LinearSolverDense<DMatrixRMaj> solver = create(n);
    if (!solver.setA(new DMatrixRMaj(a))) {
      throw new ArithmeticException(
          "the library declines the matrix: it is singular to its factorisation");
    }
    DMatrixRMaj x = new DMatrixRMaj(n, 1);
    solver.solve(DMatrixRMaj.wrap(n, 1, b.clone()), x);
    return x.getData();
  }
}
