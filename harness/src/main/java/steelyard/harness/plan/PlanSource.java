package steelyard.harness.plan;

import java.util.Optional;

/**
 * Where a plan's text came from.
 *
 * @param name the name of the file, or of the built-in plan
 * @param locator the places of its keys
 */
record PlanSource(String name, KeyLocator locator) {

  PlanException fail(Optional<KeyLocator.Place> place, String sentence) {
    String where = place.map(at -> ":" + at.line() + ":" + at.column()).orElse("");
    return new PlanException(name + where + ": " + sentence);
  }
}
