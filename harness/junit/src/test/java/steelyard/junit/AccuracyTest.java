package steelyard.junit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.time.Duration;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.opentest4j.AssertionFailedError;
import steelyard.algorithms.Bound;
import steelyard.algorithms.dot.DotProduct;
import steelyard.algorithms.solve.LinearSolver;
import steelyard.algorithms.sum.Summation;
import steelyard.results.Grade;

class AccuracyTest {

  @Test
  void plainSummationIsBackwardStableAndNoMore() {
    Accuracy<Summation> plain =
        Accuracy.of(Summation.class, AccuracyTest::plain).on("cancelling", "random-signs");
    assertThatCode(() -> plain.isAtLeast(Grade.BACKWARD_STABLE)).doesNotThrowAnyException();
    AssertionFailedError failure =
        catchThrowableOfType(
            AssertionFailedError.class, () -> plain.isAtLeast(Grade.CORRECTLY_ROUNDED));
    assertThat(failure.getMessage())
        .startsWith(
            "Expected the sum kernel under test to be at least correctly rounded, but it is"
                + " backward stable.\n  problem       sum/cancelling/k1")
        .contains(", condition number ", "\n  expected      ", "\n  got           ", " = 0x")
        .contains("\n  errors        forward ", ", backward ")
        .contains("./steelyard problems sum/cancelling/k1")
        .endsWith(": cancelling, random-signs, seed 1");
  }

  @Test
  void aSlipInALoopIsFoundOut() {
    AssertionFailedError failure =
        catchThrowableOfType(
            AssertionFailedError.class,
            () ->
                Accuracy.of(Summation.class, terms -> plain(Arrays.copyOf(terms, terms.length - 1)))
                    .on("same-sign")
                    .isAtLeast(Grade.FORWARD_STABLE));
    assertThat(failure.getMessage()).contains("but it is unstable").endsWith(": same-sign, seed 1");
  }

  // Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., 2002, section 4.2: the
  // backward error of recursive summation is at most (n - 1) u to first order.
  @Test
  void aBoundHoldsOrIsRefuted() {
    Bound proved =
        Bound.backward((n, kappa, u) -> Bound.gamma(n - 1.0, u), "gamma(n-1)", "Higham 2002");
    Bound wishful = Bound.forward((n, kappa, u) -> u, "u", "nobody");
    Accuracy<Summation> plain =
        Accuracy.of(Summation.class, AccuracyTest::plain).on("cancelling").sizes(50);
    assertThatCode(() -> plain.staysWithin(proved)).doesNotThrowAnyException();
    assertThatThrownBy(() -> plain.staysWithin(wishful))
        .isInstanceOf(AssertionFailedError.class)
        .hasMessageContaining("to stay within u, but it does not")
        .hasMessageContaining("\n  bound         1.11e-16 on forward_error");
  }

  @Test
  void limitsOfErrorsAreHeld() {
    Accuracy<DotProduct> dot =
        Accuracy.of(DotProduct.class, AccuracyTest::dot).on("cancelling").sizes(20);
    assertThatCode(() -> dot.hasBackwardErrorUpTo(1e-14)).doesNotThrowAnyException();
    assertThatThrownBy(() -> dot.hasForwardErrorUpTo(1e-14))
        .hasMessageContaining("to have forward errors up to 1.0E-14, but it does not");
    assertThatCode(() -> dot.upToCondition(2).hasForwardErrorUpTo(1e-14))
        .doesNotThrowAnyException();
  }

  @Test
  void aKernelIsComparedWithItsBaseline() {
    Accuracy<Summation> kahan =
        Accuracy.of(Summation.class, AccuracyTest::compensated).on("random-signs", "same-sign");
    Accuracy<Summation> plain =
        Accuracy.of(Summation.class, AccuracyTest::plain).on("random-signs", "same-sign");
    assertThatCode(() -> kahan.isNoLessAccurateThan(AccuracyTest::plain))
        .doesNotThrowAnyException();
    assertThatThrownBy(() -> plain.isNoLessAccurateThan(AccuracyTest::compensated))
        .hasMessageContaining("to be no less accurate than its baseline, whose worst error on");
  }

  @Test
  void aSystemIsJudgedByItsWorstEntry() {
    LinearSolver careless = (a, b) -> new double[b.length];
    assertThatThrownBy(
            () ->
                Accuracy.of(LinearSolver.class, careless)
                    .on("spectrum-geometric")
                    .upToCondition(100)
                    .sizes(4)
                    .isAtLeast(Grade.BACKWARD_STABLE))
        .hasMessageContaining("but it is unstable")
        .hasMessageContaining("\n  expected      entry ")
        .hasMessageContaining("\n  got           entry ");
  }

  @Test
  void failuresAreNamed() {
    Summation throwing =
        terms -> {
          throw new IllegalStateException("no wheat");
        };
    Summation writing = terms -> terms[0] = 0;
    Summation endless =
        terms -> {
          while (!Thread.interrupted()) {
            Thread.onSpinWait();
          }
          return 0;
        };
    assertThatThrownBy(() -> on(throwing).isAtLeast(Grade.BACKWARD_STABLE))
        .hasMessageContaining("but it is failed")
        .hasMessageContaining("status        exception: IllegalStateException: no wheat");
    assertThatThrownBy(() -> on(writing).hasForwardErrorUpTo(1))
        .hasMessageContaining("to answer every problem, but it does not")
        .hasMessageContaining("status        modified-input");
    assertThatThrownBy(
            () -> on(endless).repeats(1).timeout(Duration.ofMillis(100)).hasBackwardErrorUpTo(1))
        .hasMessageContaining("status        timeout: no answer within 100 ms");
  }

  @Test
  void whatIsAskedWronglyIsSaidInASentence() {
    assertThatThrownBy(
            () ->
                Accuracy.of(Summation.class, AccuracyTest::plain)
                    .on("canceling")
                    .isAtLeast(Grade.UNSTABLE))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("unknown family 'canceling' of task 'sum'; did you mean 'cancelling'?");
    assertThatThrownBy(() -> Accuracy.of(Runnable.class, () -> {}).hasForwardErrorUpTo(1))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("no task has the interface java.lang.Runnable");
    assertThatThrownBy(() -> Accuracy.of(Summation.class, AccuracyTest::plain).upToCondition(0.5))
        .hasMessage("the largest condition number must be at least 1, found 0.5");
  }

  @Test
  void theSameProblemsEveryTime() {
    String[] messages = new String[2];
    for (int i = 0; i < 2; i++) {
      messages[i] =
          catchThrowableOfType(
                  AssertionFailedError.class,
                  () ->
                      Accuracy.of(Summation.class, AccuracyTest::plain)
                          .seed(7)
                          .hasForwardErrorUpTo(0))
              .getMessage();
    }
    assertThat(messages[0]).isEqualTo(messages[1]).contains("/s7").endsWith("seed 7");
  }

  private static Accuracy<Summation> on(Summation kernel) {
    return Accuracy.of(Summation.class, kernel).on("random-signs").sizes(10);
  }

  private static double plain(double[] terms) {
    double sum = 0;
    for (double term : terms) {
      sum += term;
    }
    return sum;
  }

  private static double compensated(double[] terms) {
    double sum = 0;
    double lost = 0;
    for (double term : terms) {
      double next = sum + term;
      lost += Math.abs(sum) >= Math.abs(term) ? sum - next + term : term - next + sum;
      sum = next;
    }
    return sum + lost;
  }

  private static double dot(double[] x, double[] y) {
    double sum = 0;
    for (int i = 0; i < x.length; i++) {
      sum += x[i] * y[i];
    }
    return sum;
  }
}
