package steelyard.results.verdict;

import java.util.List;
import steelyard.results.Grade;
import steelyard.results.Observation;

/**
 * Every forward error is at most 2u + (D(n)u)ᵏκ, as if the answer had been computed in k-fold
 * working precision and then rounded; and some problem gives evidence for this k and no smaller
 * one: (k-1)-fold precision may lose everything on it, (D(n)u)ᵏ⁻¹κ ≥ 1, and k-fold may not,
 * (D(n)u)ᵏκ ≤ 0.01.
 *
 * <p>Where κ is infinite the limit is too: such a problem is no evidence, and breaks nothing.
 *
 * <p>Reference: the form of the bound is that of T. Ogita, S. M. Rump and S. Oishi, "Accurate Sum
 * and Dot Product", SIAM J. Sci. Comput. 26 (2005) 1955-1988, doi:10.1137/030601818.
 */
record KFoldRule(int k) implements VerdictRule {
  private static final double LITTLE = 0.01;

  @Override
  public Grade grade() {
    return Grade.ofFolds(k);
  }

  @Override
  public boolean isEvidence(List<Observation> judged) {
    return judged.stream().anyMatch(this::isEvidence);
  }

  private boolean isEvidence(Observation o) {
    return loss(o, k - 1) >= 1 && loss(o, k) <= LITTLE;
  }

  @Override
  public double used(Observation o) {
    double u = Allowances.unitRoundoff(o.precisionBits());
    return Allowances.share(o.forwardError().orElseThrow(), 2 * u + loss(o, k));
  }

  /** Returns (D(n)u)ʲκ: what may be lost of an answer that was computed in j-fold precision. */
  private static double loss(Observation o, int folds) {
    double oneFold = Allowances.d(o.size()) * Allowances.unitRoundoff(o.precisionBits());
    double loss = o.condition().orElseThrow();
    for (int i = 0; i < folds; i++) {
      loss *= oneFold;
    }
    return loss;
  }
}
