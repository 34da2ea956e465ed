package steelyard.results.verdict;

import java.util.List;
import java.util.OptionalDouble;
import steelyard.results.Observation;
import steelyard.results.Observation.Claim;

/**
 * A claimed bound that an observation breaks: a finding of its own, whatever the verdict.
 *
 * @param limits the error that the bound limits, by the name of its column
 * @param observed that error; empty where the column is not one of the four errors
 * @param bound the value of the bound
 */
public record BrokenBound(
    String task,
    String candidate,
    String problem,
    String limits,
    OptionalDouble observed,
    double bound) {

  /** Returns the broken bounds among some observations, in their order. */
  public static List<BrokenBound> in(List<Observation> observations) {
    return observations.stream()
        .filter(o -> o.claim().isPresent() && !o.claim().get().held())
        .map(o -> of(o, o.claim().get()))
        .toList();
  }

  private static BrokenBound of(Observation o, Claim claim) {
    return new BrokenBound(
        o.task(),
        o.candidate(),
        o.problem(),
        claim.limits(),
        observed(o, claim.limits()),
        claim.bound());
  }

  private static OptionalDouble observed(Observation o, String limits) {
    return switch (limits) {
      case "forward_error" -> o.forwardError();
      case "backward_error" -> o.backwardError();
      case "componentwise_forward_error" -> o.componentwiseForwardError();
      case "componentwise_backward_error" -> o.componentwiseBackwardError();
      default -> OptionalDouble.empty();
    };
  }
}
