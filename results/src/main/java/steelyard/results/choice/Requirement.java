package steelyard.results.choice;

import java.util.ArrayList;
import java.util.List;

/**
 * What a user needs.
 *
 * @param maxForwardError the largest forward error that will do
 * @param conditionUpTo problems up to this condition number count
 * @param size problems of this size count
 * @param families problems of these families count; none named for all
 * @param except problems of these families do not count
 */
public record Requirement(
    String task,
    double maxForwardError,
    double conditionUpTo,
    int size,
    List<String> families,
    List<String> except) {

  /**
   * Makes a requirement.
   *
   * @throws RequirementException if the error is negative or the condition number below 1 or either
   *     is no number
   */
  public Requirement {
    families = List.copyOf(families);
    except = List.copyOf(except);
    if (!(maxForwardError >= 0)) {
      throw new RequirementException(
          "The largest forward error is not a number from 0; give one such as 1e-12.");
    }
    if (!(conditionUpTo > 0)) {
      throw new RequirementException(
          "The largest condition number is not a positive number; give one such as 1e6.");
    }
  }

  /** Returns this requirement without some more families. */
  public Requirement without(List<String> more) {
    List<String> all = new ArrayList<>(except);
    all.addAll(more);
    return new Requirement(task, maxForwardError, conditionUpTo, size, families, all);
  }

  /** Says whether problems of a family count. */
  boolean counts(String family) {
    return (families.isEmpty() || families.contains(family)) && !except.contains(family);
  }
}
