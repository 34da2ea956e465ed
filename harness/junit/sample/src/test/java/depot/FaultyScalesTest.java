package depot;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import steelyard.algorithms.sum.Summation;
import steelyard.junit.Accuracy;
import steelyard.results.Grade;

/** Fails on purpose, to show how. */
@Tag("faulty")
class FaultyScalesTest {

  @Test
  void theDisplayIsATotal() {
    Accuracy.of(Summation.class, Scales::displayed)
        .on("depot-ledger")
        .isAtLeast(Grade.BACKWARD_STABLE);
  }
}
