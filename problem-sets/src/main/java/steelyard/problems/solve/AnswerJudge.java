package steelyard.problems.solve;

import java.util.OptionalDouble;
import steelyard.problems.Judgement;
import steelyard.problems.Judgement.Rounding;
import steelyard.problems.Judgement.Standing;
import steelyard.problems.exact.Binary64;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.exact.ExactSums;
import steelyard.problems.solve.certificate.CertifiedSolution;

/**
 * Judges answers to one system. The residual and every denominator are computed exactly, and each
 * error is one quotient, rounded once.
 *
 * @see "J. L. Rigal and J. Gaches, On the compatibility of a given solution with the data of a
 *     linear system, J. ACM 14 (1967), 543-548, for the normwise backward error"
 * @see "W. Oettli and W. Prager, Compatibility of approximate solution of linear equations with
 *     given error bounds for coefficients and right-hand sides, Numer. Math. 6 (1964), 405-409, for
 *     the componentwise one"
 */
final class AnswerJudge {
  private static final double NEGLIGIBLE = Binary64.UNIT_ROUNDOFF / 1000;

  private final LinearSystem system;
  private final CertifiedSolution solution;
  private final Dyadic solutionNorm;
  private final Dyadic matrixNorm;
  private final Dyadic rightHandSideNorm;

  AnswerJudge(LinearSystem system, CertifiedSolution solution) {
    this.system = system;
    this.solution = solution;
    solutionNorm = solution.norm();
    Dyadic largest = Dyadic.ZERO;
    for (double[] row : system.a()) {
      largest = max(largest, ExactSums.of(row).absoluteSum());
    }
    matrixNorm = largest;
    rightHandSideNorm = norm(system.b());
  }

  Judgement judge(double[] answer) {
    Standing malformed = standing(answer);
    if (malformed != Standing.OK) {
      return Judgement.without(malformed);
    }
    double forward = forwardError(answer);
    if (solution.relativeBound() > Math.max(forward / 100, NEGLIGIBLE)) {
      return Judgement.without(Standing.UNCERTIFIED);
    }
    Dyadic residualNorm = Dyadic.ZERO;
    double componentwise = 0;
    for (int i = 0; i < answer.length; i++) {
      Dyadic residual = residual(i, answer);
      residualNorm = max(residualNorm, residual);
      if (residual.signum() != 0) {
        componentwise = Math.max(componentwise, ratio(residual, scale(i, answer)));
      }
    }
    Dyadic size = matrixNorm.multiply(norm(answer)).add(rightHandSideNorm);
    return new Judgement(
        Standing.OK,
        ratio(residualNorm, size),
        forward,
        OptionalDouble.of(componentwise),
        componentwiseForwardError(answer),
        rounding(answer));
  }

  private Standing standing(double[] answer) {
    if (answer == null || answer.length != system.size()) {
      return Standing.MALFORMED;
    }
    Standing standing = Standing.OK;
    for (double entry : answer) {
      if (Double.isNaN(entry)) {
        return Standing.NAN;
      }
      standing = Double.isInfinite(entry) ? Standing.INFINITE : standing;
    }
    return standing;
  }

  // |b - A y|, row i.
  private Dyadic residual(int i, double[] y) {
    ExactAccumulator sum = new ExactAccumulator();
    sum.add(system.b()[i]);
    for (int j = 0; j < y.length; j++) {
      sum.addProduct(-system.a()[i][j], y[j]);
    }
    return sum.value().abs();
  }

  // |A||y| + |b|, row i.
  private Dyadic scale(int i, double[] y) {
    ExactAccumulator sum = new ExactAccumulator();
    sum.addAbs(system.b()[i]);
    for (int j = 0; j < y.length; j++) {
      sum.addAbsProduct(system.a()[i][j], y[j]);
    }
    return sum.value();
  }

  private double forwardError(double[] answer) {
    Dyadic error = Dyadic.ZERO;
    for (int i = 0; i < answer.length; i++) {
      error = max(error, error(i, answer));
    }
    return ratio(error, solutionNorm);
  }

  // Empty where the reference does not tell the relative error of some entry.
  private OptionalDouble componentwiseForwardError(double[] answer) {
    double largest = 0;
    double uncertainty = 0;
    for (int i = 0; i < answer.length; i++) {
      OptionalDouble bound = solution.relativeBound(i);
      if (bound.isEmpty()) {
        return OptionalDouble.empty();
      }
      uncertainty = Math.max(uncertainty, bound.getAsDouble());
      largest = Math.max(largest, ratio(error(i, answer), solution.values().get(i).abs()));
    }
    return uncertainty > Math.max(largest / 100, NEGLIGIBLE)
        ? OptionalDouble.empty()
        : OptionalDouble.of(largest);
  }

  private Dyadic error(int i, double[] answer) {
    return Dyadic.of(answer[i]).subtract(solution.values().get(i)).abs();
  }

  // The numbers of which a double is nearest, or faithful, form an interval: both ends suffice.
  private Rounding rounding(double[] answer) {
    Rounding worst = Rounding.NEAREST;
    for (int i = 0; i < answer.length; i++) {
      Dyadic value = solution.values().get(i);
      Dyadic low = value.subtract(solution.radii().get(i));
      Dyadic high = value.add(solution.radii().get(i));
      if (!low.isNearest(answer[i]) || !high.isNearest(answer[i])) {
        worst = Rounding.FAITHFUL;
      }
      if (!low.isFaithful(answer[i]) || !high.isFaithful(answer[i])) {
        return Rounding.OTHER;
      }
    }
    return worst;
  }

  // 0/0 is 0, nonzero/0 is infinite.
  private static double ratio(Dyadic numerator, Dyadic denominator) {
    if (numerator.signum() == 0) {
      return 0;
    }
    return denominator.signum() == 0
        ? Double.POSITIVE_INFINITY
        : Dyadic.quotient(numerator, denominator);
  }

  private static Dyadic norm(double[] x) {
    double largest = 0;
    for (double entry : x) {
      largest = Math.max(largest, Math.abs(entry));
    }
    return Dyadic.of(largest);
  }

  private static Dyadic max(Dyadic x, Dyadic y) {
    return x.compareTo(y) >= 0 ? x : y;
  }
}
