package steelyard.problems;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.MathContext;
import org.junit.jupiter.api.Test;
import steelyard.problems.Judgement.Rounding;
import steelyard.problems.Judgement.Standing;
import steelyard.problems.exact.Dyadic;

class ScalarJudgeTest {
  private static final ScalarJudge QUARTER_OF_TWO = new ScalarJudge(Dyadic.of(0.25), Dyadic.of(2));
  private static final ScalarJudge ZERO_OF_TWO = new ScalarJudge(Dyadic.ZERO, Dyadic.of(2));
  private static final ScalarJudge ZERO_OF_ZERO = new ScalarJudge(Dyadic.ZERO, Dyadic.ZERO);

  private static Judgement judge(ScalarJudge judge, double... answer) {
    return judge.judge(answer);
  }

  @Test
  void tellsBothErrors() {
    assertThat(QUARTER_OF_TWO.condition().kappa()).isEqualTo(8);
    assertThat(judge(QUARTER_OF_TWO, 0.25)).isEqualTo(Judgement.ofScalar(0, 0, Rounding.NEAREST));
    assertThat(judge(QUARTER_OF_TWO, 0.5)).isEqualTo(Judgement.ofScalar(0.125, 1, Rounding.OTHER));
    assertThat(judge(QUARTER_OF_TWO, -0.25)).isEqualTo(Judgement.ofScalar(0.25, 2, Rounding.OTHER));
    assertThat(judge(QUARTER_OF_TWO, Math.nextUp(0.25)).rounding()).isEqualTo(Rounding.OTHER);
  }

  @Test
  void tellsFaithfulFromNearest() {
    Dyadic exact = Dyadic.ONE.add(Dyadic.powerOfTwo(-54));
    ScalarJudge judge = new ScalarJudge(exact, exact);
    assertThat(judge(judge, 1).rounding()).isEqualTo(Rounding.NEAREST);
    assertThat(judge(judge, Math.nextUp(1.0)).rounding()).isEqualTo(Rounding.FAITHFUL);
    assertThat(judge(judge, Math.nextDown(1.0)).rounding()).isEqualTo(Rounding.OTHER);
  }

  @Test
  void exactAnswerZero() {
    assertThat(ZERO_OF_TWO.condition().kappa()).isInfinite();
    assertThat(judge(ZERO_OF_TWO, -0.0)).isEqualTo(Judgement.ofScalar(0, 0, Rounding.NEAREST));
    assertThat(judge(ZERO_OF_TWO, 1))
        .isEqualTo(Judgement.ofScalar(0.5, Double.POSITIVE_INFINITY, Rounding.OTHER));
    assertThat(judge(ZERO_OF_ZERO, 0)).isEqualTo(Judgement.ofScalar(0, 0, Rounding.NEAREST));
    assertThat(judge(ZERO_OF_ZERO, 1).backwardError()).isInfinite();
  }

  @Test
  void noWrongAnswerReadsAsRight() {
    Dyadic huge = Dyadic.powerOfTwo(2000);
    ScalarJudge judge = new ScalarJudge(Dyadic.ZERO, huge);
    assertThat(judge(judge, Double.MIN_VALUE).backwardError()).isEqualTo(Double.MIN_VALUE);
  }

  @Test
  void answersThatCannotBeJudged() {
    assertThat(QUARTER_OF_TWO.judge(null).standing()).isEqualTo(Standing.MALFORMED);
    assertThat(judge(QUARTER_OF_TWO).standing()).isEqualTo(Standing.MALFORMED);
    assertThat(judge(QUARTER_OF_TWO, 1, 2).standing()).isEqualTo(Standing.MALFORMED);
    assertThat(judge(QUARTER_OF_TWO, Double.NaN).standing()).isEqualTo(Standing.NAN);
    assertThat(judge(QUARTER_OF_TWO, Double.NaN).forwardError()).isNaN();
    assertThat(judge(QUARTER_OF_TWO, Double.NEGATIVE_INFINITY).standing())
        .isEqualTo(Standing.INFINITE);
  }

  @Test
  void infinityIsRightOnlyWhereTheExactAnswerRoundsToIt() {
    Dyadic threshold = Dyadic.powerOfTwo(1024).subtract(Dyadic.powerOfTwo(970));
    ScalarJudge beyond = new ScalarJudge(threshold, threshold);
    assertThat(judge(beyond, Double.POSITIVE_INFINITY))
        .isEqualTo(Judgement.ofScalar(0, 0, Rounding.NEAREST));
    assertThat(judge(beyond, Double.NEGATIVE_INFINITY).standing()).isEqualTo(Standing.INFINITE);
    assertThat(judge(beyond, Double.MAX_VALUE).standing()).isEqualTo(Standing.OK);
    Dyadic inside = threshold.subtract(Dyadic.ONE);
    assertThat(judge(new ScalarJudge(inside, inside), Double.POSITIVE_INFINITY).standing())
        .isEqualTo(Standing.INFINITE);
  }

  @Test
  void referenceIsExact() {
    Reference reference = new ExactReference(Dyadic.of(0.1));
    assertThat(reference.route()).isEqualTo("exact");
    assertThat(reference.relativeBound()).isZero();
    assertThat(reference.answer(new MathContext(4)).get(0)).isEqualTo("0.1000");
    assertThat(reference.answer(MathContext.UNLIMITED).get(0))
        .isEqualTo("0.1000000000000000055511151231257827021181583404541015625");
  }
}
