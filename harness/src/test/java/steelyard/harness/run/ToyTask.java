package steelyard.harness.run;

import java.math.BigDecimal;
import java.math.MathContext;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import org.apache.commons.rng.UniformRandomProvider;
import org.openjdk.jmh.infra.Blackhole;
import steelyard.algorithms.Candidate;
import steelyard.harness.task.PartShape;
import steelyard.harness.task.Task;
import steelyard.problems.Condition;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Judgement;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.problems.Reach;
import steelyard.problems.Reference;

/** A task for tests: the answer is the input itself, and a kernel is any function of an array. */
record ToyTask(List<Candidate<UnaryOperator<double[]>>> candidates)
    implements Task<UnaryOperator<double[]>, ToyTask.Input> {

  record Input(double[] values) implements Data {
    @Override
    public List<Part> parts() {
      return List.of(new Vector("values", values));
    }
  }

  static Candidate<UnaryOperator<double[]>> candidate(String id, UnaryOperator<double[]> kernel) {
    return Candidate.of(id, kernel, "for a test", "none", "own construction");
  }

  @Override
  public String id() {
    return "toy";
  }

  @Override
  public String description() {
    return "the input itself";
  }

  @Override
  public Class<?> kernelType() {
    return UnaryOperator.class;
  }

  @Override
  public UnaryOperator<double[]> kernel(Function<List<Data.Part>, double[]> answers) {
    return values -> answers.apply(new Input(values).parts());
  }

  @Override
  public List<Family<Input>> families() {
    return List.of(new ToyFamily());
  }

  @Override
  public List<PartShape> shapes() {
    return List.of(new PartShape("values", false, Integer.MAX_VALUE));
  }

  @Override
  public Problem<Input> problem(Input data) {
    return new ToyProblem(data);
  }

  @Override
  public Input data(List<Data.Part> parts) {
    return new Input(((Data.Vector) parts.get(0)).values());
  }

  @Override
  public double[] apply(UnaryOperator<double[]> kernel, Input data) {
    return kernel.apply(data.values());
  }

  @Override
  public void time(UnaryOperator<double[]> kernel, Input data, Blackhole sink) {
    sink.consume(kernel.apply(data.values()));
  }

  List<Assignment<?, ?>> assignments(int problems, Duration timeout) {
    List<Assignment<?, ?>> assignments = new ArrayList<>();
    for (int repeat = 0; repeat < problems; repeat++) {
      ProblemId id = new ProblemId("toy", "plain", OptionalDouble.empty(), 3, repeat, 1);
      assignments.add(new Assignment<>(this, new ToyFamily(), id, candidates, timeout));
    }
    return assignments;
  }

  private static final class ToyFamily implements Family<Input> {
    @Override
    public Profile profile() {
      return new Profile("plain", "for a test", "none", "own construction");
    }

    @Override
    public Reach reach() {
      return Reach.uncontrolled(1, 1000);
    }

    @Override
    public Problem<Input> generate(Request request, UniformRandomProvider random) {
      double[] values = new double[request.size()];
      for (int i = 0; i < values.length; i++) {
        values[i] = 1 + random.nextDouble();
      }
      return new ToyProblem(new Input(values));
    }
  }

  private record ToyProblem(Input data) implements Problem<Input> {
    @Override
    public int size() {
      return data.values().length;
    }

    @Override
    public Condition condition() {
      return Condition.of(1);
    }

    @Override
    public Set<String> traits() {
      return Set.of();
    }

    @Override
    public Reference reference() {
      return new Reference() {
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
          return List.of();
        }
      };
    }

    @Override
    public Judgement judge(double[] answer) {
      if (answer == null || answer.length != size()) {
        return Judgement.without(Judgement.Standing.MALFORMED);
      }
      double worst = 0;
      for (int i = 0; i < answer.length; i++) {
        if (Double.isNaN(answer[i])) {
          return Judgement.without(Judgement.Standing.NAN);
        }
        worst = Math.max(worst, Math.abs(answer[i] - data.values()[i]) / data.values()[i]);
      }
      return Judgement.ofScalar(worst, worst, Judgement.Rounding.OTHER);
    }
  }
}
