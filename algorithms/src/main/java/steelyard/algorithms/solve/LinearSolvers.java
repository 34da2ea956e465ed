package steelyard.algorithms.solve;

import java.util.List;
import java.util.stream.Stream;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.Scope;

/** The catalogue of linear solvers. */
public final class LinearSolvers {

  private static final String ASNA =
      "Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., 2002, ";
  private static final String COMMONS_MATH = "Apache Commons Math 3.6.1, ";
  private static final String EJML = "EJML 0.46.1, ";

  private LinearSolvers() {}

  /**
   * Returns all candidates; the first, Gaussian elimination with partial pivoting, is the textbook
   * one.
   */
  public static List<Candidate<LinearSolver>> all() {
    return Stream.of(elimination(), determinants(), orthogonal(), refined(), libraries())
        .flatMap(List::stream)
        .toList();
  }

  private static List<Candidate<LinearSolver>> elimination() {
    return List.of(
        candidate(
                "gauss-partial",
                new GaussianElimination(Pivoting.PARTIAL),
                "Gaussian elimination, the largest pivot of each column",
                "2n³/3 flops",
                "Wilkinson 1961; " + ASNA + "section 9.3")
            .claiming(SolverBounds.partialPivoting()),
        candidate(
            "gauss-none",
            new GaussianElimination(Pivoting.NONE),
            "Gaussian elimination, pivots as they come",
            "2n³/3 flops",
            ASNA + "section 1.12.1"),
        candidate(
                "gauss-rook",
                new GaussianElimination(Pivoting.ROOK),
                "Gaussian elimination, a pivot that is largest in its row and its column",
                "2n³/3 flops, n² to n³/3 comparisons",
                "Neal and Poole 1992; Foster 1997; " + ASNA + "section 9.1")
            .claiming(SolverBounds.rookPivoting()),
        candidate(
                "gauss-complete",
                new GaussianElimination(Pivoting.COMPLETE),
                "Gaussian elimination, the largest pivot of all that is left",
                "2n³/3 flops, n³/3 comparisons",
                "Wilkinson 1961; " + ASNA + "section 9.4")
            .claiming(SolverBounds.completePivoting()),
        candidate(
            "gauss-jordan",
            new GaussJordan(),
            "elimination above and below the diagonal, the largest pivot of each column",
            "n³ flops",
            "Peters and Wilkinson 1975; " + ASNA + "section 14.4"));
  }

  private static List<Candidate<LinearSolver>> determinants() {
    return List.of(
        candidate(
                "cramer",
                new Cramer(),
                "Cramer's rule, determinants by cofactors with every minor computed once",
                "n²2ⁿ flops",
                ASNA + "section 1.10.1")
            .within(Scope.upTo(Cramer.MAX_SIZE)),
        candidate(
            "inverse",
            new ExplicitInverse(),
            "the inverse from partial pivoting, multiplied by the right-hand side",
            "8n³/3 flops",
            ASNA + "section 14.1"));
  }

  private static List<Candidate<LinearSolver>> orthogonal() {
    return List.of(
        candidate(
            "qr-householder",
            new HouseholderQr(),
            "QR by Householder reflections",
            "4n³/3 flops",
            ASNA + "section 19.3"),
        candidate(
            "qr-mgs",
            new ModifiedGramSchmidt(),
            "QR by modified Gram-Schmidt, the right-hand side as one more column",
            "2n³ flops",
            "Björck 1967; " + ASNA + "section 19.8"),
        candidate(
            "qr-cgs",
            new ClassicalGramSchmidt(),
            "QR by classical Gram-Schmidt, then R⁻¹(Qᵀb)",
            "2n³ flops",
            ASNA + "section 19.8"),
        candidate(
                "cholesky",
                new Cholesky(),
                "Cholesky factorisation, for symmetric positive definite matrices",
                "n³/3 flops",
                ASNA + "section 10.1")
            .within(Scope.requiring("positive-definite"))
            .claiming(SolverBounds.cholesky()));
  }

  private static List<Candidate<LinearSolver>> refined() {
    return List.of(
        candidate(
            "gauss-refined",
            new Refined(),
            "partial pivoting, then refinement in working precision",
            "2n³/3 flops, 6n² per step",
            "Skeel 1980; Arioli, Demmel and Duff 1989"),
        candidate(
            "gauss-refined-extended",
            new RefinedExtended(),
            "partial pivoting, then refinement on residuals in twice the precision",
            "2n³/3 flops, 12n² per step",
            "Moler 1967; Demmel and others 2006"),
        candidate(
            "gauss-equilibrated",
            new Equilibrated(),
            "rows, then columns scaled by powers of two, then partial pivoting",
            "2n³/3 flops",
            ASNA + "section 9.8"));
  }

  private static List<Candidate<LinearSolver>> libraries() {
    return List.of(
        candidate(
            "commons-math-lu",
            CommonsMath.LU,
            "partial pivoting; calls a matrix singular at any pivot below 1e-11",
            "2n³/3 flops",
            COMMONS_MATH + "LUDecomposition"),
        candidate(
            "commons-math-qr",
            CommonsMath.QR,
            "QR by Householder reflections; singular only at an exact zero",
            "4n³/3 flops",
            COMMONS_MATH + "QRDecomposition"),
        candidate(
            "commons-math-svd",
            CommonsMath.SVD,
            "singular values, small ones dropped; answers singular systems by least squares",
            "about 20n³ flops, iterative",
            COMMONS_MATH + "SingularValueDecomposition"),
        candidate(
            "ejml-lu",
            Ejml.LU,
            "partial pivoting; what is singular may get an answer that is not finite",
            "2n³/3 flops",
            EJML + "LinearSolverFactory_DDRM.lu"),
        candidate(
            "ejml-qr",
            Ejml.QR,
            "QR by Householder reflections",
            "4n³/3 flops",
            EJML + "LinearSolverFactory_DDRM.qr"));
  }

  /** Names the task's interface where a call chain would infer the implementing class. */
  private static Candidate<LinearSolver> candidate(
      String id, LinearSolver solver, String description, String cost, String source) {
    return Candidate.of(id, solver, description, cost, source);
  }
}
