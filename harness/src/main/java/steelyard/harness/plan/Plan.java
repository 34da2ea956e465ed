package steelyard.harness.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import steelyard.results.text.NearestName;

/**
 * What is to be weighed, with nothing left to a default.
 *
 * @param name what it is called
 * @param seed from which all randomness comes
 * @param additions the candidates that it brings along
 * @param timing how long candidates are timed; empty: no timing
 * @param weighings what is weighed
 * @param requirements what a candidate must meet
 */
public record Plan(
    String name,
    long seed,
    List<Addition> additions,
    Optional<TimingEffort> timing,
    List<Weighing> weighings,
    List<Requirement> requirements) {

  /** Copies the lists. */
  public Plan {
    additions = List.copyOf(additions);
    weighings = List.copyOf(weighings);
    requirements = List.copyOf(requirements);
  }

  /**
   * Returns the problems that it asks for, each once, by task, family, condition, size and repeat:
   * tasks and families in the order in which the plan first names them, the rest ascending.
   */
  public List<ProblemCell> problems() {
    return new PlanCells(weighings).problems();
  }

  /** Returns the timings that it asks for, each once, by task, family and size. */
  public List<TimingCell> timings() {
    return timing.map(new PlanCells(weighings)::timings).orElse(List.of());
  }

  /** Returns the files that stand beside families of a task, each once. */
  public List<OwnFiles> files(String task) {
    return weighings.stream()
        .filter(weighing -> weighing.task().equals(task))
        .flatMap(weighing -> weighing.families().stream())
        .flatMap(share -> share.files().stream())
        .distinct()
        .toList();
  }

  /** Returns this plan with another seed. */
  public Plan withSeed(long other) {
    return new Plan(name, other, additions, timing, weighings, requirements);
  }

  /** Returns this plan without timing. */
  public Plan withoutTiming() {
    return new Plan(name, seed, additions, Optional.empty(), weighings, requirements);
  }

  /** Returns this plan with more candidates, which take part wherever their task is weighed. */
  public Plan with(List<Addition> more) {
    List<Addition> all = new ArrayList<>(additions);
    all.addAll(more);
    return new Plan(
        name,
        seed,
        all,
        timing,
        weighings.stream().map(weighing -> weighing.with(more)).toList(),
        requirements);
  }

  /**
   * Returns what this plan has to say of one task.
   *
   * @throws PlanException if it has nothing
   */
  public Plan only(String task) {
    List<String> tasks = weighings.stream().map(Weighing::task).distinct().toList();
    if (!tasks.contains(task)) {
      throw new PlanException(
          "plan '%s' does not weigh a task '%s'; %s"
              .formatted(name, task, NearestName.hint(task, tasks)));
    }
    return new Plan(
        name,
        seed,
        additions.stream().filter(a -> a.task().equals(task)).toList(),
        timing,
        weighings.stream().filter(w -> w.task().equals(task)).toList(),
        requirements.stream().filter(r -> r.task().equals(task)).toList());
  }

  /** Returns the TOML of this plan, which reads back as an equal plan. */
  public String toToml() {
    return new PlanWriter(this).toml();
  }
}
