package steelyard.problems.solve;

import java.util.OptionalDouble;
import java.util.Set;
import steelyard.problems.Condition;
import steelyard.problems.Judgement;
import steelyard.problems.Problem;
import steelyard.problems.solve.certificate.CertifiedSolution;
import steelyard.problems.solve.certificate.CertifiedSolver;
import steelyard.problems.solve.certificate.Enclosure;

/**
 * A system of linear equations with its certified solution.
 *
 * <p>The condition number is the normwise ||A⁻¹|| (||A|| ||x|| + ||b||)/||x|| and the componentwise
 * || |A⁻¹| (|A||x| + |b|) ||/||x||, in the maximum norm, both of the stored data and known to 1 %;
 * the midpoints of their enclosures are given.
 *
 * @see "N. J. Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., SIAM 2002, Theorems
 *     7.2 and 7.4 for the condition numbers"
 */
public final class SystemProblem implements Problem<LinearSystem> {
  private final LinearSystem system;
  private final CertifiedSolution solution;
  private final AnswerJudge judge;
  private final Set<String> traits;

  SystemProblem(LinearSystem system, CertifiedSolution solution) {
    this.system = system;
    this.solution = solution;
    judge = new AnswerJudge(system, solution);
    traits = SystemTraits.of(system.a());
  }

  /**
   * Certifies the solution of a system.
   *
   * @throws steelyard.problems.UncertifiedException if the matrix is singular or no solution could
   *     be certified
   */
  public static SystemProblem of(LinearSystem system) {
    return new SystemProblem(system, CertifiedSolver.solve(system.a(), system.b()));
  }

  @Override
  public LinearSystem data() {
    return system;
  }

  @Override
  public int size() {
    return system.size();
  }

  @Override
  public Condition condition() {
    return new Condition(
        middle(solution.kappa()), OptionalDouble.of(middle(solution.componentwise())));
  }

  /** Returns the enclosure of the normwise condition number. */
  public Enclosure normwiseCondition() {
    return solution.kappa();
  }

  /** Returns the enclosure of the componentwise condition number. */
  public Enclosure componentwiseCondition() {
    return solution.componentwise();
  }

  @Override
  public SystemReference reference() {
    return new SystemReference(solution);
  }

  @Override
  public Set<String> traits() {
    return traits;
  }

  @Override
  public Judgement judge(double[] answer) {
    return judge.judge(answer);
  }

  private static double middle(Enclosure enclosure) {
    return Double.isInfinite(enclosure.upper()) ? enclosure.upper() : enclosure.midpoint();
  }
}
