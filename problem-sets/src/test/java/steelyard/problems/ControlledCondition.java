package steelyard.problems;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.OptionalDouble;

/** What every family with a knob must hold: the achieved condition number is near the target. */
public final class ControlledCondition {
  private static final int[] SIZES = {2, 3, 10, 100, 1000};

  private ControlledCondition() {}

  /**
   * Generates over targets 1e0 .. 1e40 and five sizes, and returns how many problems were made; a
   * size that allows less must say so.
   */
  public static int checkFactorTwo(String task, Family<?> family, double step, int repeats) {
    int made = 0;
    for (double target = 1;
        target <= Math.min(1e40, family.reach().maxCondition());
        target *= step) {
      for (int size : SIZES) {
        for (int repeat = 0; repeat < repeats; repeat++) {
          made += achieved(task, family, target, size, repeat) ? 1 : 0;
        }
      }
    }
    return made;
  }

  private static boolean achieved(
      String task, Family<?> family, double target, int size, int repeat) {
    ProblemId id =
        new ProblemId(task, family.profile().id(), OptionalDouble.of(target), size, repeat, 1);
    if (size < family.reach().minSize() || target > family.reach().maxConditionAt(size)) {
      assertThatThrownBy(() -> family.generate(id.request(), id.randomness()))
          .as("%s", id)
          .isInstanceOf(UnreachableException.class);
      assertThat(size).as("%s lies outside the reach", id).isLessThan(100);
      return false;
    }
    double kappa = family.generate(id.request(), id.randomness()).condition().kappa();
    assertThat(kappa / id.request().condition()).as("%s", id).isBetween(0.5, 2.0);
    return true;
  }
}
