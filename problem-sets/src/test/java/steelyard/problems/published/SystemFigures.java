package steelyard.problems.published;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.MathContext;
import java.util.Optional;
import org.apache.commons.math3.fraction.BigFraction;
import steelyard.problems.Judgement;
import steelyard.problems.solve.ExactErrors;
import steelyard.problems.solve.LinearSystem;
import steelyard.problems.solve.PublishedMatrices;
import steelyard.problems.solve.RationalInverse;
import steelyard.problems.solve.SystemProblem;

/** Single systems: solutions, backward errors of published answers, and perturbation bounds. */
final class SystemFigures implements Figure.Source {
  private static final BigFraction TOLERANCE = new BigFraction(1, 10_000_000_000L);
  private static final double ULP = 0x1p-52;

  @Override
  public Optional<Figure> figure(String id) {
    return switch (id) {
      case "lin.rump2x2.x1" -> Optional.of(rump(0));
      case "lin.rump2x2.x2" -> Optional.of(rump(1));
      case "lin.kahan1966.eta", "lin.kahan1966.omega" -> Optional.of(kahan(id));
      case "lin.vand6.bound74" -> Optional.of(perturbation(powers().kappa()));
      case "lin.vand6.bound710" -> Optional.of(perturbation(powers().skeel()));
      default -> Optional.empty();
    };
  }

  private static Figure rump(int entry) {
    double[][] a = PublishedMatrices.named("rump2x2").entries();
    SystemProblem problem = SystemProblem.of(new LinearSystem(a, new double[] {1, 0}));
    assertThat(problem.reference().relativeBound()).isZero();
    return Figure.of(problem.reference().answer(MathContext.UNLIMITED).get(entry));
  }

  // A tiny residual and a wrong answer; matrix and answer are times 10^4, so that all is stored
  // exactly, which changes neither error.
  private static Figure kahan(String id) {
    double[][] a = PublishedMatrices.named("kahan1966").entries();
    LinearSystem system = new LinearSystem(a, new double[] {86420000, 14400000});
    double[] answer = {9911, -4870};
    BigFraction[] x = new RationalInverse(a).solve(system.b());
    ExactErrors exact = new ExactErrors(system, x, answer);
    SystemProblem problem = SystemProblem.of(system);
    Judgement judgement = problem.judge(answer);
    requireNear(judgement.backwardError(), exact.normwise());
    requireNear(judgement.componentwiseBackwardError().orElseThrow(), exact.componentwise());
    assertThat(judgement.forwardError()).isGreaterThan(0.5);
    assertThat(problem.judge(new double[] {20000, -20000}).forwardError()).isZero();
    return Figure.of(id.endsWith("eta") ? exact.normwise() : exact.componentwise());
  }

  private static RationalInverse powers() {
    return new RationalInverse(PublishedMatrices.named("vand6").entries());
  }

  // Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed. (2002), (7.4) and (7.10) for
  // perturbations of the matrix alone, at the solution (1, ..., 1).
  private static Figure perturbation(BigFraction condition) {
    BigFraction change = TOLERANCE.multiply(condition);
    return Figure.of(change.divide(BigFraction.ONE.subtract(change)));
  }

  private static void requireNear(double actual, BigFraction exact) {
    double expected = exact.doubleValue();
    assertThat(actual).isCloseTo(expected, within(ULP * expected));
  }
}
