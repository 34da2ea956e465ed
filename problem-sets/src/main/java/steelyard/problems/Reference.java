package steelyard.problems;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;

/** A high-precision answer together with a rigorous bound on its own relative error. */
public interface Reference {

  /** Returns a short name of the way in which it was obtained, such as {@code exact}. */
  String route();

  /**
   * Returns an upper bound on the relative error of the reference (for vectors, in the task's
   * norm); 0 where it is exact.
   */
  double relativeBound();

  /** Returns the answer, each entry rounded to the given precision; one entry for a scalar task. */
  List<BigDecimal> answer(MathContext precision);
}
