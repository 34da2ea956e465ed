package steelyard.problems;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import steelyard.problems.exact.Dyadic;

/**
 * The answer of a scalar task that is known exactly.
 *
 * @param value the answer
 */
public record ExactReference(Dyadic value) implements Reference {

  @Override
  public String route() {
    return "exact";
  }

  @Override
  public double relativeBound() {
    return 0;
  }

  @Override
  public List<BigDecimal> answer(MathContext precision) {
    return List.of(value.toBigDecimal(precision));
  }
}
