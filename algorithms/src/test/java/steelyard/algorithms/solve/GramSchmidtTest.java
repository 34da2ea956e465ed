package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;

/**
 * The Hilbert matrix of order 8, κ₂ = 1.525757574164694e10 (Higham 2002, Table 28.2): the modified
 * method loses orthogonality as κ u (Björck 1967), the classical one as κ² u.
 */
class GramSchmidtTest {

  private static final int N = 8;
  private static final double KAPPA = 1.525757574164694e10;
  private static final double[][] A = Systems.hilbert(N);

  @Test
  void theModifiedMethodLosesOrthogonalityInProportionToTheConditionNumber() {
    double loss = lossOfOrthogonality(ModifiedGramSchmidt.factor(A).q());
    assertThat(loss).isLessThan(10 * N * KAPPA * Catalogue.U).isGreaterThan(1e6 * Catalogue.U);
  }

  @Test
  void theClassicalMethodLosesItAltogether() {
    assertThat(lossOfOrthogonality(ClassicalGramSchmidt.factor(A).q())).isGreaterThan(0.5);
  }

  @Test
  void theRightHandSideAsOneMoreColumnSavesTheModifiedMethod() {
    double[] b = Systems.times(A, new double[] {1, 1, 1, 1, 1, 1, 1, 1});
    ExactSystem system = new ExactSystem(A, b);
    double stable = 10 * N * Catalogue.U;
    assertThat(system.backwardError(Catalogue.solve("qr-mgs", A, b))).isLessThanOrEqualTo(stable);
    assertThat(system.backwardError(Catalogue.solve("qr-cgs", A, b))).isGreaterThan(1e4 * stable);
  }

  /** Both give back the matrix: what they lose is orthogonality alone. */
  @Test
  void bothFactorTheMatrixUpToRounding() {
    for (QrFactors factors :
        new QrFactors[] {ModifiedGramSchmidt.factor(A), ClassicalGramSchmidt.factor(A)}) {
      double[][] columns = Rows.ofColumns(factors.q());
      double[][] r = Rows.ofColumns(factors.r());
      for (int i = 0; i < N; i++) {
        for (int j = 0; j < N; j++) {
          assertThat(Vectors.dot(columns[i], r[j]) - A[i][j])
              .isBetween(-10 * N * Catalogue.U, 10 * N * Catalogue.U);
        }
      }
    }
  }

  /** Returns the largest entry of |QᵀQ − I|, exact until the end. */
  private static double lossOfOrthogonality(double[][] q) {
    BigDecimal loss = BigDecimal.ZERO;
    for (int i = 0; i < q.length; i++) {
      for (int j = 0; j <= i; j++) {
        BigDecimal product = i == j ? BigDecimal.ONE.negate() : BigDecimal.ZERO;
        for (int k = 0; k < q.length; k++) {
          product = product.add(new BigDecimal(q[i][k]).multiply(new BigDecimal(q[j][k])));
        }
        loss = loss.max(product.abs());
      }
    }
    return loss.doubleValue();
  }
}
