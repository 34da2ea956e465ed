package steelyard.harness.execution;

import java.util.ArrayList;
import java.util.List;
import steelyard.harness.plan.Plan;
import steelyard.harness.plan.Requirement;
import steelyard.results.Observation;
import steelyard.results.choice.Choice;
import steelyard.results.choice.Chooser;
import steelyard.results.run.Run;
import steelyard.results.verdict.BrokenBound;

/**
 * What in a run asks for somebody's attention, a line each: claimed bounds that were broken, and
 * requirements of the plan that no candidate meets.
 *
 * @param lines the lines
 */
public record PlanFindings(List<String> lines) {

  /** Copies the list. */
  public PlanFindings {
    lines = List.copyOf(lines);
  }

  /** Returns what is to be said of a run. */
  public static PlanFindings of(Plan plan, Run run) {
    List<String> lines = new ArrayList<>(brokenBounds(run.observations()));
    for (Requirement requirement : plan.requirements()) {
      Choice choice = choice(requirement, run);
      if (choice.qualified().isEmpty()) {
        lines.add(
            "finding: no candidate of "
                + requirement.task()
                + " meets the plan's requirement at size "
                + requirement.size());
      }
    }
    return new PlanFindings(lines);
  }

  /** Returns a line for each claimed bound that an observation breaks. */
  public static List<String> brokenBounds(List<Observation> observations) {
    return BrokenBound.in(observations).stream()
        .map(
            broken ->
                "finding: bound broken by "
                    + broken.candidate()
                    + " on "
                    + broken.problem()
                    + ": "
                    + broken.limits()
                    + " is above the claimed bound")
        .toList();
  }

  private static Choice choice(Requirement requirement, Run run) {
    return Chooser.choose(
        new steelyard.results.choice.Requirement(
            requirement.task(),
            requirement.error(),
            requirement.conditionUpTo(),
            requirement.size(),
            List.of(),
            List.of()),
        run.observations(),
        run.timings());
  }
}
