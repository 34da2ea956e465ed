package steelyard.problems.sum;

import java.util.Set;
import java.util.TreeSet;
import steelyard.problems.ExactScalarProblem;
import steelyard.problems.ScalarJudge;
import steelyard.problems.Trait;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactSums;

/**
 * A sum s of stored terms x. The reference is exact; the condition number is &Sigma;|x| / |s| and
 * the backward error |&#349; - s| / &Sigma;|x|, the least relative change of the terms that makes
 * an answer &#349; exact. How they are rounded is said at {@link ScalarJudge}.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, Chapter 4</a>
 */
public final class SumProblem extends ExactScalarProblem<Terms> {

  /**
   * Makes the problem of adding these terms.
   *
   * @throws IllegalArgumentException if there are none, or one is infinite or NaN
   */
  public SumProblem(Terms data) {
    this(data, judgeOf(data.values()));
  }

  private SumProblem(Terms data, ScalarJudge judge) {
    super(data, data.values().length, judge, verifiedTraits(data.values(), judge));
  }

  private static ScalarJudge judgeOf(double[] terms) {
    if (terms.length == 0) {
      throw new IllegalArgumentException("a sum needs at least one term, but there are none");
    }
    ExactSums sums = ExactSums.of(terms);
    return new ScalarJudge(sums.sum(), sums.absoluteSum());
  }

  private static Set<String> verifiedTraits(double[] terms, ScalarJudge judge) {
    Set<String> verified = new TreeSet<>();
    if (judge.scale().compareTo(Dyadic.powerOfTwo(Trait.OVERFLOW_HEADROOM_EXPONENT)) < 0) {
      verified.add(Trait.NO_INTERMEDIATE_OVERFLOW);
    }
    if (judge.exact().abs().equals(judge.scale())) {
      verified.add(Trait.SAME_SIGN);
    }
    boolean normal = true;
    for (double term : terms) {
      normal &= term == 0 || Math.abs(term) >= Double.MIN_NORMAL;
    }
    if (normal) {
      verified.add(Trait.NO_UNDERFLOW);
    }
    return verified;
  }
}
