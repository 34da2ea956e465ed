package steelyard.algorithms.solve;

import steelyard.algorithms.Bound;

/**
 * The bounds that solvers claim, all on the normwise backward error in the ∞-norm. Only bounds
 * whose constants are published are here; those for Householder QR and the Gram-Schmidt methods
 * have unspecified constants, and those for refinement have conditions that n, κ and u do not
 * decide.
 *
 * <p>For Gaussian elimination (A+ΔA)x̂ = b with ‖ΔA‖ ≤ n² γ₃ₙ ρ ‖A‖, where ρ is the growth of the
 * elements (Higham 2002, Theorem 9.5). The growth is limited in exact arithmetic:
 *
 * <ul>
 *   <li>partial pivoting: 2ⁿ⁻¹, attained by Wilkinson's matrix (Wilkinson 1961);
 *   <li>rook pivoting: 1.5 n^(¾ ln n) (Foster 1997), and 2ⁿ⁻¹ since it is also partial pivoting;
 *   <li>complete pivoting: √(n · 2 · 3^(1/2) ⋯ n^(1/(n−1))) (Wilkinson 1961).
 * </ul>
 *
 * Rounding can raise the computed growth by a factor 1 + O(u) for fixed n. The theorem's n² has
 * room for it: it stands for the largest row sum of |L||U|, in units of the largest |uᵢⱼ|, which is
 * at most n(n+1)/2 for n rows.
 *
 * <p>For Cholesky |ΔA| ≤ γ₃ₙ₊₁ |R̂ᵀ||R̂| (Higham 2002, Theorem 10.4), and the squares in column i
 * of R̂ add up to at most aᵢᵢ/(1−γₙ₊₁) (same place, proof of Theorem 10.5; Demmel 1989). By
 * Cauchy-Schwarz every |Δaᵢⱼ| is at most γ₃ₙ₊₁/(1−γₙ₊₁) √(aᵢᵢ aⱼⱼ), and √(aᵢᵢ aⱼⱼ) ≤ ‖A‖; a row has
 * n entries, so ‖ΔA‖ ≤ n γ₃ₙ₊₁/(1−γₙ₊₁) ‖A‖. Both leave b as it is, which the backward error that
 * they limit does not demand.
 *
 * <p>All assume that nothing underflows or overflows.
 *
 * <ol>
 *   <li><a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *       Numerical Algorithms, 2nd ed., 2002</a>
 *   <li><a href="https://doi.org/10.1145/321075.321076">Wilkinson, Error analysis of direct methods
 *       of matrix inversion, Journal of the ACM 8 (1961) 281-330</a>
 *   <li><a href="https://doi.org/10.1016/S0377-0427(97)00154-4">Foster, The growth factor and
 *       efficiency of Gaussian elimination with rook pivoting, Journal of Computational and Applied
 *       Mathematics 86 (1997) 177-194</a>
 * </ol>
 */
final class SolverBounds {

  private SolverBounds() {}

  static Bound partialPivoting() {
    return Bound.backward(
        (n, kappa, u) -> elimination(n, u, partialGrowth(n)),
        "n²γ₃ₙ2ⁿ⁻¹",
        "Higham 2002, Theorem 9.5; growth Wilkinson 1961");
  }

  static Bound rookPivoting() {
    return Bound.backward(
        (n, kappa, u) -> elimination(n, u, rookGrowth(n)),
        "n²γ₃ₙ min(2ⁿ⁻¹, 1.5n^(¾ ln n))",
        "Higham 2002, Theorem 9.5; growth Foster 1997");
  }

  static Bound completePivoting() {
    return Bound.backward(
        (n, kappa, u) -> elimination(n, u, completeGrowth(n)),
        "n²γ₃ₙ√(n·2·3^(1/2)⋯n^(1/(n−1)))",
        "Higham 2002, Theorem 9.5; growth Wilkinson 1961");
  }

  static Bound cholesky() {
    return Bound.backward(
        (n, kappa, u) -> {
          double slack = 1 - Bound.gamma(n + 1.0, u);
          return slack > 0 ? n * Bound.gamma(3.0 * n + 1, u) / slack : Double.POSITIVE_INFINITY;
        },
        "nγ₃ₙ₊₁/(1−γₙ₊₁)",
        "from Higham 2002, Theorem 10.4 and the proof of Theorem 10.5");
  }

  private static double elimination(int n, double u, double growth) {
    return (double) n * n * Bound.gamma(3.0 * n, u) * growth;
  }

  static double partialGrowth(int n) {
    return Math.scalb(1.0, n - 1);
  }

  static double rookGrowth(int n) {
    double foster = 1.5 * StrictMath.pow(n, 0.75 * StrictMath.log(n));
    return Math.min(partialGrowth(n), foster);
  }

  static double completeGrowth(int n) {
    double logarithm = StrictMath.log(n);
    for (int k = 2; k <= n; k++) {
      logarithm += StrictMath.log(k) / (k - 1);
    }
    return StrictMath.exp(logarithm / 2);
  }
}
