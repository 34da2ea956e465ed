package steelyard.problems.generate;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.UnreachableException;
import steelyard.problems.exact.Dyadic;

/**
 * Chooses contributions to a sum (terms, or products of two factors) that cancel, so that the sum
 * of their absolute values is a given multiple of the absolute value of their sum.
 *
 * <p>The construction follows Ogita, Rump and Oishi: first contributions of random size over the
 * whole range from 1 down to the inverse of the condition number, then contributions that each
 * cancel the exact partial sum down to the next of a row of falling levels. The last one is
 * computed here from the exact sums so far, so that the ratio is met up to one rounding, which
 * changes it by less than a factor of 1.25.
 *
 * @see <a href="https://doi.org/10.1137/030601818">Ogita, Rump and Oishi, Accurate sum and dot
 *     product, SIAM Journal on Scientific Computing 26 (2005), Algorithm 6.1</a>
 */
public final class Cancellation {

  /** What receives the contributions and adds them exactly. */
  public interface Ledger {
    /** Takes a contribution near a value; how near is of no account. */
    void enter(double contribution);

    /**
     * Takes the contribution nearest to a quotient that the format allows.
     *
     * @param numerator its numerator
     * @param denominator its denominator, not zero
     */
    void enter(Dyadic numerator, Dyadic denominator);

    /** Returns the sum of the contributions so far, correctly rounded. */
    double roundedSum();

    /** Returns the exact sum of the contributions so far. */
    Dyadic sum();

    /** Returns the exact sum of their absolute values. */
    Dyadic absoluteSum();
  }

  // A contribution of 53 bits can cancel this many and still leave the rest accurate to a fifth.
  private static final int BITS_PER_CONTRIBUTION = 50;

  // With this many levels the contributions already have every order of magnitude, and each level
  // costs a look at the exact sum.
  private static final int ENOUGH_LEVELS = 64;

  private static final int LEAST_BITS_FOR_LEVELS = 16;

  private final double ratio;
  private final double bits;
  private final UniformRandomProvider random;
  private final Ledger ledger;

  private Cancellation(double ratio, UniformRandomProvider random, Ledger ledger) {
    this.ratio = ratio;
    this.bits = StrictMath.log(ratio) / StrictMath.log(2);
    this.random = random;
    this.ledger = ledger;
  }

  /**
   * Enters contributions into an empty ledger.
   *
   * @param ratio the wanted ratio of the absolute sum to the absolute value of the sum, at least 1
   * @param count the number of contributions, at least 2
   * @param random the only source of randomness
   * @param ledger the ledger
   * @throws UnreachableException if so few contributions cannot cancel so far, beyond 2^(50(count -
   *     1))
   */
  public static void enter(double ratio, int count, UniformRandomProvider random, Ledger ledger) {
    new Cancellation(ratio, random, ledger).enter(count);
  }

  /** Returns the largest ratio that so many contributions can reach, 2^(50(count - 1)). */
  public static double largestRatio(int count) {
    int levels = Math.min(count - 1, Double.MAX_EXPONENT / BITS_PER_CONTRIBUTION);
    return Math.scalb(1.0, BITS_PER_CONTRIBUTION * levels);
  }

  private void enter(int count) {
    int needed = Math.max(1, (int) Math.ceil(bits / BITS_PER_CONTRIBUTION));
    if (needed > count - 1) {
      throw new UnreachableException(
          "%s terms cannot cancel by a factor beyond 2^%s; a larger size is wanted"
              .formatted(count, BITS_PER_CONTRIBUTION * (count - 1)));
    }
    int levels = Math.max(needed, Math.min(count / 2, usefulLevels()));
    enterRandom(count - levels);
    double top = ledger.absoluteSum().doubleValue();
    for (int level = 1; level < levels; level++) {
      int depth = (int) Math.rint(bits * level / levels);
      ledger.enter(Draw.signed(random, -depth) * top - ledger.roundedSum());
    }
    enterLast();
  }

  // Where little cancels, falling levels would cancel more than is wanted.
  private int usefulLevels() {
    return bits < LEAST_BITS_FOR_LEVELS ? 1 : ENOUGH_LEVELS;
  }

  // Exponents spread over the whole range, the first at the top. The signs lean to one side as far
  // as the ratio asks for, so that the later contributions need not be the largest.
  private void enterRandom(int count) {
    double positive = (1 + 1 / ratio) / 2;
    for (int i = 0; i < count; i++) {
      int exponent = i == 0 ? 0 : -(int) (random.nextDouble() * bits);
      double magnitude = Draw.magnitude(random, exponent);
      boolean isPositive = random.nextDouble() < positive;
      ledger.enter(isPositive ? magnitude : -magnitude);
    }
  }

  // With sum p > 0 and absolute sum q so far, a contribution x makes the ratio (q + |x|) / (p + x).
  // It is as wanted for x = excess / (ratio - 1) or, where the excess q - ratio * p is negative,
  // for x = excess / (ratio + 1).
  private void enterLast() {
    Dyadic sum = ledger.sum();
    boolean negative = sum.signum() < 0;
    Dyadic excess = ledger.absoluteSum().subtract(Dyadic.of(ratio).multiply(sum.abs()));
    Dyadic numerator;
    Dyadic denominator;
    if (ratio == 1) {
      // Nothing has cancelled, and nothing shall.
      numerator = Dyadic.of(Draw.magnitude(random, 0));
      denominator = Dyadic.ONE;
    } else {
      numerator = excess;
      denominator = Dyadic.of(ratio).add(excess.signum() < 0 ? Dyadic.ONE : Dyadic.ONE.negate());
    }
    ledger.enter(negative ? numerator.negate() : numerator, denominator);
  }
}
