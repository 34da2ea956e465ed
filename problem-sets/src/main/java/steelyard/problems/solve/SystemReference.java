package steelyard.problems.solve;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import steelyard.problems.Reference;
import steelyard.problems.solve.certificate.CertifiedSolution;

/**
 * The certified solution of a system.
 *
 * @param solution the solution with everything that was proved of it
 */
public record SystemReference(CertifiedSolution solution) implements Reference {

  @Override
  public String route() {
    return solution.route();
  }

  @Override
  public double relativeBound() {
    return solution.relativeBound();
  }

  @Override
  public List<BigDecimal> answer(MathContext precision) {
    return solution.values().stream().map(value -> value.toBigDecimal(precision)).toList();
  }
}
