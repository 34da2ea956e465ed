package steelyard.problems.dot;

import java.util.Set;
import java.util.TreeSet;
import steelyard.problems.ExactScalarProblem;
import steelyard.problems.ScalarJudge;
import steelyard.problems.Trait;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ErrorFree;
import steelyard.problems.exact.ExactSums;

/**
 * A dot product s of two stored vectors. The reference is exact; the condition number is 2
 * |x|&#7488;|y| / |s| and the backward error |&#349; - s| / (2 |x|&#7488;|y|). The factor 2 is
 * there because both vectors may be changed; so the condition number is never below 2. How they are
 * rounded is said at {@link ScalarJudge}.
 *
 * @see <a href="https://doi.org/10.1137/030601818">Ogita, Rump and Oishi, Accurate sum and dot
 *     product, SIAM Journal on Scientific Computing 26 (2005)</a>
 */
public final class DotProblem extends ExactScalarProblem<Vectors> {

  /**
   * Makes the problem of multiplying these vectors.
   *
   * @throws IllegalArgumentException if they are empty or differ in length, or an entry is infinite
   *     or NaN
   */
  public DotProblem(Vectors data) {
    this(data, judgeOf(data.x(), data.y()));
  }

  private DotProblem(Vectors data, ScalarJudge judge) {
    super(data, data.x().length, judge, verifiedTraits(data, judge));
  }

  private static ScalarJudge judgeOf(double[] x, double[] y) {
    if (x.length == 0) {
      throw new IllegalArgumentException("a dot product needs at least one pair of entries");
    }
    ExactSums sums = ExactSums.ofProducts(x, y);
    return new ScalarJudge(sums.sum(), sums.absoluteSum().scalb(1));
  }

  private static Set<String> verifiedTraits(Vectors data, ScalarJudge judge) {
    Set<String> verified = new TreeSet<>();
    double[] x = data.x();
    double[] y = data.y();
    double largest = 0;
    boolean safe = true;
    for (int i = 0; i < x.length; i++) {
      largest = Math.max(largest, Math.max(Math.abs(x[i]), Math.abs(y[i])));
      safe &= x[i] == 0 || y[i] == 0 || Math.abs(x[i] * y[i]) >= ErrorFree.LEAST_SAFE_PRODUCT;
    }
    Dyadic headroom = Dyadic.powerOfTwo(Trait.OVERFLOW_HEADROOM_EXPONENT);
    if (judge.scale().compareTo(headroom) < 0 && Dyadic.of(largest).compareTo(headroom) < 0) {
      verified.add(Trait.NO_INTERMEDIATE_OVERFLOW);
    }
    if (judge.exact().abs().scalb(1).equals(judge.scale())) {
      verified.add(Trait.SAME_SIGN);
    }
    if (safe) {
      verified.add(Trait.NO_UNDERFLOW);
    }
    return verified;
  }
}
