package steelyard.junit;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.UnaryOperator;
import steelyard.algorithms.Bound;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.Scope;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Data;

/**
 * A candidate, and the problems that it is to be tried on.
 *
 * @param task the task
 * @param candidate the candidate
 * @param scenario which problems
 * @param <K> the task's interface
 * @param <D> the kind of input
 */
record Trial<K, D extends Data>(Task<K, D> task, Candidate<K> candidate, Scenario<D> scenario) {

  private static final String BASELINE = "baseline";

  /** Returns the trial of a candidate on the usual problems of the task with its interface. */
  static <K> Trial<K, ?> usual(Class<K> kernelType, Candidate<K> candidate) {
    for (Task<?, ?> task : Tasks.all()) {
      if (task.kernelType() == kernelType) {
        return usual(task, candidate);
      }
    }
    throw new IllegalArgumentException("no task has the interface " + kernelType.getName());
  }

  // The task's interface is the candidate's, as was compared.
  @SuppressWarnings("unchecked")
  private static <K, D extends Data> Trial<K, D> usual(Task<?, D> task, Candidate<K> candidate) {
    return new Trial<>((Task<K, D>) task, candidate, Scenario.usual(task));
  }

  Trial<K, D> on(List<String> families) {
    return with(scenario.on(task, families));
  }

  Trial<K, D> except(List<String> families) {
    return with(scenario.except(task, families));
  }

  Trial<K, D> with(UnaryOperator<Scenario<D>> change) {
    return with(change.apply(scenario));
  }

  Trial<K, D> requiring(List<String> traits) {
    Set<String> all = new HashSet<>(candidate.scope().traits());
    all.addAll(traits);
    Scope scope = new Scope(all, candidate.scope().maxSize());
    return new Trial<>(task, candidate.within(scope), scenario);
  }

  Trial<K, D> claiming(Bound bound) {
    return new Trial<>(task, candidate.claiming(bound), scenario);
  }

  void check(Check check) {
    check(check, List.of(candidate));
  }

  void compare(K baseline, double factor) {
    String id = candidate.id().equals(BASELINE) ? BASELINE + "-2" : BASELINE;
    Candidate<K> other =
        Candidate.of(id, baseline, "what the kernel is compared to", "not stated", "this test")
            .within(candidate.scope());
    check(new BaselineCheck(id, factor), List.of(candidate, other));
  }

  private void check(Check check, List<Candidate<K>> candidates) {
    Outcome outcome = new Experiment<>(task, candidates, scenario).run();
    Optional<Check.Finding> finding =
        outcome.triedByFamily().isEmpty()
            ? Optional.of(Check.Finding.ofNothing("nothing was tried"))
            : check.finding(outcome);
    if (finding.isPresent()) {
      throw new FailureText<>(task, candidate, scenario, outcome)
          .error(check.claim(), finding.get());
    }
  }

  private Trial<K, D> with(Scenario<D> other) {
    return new Trial<>(task, candidate, other);
  }
}
