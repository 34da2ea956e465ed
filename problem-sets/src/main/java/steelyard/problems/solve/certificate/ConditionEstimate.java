package steelyard.problems.solve.certificate;

import java.util.List;
import steelyard.problems.UncertifiedException;

/**
 * An estimate of the normwise condition number without any proof, for the calibration of
 * generators: from the inverse in double, or in double-double where double cannot tell.
 */
public final class ConditionEstimate {

  // Beyond this the inverse in double may have no correct digit.
  private static final double LARGEST_FOR_DOUBLE = 1e13;

  private ConditionEstimate() {}

  /**
   * Returns an estimate of ||A⁻¹|| (||A|| ||x|| + ||b||)/||x||; infinite if the matrix seems to be
   * singular.
   */
  public static double of(double[][] a, double[] b) {
    List<Route> routes =
        List.of(new DoubleInverse.DoubleRoute(), new DoubleDoubleInverse.DoubleDoubleRoute());
    ScaledSystem system;
    try {
      system = new ScaledSystem(a, b);
    } catch (UncertifiedException singular) {
      return Double.POSITIVE_INFINITY;
    }
    double estimate = Double.POSITIVE_INFINITY;
    for (Route route : routes) {
      estimate = route.invert(system).map(r -> kappa(system, r)).orElse(Double.POSITIVE_INFINITY);
      if (estimate < LARGEST_FOR_DOUBLE) {
        return estimate;
      }
    }
    return estimate;
  }

  private static double kappa(ScaledSystem system, ApproximateInverse inverse) {
    int n = system.size;
    double[] magnitudes = inverse.magnitudes();
    double[][] b = new double[inverse.parts()][n];
    b[0] = system.rightHandSide;
    double[] x = inverse.times(b)[0];
    double inverseNorm = 0;
    double matrixNorm = 0;
    double xNorm = 0;
    double bNorm = 0;
    for (int i = 0; i < n; i++) {
      double inverseSum = 0;
      double matrixSum = 0;
      for (int j = 0; j < n; j++) {
        int at = i * n + j;
        inverseSum += Math.scalb(magnitudes[at], system.columnShift[i] + system.rowShift[j]);
        matrixSum +=
            Math.scalb(Math.abs(system.matrix[at]), -system.rowShift[i] - system.columnShift[j]);
      }
      inverseNorm = Math.max(inverseNorm, inverseSum);
      matrixNorm = Math.max(matrixNorm, matrixSum);
      xNorm = Math.max(xNorm, Math.scalb(Math.abs(x[i]), system.columnShift[i]));
      bNorm = Math.max(bNorm, Math.scalb(Math.abs(system.rightHandSide[i]), -system.rowShift[i]));
    }
    double kappa = inverseNorm * (matrixNorm + bNorm / xNorm);
    return kappa > 0 ? kappa : Double.POSITIVE_INFINITY;
  }
}
