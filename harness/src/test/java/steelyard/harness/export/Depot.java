package steelyard.harness.export;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import steelyard.problems.Condition;
import steelyard.problems.Data;
import steelyard.problems.Judgement;
import steelyard.problems.Problem;
import steelyard.problems.Reference;

/** An invented problem: two load cells of a weighbridge and the loads that they feel. */
record Depot(List<Data.Part> parts, double kappa) implements Problem<Data> {

  static ExportedProblem exported() {
    return exported("solve/depot/k1e3/n2/r1", twoCells());
  }

  static ExportedProblem exported(String id, Problem<?> problem) {
    return new ExportedProblem(id, "solve", "depot", OptionalDouble.of(1000), 42, problem);
  }

  static Depot twoCells() {
    return new Depot(
        List.of(
            new Data.Matrix("a", new double[][] {{1, -0.1}, {1.0 / 3, Double.MIN_VALUE}}),
            new Data.Vector("b", new double[] {-0.0, 0.1 + 0.2})),
        987.5);
  }

  @Override
  public Data data() {
    return () -> parts;
  }

  @Override
  public int size() {
    return 2;
  }

  @Override
  public Condition condition() {
    return new Condition(kappa, OptionalDouble.of(0.1));
  }

  @Override
  public Reference reference() {
    return new Thirds();
  }

  @Override
  public Set<String> traits() {
    return Set.of("no-underflow", "diagonally-dominant");
  }

  @Override
  public Judgement judge(double[] answer) {
    throw new UnsupportedOperationException("an export judges nothing");
  }

  private record Thirds() implements Reference {
    @Override
    public String route() {
      return "invented";
    }

    @Override
    public double relativeBound() {
      return 1e-60;
    }

    @Override
    public List<BigDecimal> answer(MathContext precision) {
      return List.of(
          BigDecimal.ONE.divide(BigDecimal.valueOf(3), precision),
          BigDecimal.valueOf(-25, 1),
          BigDecimal.ZERO);
    }
  }
}
