package steelyard.results.choice;

import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import steelyard.results.Observation;
import steelyard.results.table.Scientific;
import steelyard.results.text.NearestName;

/**
 * The observations that a requirement speaks of.
 *
 * @param rows at least one
 * @param unplaced how many observations of the task, size and families have no known condition
 *     number and are left out for that
 */
record Selection(List<Observation> rows, int unplaced) {

  /**
   * Selects.
   *
   * @throws RequirementException if the run has no such task, family, size or condition number
   */
  static Selection of(Requirement requirement, List<Observation> observations) {
    checkName("task", requirement.task(), distinct(observations, Observation::task));
    List<Observation> ofTask =
        observations.stream().filter(o -> o.task().equals(requirement.task())).toList();
    Set<String> families = distinct(ofTask, Observation::family);
    requirement.families().forEach(family -> checkName("family", family, families));
    requirement.except().forEach(family -> checkName("family", family, families));
    List<Observation> ofFamilies =
        ofTask.stream().filter(o -> requirement.counts(o.family())).toList();
    List<Observation> ofSize =
        ofFamilies.stream().filter(o -> o.size() == requirement.size()).toList();
    if (ofSize.isEmpty()) {
      throw new RequirementException(
          "The run has no problem of size "
              + requirement.size()
              + " for this; choose one of "
              + sizes(ofFamilies)
              + ".");
    }
    return placed(requirement, ofSize);
  }

  private static Selection placed(Requirement requirement, List<Observation> ofSize) {
    int unplaced = 0;
    double smallest = Double.POSITIVE_INFINITY;
    for (Observation o : ofSize) {
      unplaced += o.condition().isEmpty() ? 1 : 0;
      smallest = Math.min(smallest, o.condition().orElse(Double.POSITIVE_INFINITY));
    }
    List<Observation> rows =
        ofSize.stream()
            .filter(
                o ->
                    o.condition().isPresent()
                        && o.condition().getAsDouble() <= requirement.conditionUpTo())
            .toList();
    if (rows.isEmpty()) {
      throw new RequirementException(
          "The run has no problem with a condition number up to "
              + Scientific.text(requirement.conditionUpTo())
              + " for this; the smallest is "
              + Scientific.text(smallest)
              + ".");
    }
    return new Selection(rows, unplaced);
  }

  private static Set<String> distinct(
      List<Observation> observations, Function<Observation, String> name) {
    return observations.stream().map(name).collect(Collectors.toCollection(LinkedHashSet::new));
  }

  private static String sizes(List<Observation> observations) {
    return observations.stream()
        .map(Observation::size)
        .distinct()
        .sorted()
        .map(size -> Integer.toString(size))
        .collect(Collectors.joining(", "));
  }

  private static void checkName(String what, String typed, Collection<String> known) {
    if (known.contains(typed)) {
      return;
    }
    Optional<String> nearest = NearestName.of(typed, known);
    throw new RequirementException(
        "The run has no "
            + what
            + " \""
            + typed
            + "\""
            + nearest.map(name -> "; perhaps " + name + " is meant").orElse("")
            + "; it has "
            + (known.isEmpty() ? "none" : String.join(", ", known))
            + ".");
  }
}
