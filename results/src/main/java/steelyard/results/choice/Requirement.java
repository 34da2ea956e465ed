package steelyard.results.choice;

import java.util.List;

/**
 * What a user needs.
 *
 * @param maxForwardError the largest forward error that will do
 * @param conditionUpTo problems up to this condition number count
 * @param size problems of this size count
 * @param families problems of these families count; none named for all
 */
public record Requirement(
    String task, double maxForwardError, double conditionUpTo, int size, List<String> families) {

  /**
   * Makes a requirement.
   *
   * @throws RequirementException if the error is negative or the condition number below 1 or either
   *     is no number
   */
  public Requirement {
    families = List.copyOf(families);
    if (!(maxForwardError >= 0)) {
      throw new RequirementException(
          "The largest forward error is not a number from 0; give one such as 1e-12.");
    }
    if (!(conditionUpTo > 0)) {
      throw new RequirementException(
          "The largest condition number is not a positive number; give one such as 1e6.");
    }
  }
}
