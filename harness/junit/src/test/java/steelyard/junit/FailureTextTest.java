package steelyard.junit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.time.Duration;
import java.util.Arrays;
import java.util.concurrent.atomic.AtomicInteger;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.api.Test;
import org.opentest4j.AssertionFailedError;
import steelyard.algorithms.solve.LinearSolver;
import steelyard.algorithms.sum.Summation;
import steelyard.harness.api.Steelyard;
import steelyard.problems.Problem;
import steelyard.problems.sum.Terms;
import steelyard.results.Grade;

class FailureTextTest {

  private static String failure(ThrowingCallable assertion) {
    return catchThrowableOfType(AssertionFailedError.class, assertion).getMessage();
  }

  private static String stable(Summation kernel) {
    return failure(
        () ->
            Accuracy.of(Summation.class, kernel)
                .on("random-signs")
                .sizes(10)
                .isAtLeast(Grade.BACKWARD_STABLE));
  }

  @Test
  void showsTheWorstProblemAndHowToMakeItAgain() {
    String message =
        failure(
            () ->
                Accuracy.of(Summation.class, Depot::roughTotal)
                    .on("cancelling", "depot-ledger")
                    .upToCondition(100)
                    .sizes(10)
                    .repeats(2)
                    .isAtLeast(Grade.BACKWARD_STABLE));

    assertThat(message.lines().toList())
        .satisfiesExactly(
            line ->
                assertThat(line)
                    .matches(
                        "expected the sum 'kernel' to be at least backward stable,"
                            + " but it is unstable: \\d of 6 problems break it"),
            line -> assertThat(line).matches("  worst problem  sum/cancelling/k\\S+/n10/r\\d"),
            line -> assertThat(line).matches("  condition      \\d\\.\\de\\+0[0-2]"),
            line -> assertThat(line).matches("  expected       \\S+ \\(-?0x\\S+\\)"),
            line -> assertThat(line).matches("  got            \\S+ \\(-?0x\\S+\\)"),
            line -> assertThat(line).matches("  errors         forward \\S+, backward \\S+, .*"),
            line ->
                assertThat(line).isEqualTo("  allowed        a backward error of at most 1.1e-14"),
            line -> assertThat(line).isEqualTo("  tried          6 problems: cancelling 6"),
            line ->
                assertThat(line)
                    .isEqualTo(
                        "                 condition numbers up to 100, sizes 10, repeats 2, seed 1"),
            line -> assertThat(line).isEqualTo("  left out       2 of a larger condition number"),
            line -> assertThat(line).matches("  make it again  ./steelyard problems sum/\\S+"),
            line ->
                assertThat(line)
                    .matches(
                        " +Steelyard\\.standard\\(\\)\\.problem\\(\"sum/cancelling/\\S+\"\\)"));
  }

  @Test
  void theIdMakesTheProblemOnWhichTheAnswerWasGot() {
    String message = stable(Depot::roughTotal);
    String id = message.lines().toList().get(1).replaceFirst(".* ", "");
    Problem<?> problem = Steelyard.standard().problem(id);

    assertThat(message)
        .contains(
            "(" + Double.toHexString(Depot.roughTotal(((Terms) problem.data()).values())) + ")")
        .contains(
            "("
                + Double.toHexString(
                    problem.reference().answer(new java.math.MathContext(40)).get(0).doubleValue())
                + ")");
  }

  @Test
  void saysWhatWasThrown() {
    assertThat(
            stable(
                terms -> {
                  throw new IllegalStateException("the scale is stuck");
                }))
        .contains(
            "it gave no answer to judge on 3 of 3 problems",
            "exception: IllegalStateException: the scale is stuck",
            "expected       ");
  }

  @Test
  void saysThatTheAnswerIsNoNumber() {
    assertThat(stable(terms -> Double.NaN)).contains("got            NaN (NaN)", "status  ", "nan");
    assertThat(stable(terms -> Double.POSITIVE_INFINITY)).contains("Infinity", "infinite");
  }

  @Test
  void saysThatTheInputWasModified() {
    assertThat(
            stable(
                terms -> {
                  Arrays.sort(terms);
                  return Depot.total(terms);
                }))
        .contains("modified-input: the input differs after the call");
  }

  @Test
  void saysThatAnswersVary() {
    AtomicInteger calls = new AtomicInteger();
    assertThat(stable(terms -> calls.incrementAndGet())).contains("nondeterministic");
  }

  @Test
  void saysThatACallDidNotReturnAndTriesNoMore() {
    AtomicInteger calls = new AtomicInteger();
    String message =
        failure(
            () ->
                Accuracy.of(Summation.class, terms -> stuck(calls))
                    .timeout(Duration.ofMillis(50))
                    .isAtLeast(Grade.BACKWARD_STABLE));

    assertThat(message)
        .contains(
            "timeout: no answer within 50 ms",
            "tried          1 problem: ",
            "no more were tried after a call that did not return");
    assertThat(calls).hasValueLessThan(3);
  }

  private static double stuck(AtomicInteger calls) {
    calls.incrementAndGet();
    try {
      Thread.sleep(60_000);
    } catch (InterruptedException woken) {
      Thread.currentThread().interrupt();
    }
    return 0;
  }

  @Test
  void saysThatAVectorHasTheWrongLength() {
    assertThat(
            failure(
                () ->
                    Accuracy.of(LinearSolver.class, (a, b) -> new double[2])
                        .on("diagonally-dominant")
                        .sizes(5)
                        .isAtLeast(Grade.BACKWARD_STABLE)))
        .contains("malformed", "got            2 entries, where 5 are right", "entry 1 of 5");
  }

  @Test
  void nothingTriedIsNoSuccess() {
    assertThat(
            failure(
                () ->
                    Accuracy.of(LinearSolver.class, (a, b) -> b)
                        .on("unimodular")
                        .requiring("positive-definit")
                        .isAtLeast(Grade.BACKWARD_STABLE)))
        .contains(
            "but nothing was tried",
            "tried          0 problems",
            "left out       2 outside the candidate's scope");
    assertThat(
            failure(
                () ->
                    Accuracy.of(Summation.class, Depot::total)
                        .on("depot-ledger")
                        .except("depot-ledger")
                        .isAtLeast(Grade.BACKWARD_STABLE)))
        .contains("but nothing was tried");
    assertThat(
            failure(
                () ->
                    Accuracy.of(Summation.class, Depot::total)
                        .on("random-signs")
                        .sizes(1000)
                        .upToCondition(1)
                        .isNoLessAccurateThan(Depot::backwards)))
        .contains("but nothing was tried", "3 of a larger condition number");
  }

  @Test
  void tooLittleEvidenceIsNoSuccess() {
    assertThat(
            failure(
                () ->
                    Accuracy.of(Summation.class, terms -> terms[0])
                        .on("same-sign")
                        .sizes(1)
                        .isAtLeast(Grade.CORRECTLY_ROUNDED)))
        .contains("too few, or too easy, to prove it; try more of them with repeats");
    assertThat(
            failure(
                () ->
                    Accuracy.of(Summation.class, Depot::carefulTotal)
                        .on("random-signs")
                        .sizes(10)
                        .isAtLeast(Grade.THREE_FOLD)))
        .contains("try a larger condition number with upToCondition");
  }

  @Test
  void aBadLineIsASentence() {
    Accuracy<Summation> line = Accuracy.of(Summation.class, Depot::total);

    assertBad(
        () -> line.on("canceling"),
        "there is no family of task 'sum' named 'canceling'; did you mean 'cancelling'?");
    assertBad(
        () -> line.except("overflows"),
        "there is no family of task 'sum' named 'overflows'; did you mean 'overflow'?");
    assertBad(line::on, "name at least one family");
    assertBad(
        () -> line.upToCondition(0.5),
        "the largest condition number must be finite and at least 1, found 0.5");
    assertBad(line::sizes, "name at least one size");
    assertBad(() -> line.sizes(10, 0), "a size must be at least 1, found 0");
    assertBad(() -> line.repeats(0), "repeats must be at least 1, found 0");
    assertBad(() -> line.timeout(Duration.ZERO), "the timeout must be above zero");
    assertBad(
        () -> line.hasForwardErrorUpTo(Double.NaN), "the largest error must be a number from 0");
    assertBad(
        () -> line.isNoLessAccurateThan(Depot::backwards, 0.5),
        "the factor must be finite and at least 1");
    assertBad(
        () -> line.isAtLeast(Grade.UNSTABLE),
        "no candidate is held to the grade 'unstable': name one from correctly rounded to forward"
            + " stable");
    assertBad(
        () ->
            Accuracy.of(LinearSolver.class, (a, b) -> b)
                .on("hilbert")
                .sizes(20)
                .isAtLeast(Grade.FORWARD_STABLE),
        "family 'hilbert' of task 'solve' makes sizes from 2 to 19, but size 20 is wanted");
  }

  private static void assertBad(ThrowingCallable line, String sentence) {
    assertThatThrownBy(line).isInstanceOf(IllegalArgumentException.class).hasMessage(sentence);
  }
}
