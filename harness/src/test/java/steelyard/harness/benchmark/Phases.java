package steelyard.harness.benchmark;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.sum.Summation;
import steelyard.algorithms.sum.Summations;
import steelyard.harness.run.AccuracyPhase;
import steelyard.harness.run.Assignment;
import steelyard.harness.run.Interruption;
import steelyard.harness.run.Progress;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.problems.sum.SumFamilies;
import steelyard.problems.sum.SumProblem;
import steelyard.problems.sum.Terms;

/** The accuracy phase on 2,000 cancelling sums of 1000 terms, all candidates. */
final class Phases {
  private static final int PROBLEMS = 2000;
  private static final int SIZE = 1000;
  private static final double CONDITION = 1e12;

  private Phases() {}

  // The catalogue knows its tasks by id alone; that of sums is one of sums.
  @SuppressWarnings("unchecked")
  private static List<Assignment<?, ?>> assignments() {
    Task<Summation, Terms> task = (Task<Summation, Terms>) Tasks.find("sum").orElseThrow();
    Family<Terms> family = Families.named("cancelling", SumFamilies.all());
    List<Assignment<?, ?>> assignments = new ArrayList<>();
    for (int repeat = 1; repeat <= PROBLEMS; repeat++) {
      ProblemId id =
          new ProblemId("sum", "cancelling", OptionalDouble.of(CONDITION), SIZE, repeat, 1);
      assignments.add(new Assignment<>(task, family, id, Summations.all(), Duration.ofSeconds(10)));
    }
    return assignments;
  }

  /** All of it; the argument is the number of threads. */
  static Supplier<?> whole(String[] words) {
    int threads = Integer.parseInt(words[1]);
    List<Assignment<?, ?>> assignments = assignments();
    return () -> new AccuracyPhase(threads, Progress.SILENT, new Interruption()).run(assignments);
  }

  /** The calls of the candidates, as often as the phase makes them, and the references. */
  static Supplier<?> parts(String[] words) {
    List<Terms> inputs = new ArrayList<>();
    for (Assignment<?, ?> assignment : assignments()) {
      inputs.add((Terms) assignment.problem().data());
    }
    return () -> {
      double sink = 0;
      for (Terms input : inputs) {
        Problem<Terms> problem = new SumProblem(input);
        sink += problem.condition().kappa();
        for (Candidate<Summation> candidate : Summations.all()) {
          if (candidate.scope().covers(problem.traits(), SIZE)) {
            sink += candidate.kernel().sum(input.values());
            sink += candidate.dependsOnCores() ? 0 : candidate.kernel().sum(input.values());
          }
        }
      }
      return sink;
    };
  }
}
