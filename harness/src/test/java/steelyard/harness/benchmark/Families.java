package steelyard.harness.benchmark;

import java.util.List;
import steelyard.problems.Data;
import steelyard.problems.Family;

/** The families of a catalogue by their ids. */
final class Families {
  private Families() {}

  static <D extends Data> Family<D> named(String id, List<Family<D>> catalogue) {
    return catalogue.stream()
        .filter(family -> family.profile().id().equals(id))
        .findFirst()
        .orElseThrow();
  }
}
