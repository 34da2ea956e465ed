package depot;

import org.junit.jupiter.api.Test;
import steelyard.algorithms.solve.LinearSolver;
import steelyard.algorithms.sum.Summation;
import steelyard.junit.Accuracy;
import steelyard.results.Grade;

class ScalesTest {

  @Test
  void totalsAreAsIfComputedInTwiceThePrecision() {
    Accuracy.of(Summation.class, Scales::total)
        .on("cancelling", "depot-ledger")
        .upToCondition(1e20)
        .isAtLeast(Grade.TWO_FOLD);
  }

  @Test
  void totalsAreNoLessAccurateThanBefore() {
    Accuracy.of(Summation.class, Scales::total).isNoLessAccurateThan(Scales::plainTotal);
  }

  @Test
  void loadsAreBackwardStable() {
    Accuracy.of(LinearSolver.class, Scales::loads)
        .except("wilkinson-growth")
        .upToCondition(1e10)
        .isAtLeast(Grade.BACKWARD_STABLE);
  }
}
