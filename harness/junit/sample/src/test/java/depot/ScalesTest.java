package depot;

import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.opentest4j.AssertionFailedError;
import steelyard.algorithms.solve.LinearSolver;
import steelyard.algorithms.sum.Summation;
import steelyard.junit.Accuracy;
import steelyard.results.Grade;

class ScalesTest {

  @Test
  void totalsAreAsIfComputedInTwiceThePrecision() {
    Accuracy.of(Summation.class, Scales::total).on("cancelling", "depot-ledger").upToCondition(1e20).isAtLeast(Grade.TWO_FOLD);
  }

  @Test
  void loadsAreBackwardStable() {
    Accuracy.of(LinearSolver.class, Scales::loads).on("depot-load-cell", "spectrum-geometric").isAtLeast(Grade.BACKWARD_STABLE);
  }

  @Test
  void theDisplayIsNoTotal() {
    AssertionFailedError failure =
        assertThrows(
            AssertionFailedError.class,
            () -> Accuracy.of(Summation.class, Scales::displayed).on("depot-ledger").isAtLeast(Grade.BACKWARD_STABLE));
    assertTrue(failure.getMessage().contains("but it is unstable"), failure::getMessage);
    assertTrue(failure.getMessage().contains("./steelyard problems sum/depot-ledger/"), failure::getMessage);
  }
}
