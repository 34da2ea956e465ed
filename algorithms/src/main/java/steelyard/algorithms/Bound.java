package steelyard.algorithms;

import java.util.Objects;
import java.util.Set;

/**
 * An a-priori error bound that a candidate claims, as a function of size, condition number and unit
 * roundoff. It is a claim to be held against every observation, so it is given with its source.
 *
 * @param limits which error it limits
 * @param formula the bound itself
 * @param text the formula for readers, for example {@code (n-1)u}
 * @param source author, year, title, theorem or page
 * @param traits what must be true of a problem for the bound to hold (such as {@code
 *     no-underflow}); elsewhere nothing is claimed
 */
public record Bound(
    Limits limits, Formula formula, String text, String source, Set<String> traits) {

  /** The error that a bound limits. */
  public enum Limits {
    /** The relative forward error. */
    FORWARD_ERROR,
    /** The normwise backward error. */
    BACKWARD_ERROR,
    /** The componentwise backward error. */
    COMPONENTWISE_BACKWARD_ERROR
  }

  /** A bound as a function of what is known of a problem. */
  @FunctionalInterface
  public interface Formula {
    /**
     * Returns the bound.
     *
     * @param n the problem's size
     * @param kappa its condition number, at least 0, possibly infinite
     * @param u the unit roundoff
     * @return the largest error that the source allows; infinite where it allows any
     */
    double at(int n, double kappa, double u);
  }

  /** Copies the traits. */
  public Bound {
    Objects.requireNonNull(limits, "limits");
    Objects.requireNonNull(formula, "formula");
    Objects.requireNonNull(text, "text");
    Objects.requireNonNull(source, "source");
    traits = Set.copyOf(traits);
  }

  /** Returns a bound on the relative forward error. */
  public static Bound forward(Formula formula, String text, String source, String... traits) {
    return new Bound(Limits.FORWARD_ERROR, formula, text, source, Set.of(traits));
  }

  /** Returns a bound on the normwise backward error. */
  public static Bound backward(Formula formula, String text, String source, String... traits) {
    return new Bound(Limits.BACKWARD_ERROR, formula, text, source, Set.of(traits));
  }

  /** Returns a bound on the componentwise backward error. */
  public static Bound componentwise(Formula formula, String text, String source, String... traits) {
    return new Bound(Limits.COMPONENTWISE_BACKWARD_ERROR, formula, text, source, Set.of(traits));
  }

  /**
   * Returns gamma_k = k u / (1 - k u).
   *
   * @return the constant, or infinity when k u is at least 1
   * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
   *     Numerical Algorithms, 2nd ed., 2002, Lemma 3.1</a>
   */
  public static double gamma(double k, double u) {
    double ku = k * u;
    return ku < 1 ? ku / (1 - ku) : Double.POSITIVE_INFINITY;
  }
}
