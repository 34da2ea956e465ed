package steelyard.junit;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.api.Test;
import org.opentest4j.AssertionFailedError;
import steelyard.algorithms.Bound;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.dot.DotProduct;
import steelyard.algorithms.solve.LinearSolver;
import steelyard.algorithms.sum.Summation;
import steelyard.results.Grade;

/** Each assertion from both sides: it holds where theory says so, and fails where it must. */
class AccuracyTest {

  private static final Bound PLAIN =
      Bound.backward(
          (n, kappa, u) -> Bound.gamma(n - 1, u),
          "gamma_(n-1)",
          "Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., 2002, (4.4)",
          "no-intermediate-overflow");

  private static void assertFails(ThrowingCallable assertion, String... parts) {
    assertThatThrownBy(assertion)
        .isInstanceOf(AssertionFailedError.class)
        .hasMessageContainingAll(parts);
  }

  @Test
  void aPlainSumIsBackwardStableAndNoMore() {
    Accuracy<Summation> total = Accuracy.of(Summation.class, Depot::total).except("overflow");

    total.isAtLeast(Grade.BACKWARD_STABLE);
    total.isAtLeast(Grade.FORWARD_STABLE);
    assertFails(
        () -> total.isAtLeast(Grade.TWO_FOLD), "to be at least 2-fold, but it is backward stable:");
    assertFails(() -> total.isAtLeast(Grade.FAITHFUL), "one of the two doubles around");
  }

  @Test
  void aCompensatedSumIsTwoFold() {
    Accuracy.of(Summation.class, Depot::carefulTotal)
        .on("cancelling", "depot-ledger")
        .upToCondition(1e20)
        .isAtLeast(Grade.TWO_FOLD);
  }

  @Test
  void aSumOfRoundedTermsIsUnstable() {
    assertFails(
        () ->
            Accuracy.of(Summation.class, Depot::roughTotal)
                .on("cancelling", "random-signs")
                .isAtLeast(Grade.FORWARD_STABLE),
        "but it is unstable:");
  }

  @Test
  void productsTakeTheSameLine() {
    Accuracy.of(DotProduct.class, Depot::inner).on("cancelling").isAtLeast(Grade.BACKWARD_STABLE);
    assertFails(
        () ->
            Accuracy.of(DotProduct.class, (x, y) -> Depot.inner(x, x))
                .on("random-signs")
                .isAtLeast(Grade.FORWARD_STABLE),
        "unstable");
  }

  @Test
  void systemsTakeTheSameLine() {
    Accuracy.of(LinearSolver.class, (a, b) -> Depot.calibrate(a, b, true))
        .except("wilkinson-growth")
        .isAtLeast(Grade.BACKWARD_STABLE);
    assertFails(
        () ->
            Accuracy.of(LinearSolver.class, (a, b) -> Depot.calibrate(a, b, false))
                .except("wilkinson-growth")
                .isAtLeast(Grade.BACKWARD_STABLE),
        "unstable",
        "entry ",
        " of 20");
  }

  @Test
  void aBoundHoldsOrIsBroken() {
    Accuracy.of(Summation.class, Depot::total).except("overflow").staysWithin(PLAIN);
    assertFails(
        () -> Accuracy.of(Summation.class, Depot::roughTotal).on("random-signs").staysWithin(PLAIN),
        "a backward error of at most gamma_(n-1) (Higham",
        "allowed        a backward error of at most ");
  }

  @Test
  void aBoundIsHeldWhereItsTraitsAreAndNowhereElse() {
    assertFails(
        () -> Accuracy.of(Summation.class, terms -> 1).on("overflow").staysWithin(PLAIN),
        "no problem tried is no-intermediate-overflow");
    assertFails(
        () ->
            Accuracy.of(Summation.class, Depot::total)
                .on("random-signs")
                .staysWithin(Bound.componentwise((n, kappa, u) -> 1, "1", "")),
        "no problem of the task has that error");
  }

  @Test
  void errorsHaveALargestValue() {
    Accuracy<Summation> total =
        Accuracy.of(Summation.class, Depot::total).on("cancelling").upToCondition(1e6);

    total.hasForwardErrorUpTo(1e-7);
    total.hasBackwardErrorUpTo(1e-12);
    assertFails(
        () -> total.hasForwardErrorUpTo(1e-12),
        "to have a forward error of at most 1e-12, but",
        "a forward error of at most 1.0e-12");
    assertFails(() -> total.hasBackwardErrorUpTo(0), "a backward error of at most 0");
  }

  @Test
  void aBaselineIsMatchedOrNot() {
    Accuracy<Summation> backwards = Accuracy.of(Summation.class, Depot::backwards);

    backwards.isNoLessAccurateThan(Depot::total);
    Accuracy.of(Summation.class, Depot::total).isNoLessAccurateThan(Depot::backwards);
    Accuracy.of(Summation.class, Depot::carefulTotal).isNoLessAccurateThan(Depot::total);
    assertFails(
        () -> backwards.isNoLessAccurateThan(Depot::carefulTotal),
        "to be no less accurate than the baseline, within a factor of 10.0, but",
        "as the baseline has up to");
    assertFails(() -> backwards.isNoLessAccurateThan(Depot::total, 1), "within a factor of 1.0");
  }

  @Test
  void aBaselineExcusesFailuresThatItShares() {
    Accuracy.of(Summation.class, Depot::total)
        .on("overflow", "random-signs")
        .isNoLessAccurateThan(Depot::backwards);
    assertFails(
        () ->
            Accuracy.of(
                    Summation.class,
                    terms -> terms.length == 1000 ? Double.NaN : Depot.total(terms))
                .on("random-signs")
                .isNoLessAccurateThan(Depot::total),
        "it gave no answer to judge on 3 of 9 problems",
        "nan");
    assertFails(
        () ->
            Accuracy.of(Summation.class, Depot::total)
                .on("random-signs")
                .isNoLessAccurateThan(terms -> Double.NaN),
        "the baseline answered none");
  }

  @Test
  void aCandidateMayComputeInSinglePrecision() {
    Summation single =
        terms -> {
          float total = 0;
          for (double term : terms) {
            total += (float) term;
          }
          return total;
        };

    Accuracy.of(
            Summation.class,
            Candidate.of("single", single, "in float", "n", "invented").inPrecision(24))
        .on("random-signs")
        .isAtLeast(Grade.BACKWARD_STABLE);
    assertFails(
        () ->
            Accuracy.of(Summation.class, single)
                .on("random-signs")
                .isAtLeast(Grade.BACKWARD_STABLE),
        "unstable");
  }

  @Test
  void problemsOutsideTheScopeAreSkipped() {
    Accuracy.of(LinearSolver.class, (a, b) -> Depot.calibrate(a, b, false))
        .requiring("positive-definite")
        .isAtLeast(Grade.BACKWARD_STABLE);
  }

  @Test
  void theSameLineTriesTheSameProblems() {
    ThrowingCallable failing =
        () -> Accuracy.of(Summation.class, Depot::roughTotal).isAtLeast(Grade.BACKWARD_STABLE);

    String once = messageOf(failing);
    assertThatThrownBy(failing).hasMessage(once);
    assertThatThrownBy(
            () ->
                Accuracy.of(Summation.class, Depot::roughTotal)
                    .seed(2)
                    .isAtLeast(Grade.BACKWARD_STABLE))
        .hasMessageContaining("seed 2");
  }

  private static String messageOf(ThrowingCallable failing) {
    try {
      failing.call();
    } catch (Throwable thrown) {
      return thrown.getMessage();
    }
    throw new IllegalStateException("it did not fail");
  }

  @Test
  void aSlipInALoopIsFoundOut() {
    assertFails(
        () ->
            Accuracy.of(
                    Summation.class, terms -> Depot.total(Arrays.copyOf(terms, terms.length - 1)))
                .on("same-sign")
                .isAtLeast(Grade.FORWARD_STABLE),
        "but it is unstable");
  }

  @Test
  void aTaskIsFoundByItsInterface() {
    assertThatThrownBy(() -> Accuracy.of(Runnable.class, () -> {}))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("no task has the interface java.lang.Runnable");
  }
}
