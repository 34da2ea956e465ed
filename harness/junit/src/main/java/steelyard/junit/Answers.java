package steelyard.junit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Optional;
import steelyard.harness.data.DoubleText;
import steelyard.harness.data.PartsCopy;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Problem;

/**
 * The answer to a problem beside the one that was given, as texts. Of a vector it is the entry that
 * is furthest off.
 *
 * @param expected the exact answer, and the double nearest to it
 * @param got the answer given; empty if there is none to show
 */
record Answers(String expected, Optional<String> got) {

  private static final MathContext PRECISION = new MathContext(40);
  private static final int DIGITS = 20;

  static <D extends Data> Answers expectedOf(Problem<D> problem) {
    return of(problem.reference().answer(PRECISION), null);
  }

  /** Calls the kernel once more, as rows keep no vectors. */
  static <K, D extends Data> Answers of(Task<K, D> task, K kernel, Problem<D> problem) {
    double[] got;
    try {
      got = task.apply(kernel, task.data(PartsCopy.of(problem.data().parts())));
    } catch (RuntimeException | Error elsewise) {
      got = null;
    }
    return of(problem.reference().answer(PRECISION), got);
  }

  private static Answers of(List<BigDecimal> exact, double[] got) {
    if (got == null) {
      return new Answers(text(exact, 0), Optional.empty());
    }
    if (got.length != exact.size()) {
      return new Answers(
          text(exact, 0),
          Optional.of(got.length + " entries, where " + exact.size() + " are right"));
    }
    int worst = 0;
    double furthest = -1;
    for (int i = 0; i < got.length; i++) {
      double distance = distance(exact.get(i), got[i]);
      if (distance > furthest) {
        worst = i;
        furthest = distance;
      }
    }
    String entry = DoubleText.full(got[worst]) + " (" + Double.toHexString(got[worst]) + ")";
    return new Answers(text(exact, worst), Optional.of(entry));
  }

  private static double distance(BigDecimal exact, double got) {
    return Double.isFinite(got)
        ? exact.subtract(new BigDecimal(got)).abs().doubleValue()
        : Double.POSITIVE_INFINITY;
  }

  private static String text(List<BigDecimal> exact, int index) {
    BigDecimal entry = exact.get(index);
    String text =
        DoubleText.scientific(entry, DIGITS) + " (" + Double.toHexString(entry.doubleValue()) + ")";
    return exact.size() == 1 ? text : text + ", entry " + (index + 1) + " of " + exact.size();
  }
}
