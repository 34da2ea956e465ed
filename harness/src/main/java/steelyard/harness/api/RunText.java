package steelyard.harness.api;

import java.util.List;
import steelyard.harness.execution.PlanFindings;
import steelyard.harness.plan.Plan;
import steelyard.results.attainment.Attainment;
import steelyard.results.attainment.AttainmentText;
import steelyard.results.choice.Choice;
import steelyard.results.choice.ChoiceText;
import steelyard.results.choice.Chooser;
import steelyard.results.choice.Requirement;
import steelyard.results.run.Run;
import steelyard.results.text.SummaryText;

/** A run in words, as the command line prints it. */
public final class RunText {

  private RunText() {}

  /** Returns the tables of the command {@code run}, one for each task. */
  public static String summary(Run run) {
    return SummaryText.render(run.verdicts(), run.timings(), run.tradeoffs(), false);
  }

  /** Returns the decision of the command {@code choose}, with its reasons. */
  public static String decision(Run run, Requirement requirement) {
    Choice choice = Steelyard.choose(run, requirement);
    return ChoiceText.render(choice, Chooser.spared(choice, run.observations(), run.timings()));
  }

  /** Returns who gets how far on one problem, as the command {@code weigh} does. */
  public static String attainment(Run run) {
    return AttainmentText.render(Attainment.of(run.observations(), run.timings()));
  }

  /**
   * Returns what asks for attention, a line each: claimed bounds that were broken, and requirements
   * of the plan that no candidate meets.
   */
  public static List<String> findings(Plan plan, Run run) {
    return PlanFindings.of(plan, run).lines();
  }
}
