package steelyard.harness.input;

import java.util.Optional;

/** Reads numbers one after the other and counts those that a double does not hold exactly. */
final class InexactTally {

  private long values;
  private long count;
  private long belowNormal;
  private Optional<String> first = Optional.empty();

  double read(String text, Place place) {
    double value = NumberText.parse(text, place);
    values++;
    if (!Exactness.isExact(text, value)) {
      count++;
      if (Math.abs(value) < Double.MIN_NORMAL) {
        belowNormal++;
      }
      if (first.isEmpty()) {
        first = Optional.of(NumberText.quoted(text) + " at " + place);
      }
    }
    return value;
  }

  Inexact inexact() {
    return new Inexact(values, count, belowNormal, first);
  }
}
