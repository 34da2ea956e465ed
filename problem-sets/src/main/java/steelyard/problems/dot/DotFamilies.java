package steelyard.problems.dot;

import java.util.List;
import steelyard.problems.Family;
import steelyard.problems.Family.Profile;
import steelyard.problems.Reach;
import steelyard.problems.generate.Cancellation;

/** The catalogue of the families of the task {@code dot}. */
public final class DotFamilies {
  private static final int LARGEST = 10_000_000;
  private static final int LARGEST_NEAR_OVERFLOW = 1_000_000;
  private static final String OWN = "own construction: ";

  private DotFamilies() {}

  /** Returns the families, the plainest first. */
  public static List<Family<Vectors>> all() {
    return List.of(
        sameSign(), randomSigns(), cancelling(), wideExponent(), nearOverflow(), nearUnderflow());
  }

  private static Family<Vectors> sameSign() {
    return new DotFamily(
        new Profile(
            "same-sign",
            "growth of the error with the number of products where nothing cancels",
            "none",
            OWN + "random vectors whose products have one sign, condition number 2"),
        Reach.uncontrolled(1, LARGEST),
        OrdinaryVectors::sameSign);
  }

  private static Family<Vectors> randomSigns() {
    return new DotFamily(
        new Profile(
            "random-signs",
            "the everyday case: mild cancellation, condition number about the square root of n",
            "none",
            OWN + "random vectors of random signs"),
        Reach.uncontrolled(1, LARGEST),
        OrdinaryVectors::randomSigns);
  }

  private static Family<Vectors> cancelling() {
    return new DotFamily(
        new Profile(
            "cancelling",
            "how much cancellation an algorithm survives, the roundings of products included",
            "condition number, 2 at least even if 1 is asked for; n products allow at most"
                + " 2^(50(n-1)+1)",
            "after Ogita, Rump, Oishi, SIAM J. Sci. Comput. 26 (2005), Algorithm 6.1, with the last"
                + " product calibrated exactly"),
        Reach.upTo(1e100, 2, LARGEST).limitedBy(n -> 2 * Cancellation.largestRatio(n)),
        CancellingVectors::generate);
  }

  private static Family<Vectors> wideExponent() {
    return new DotFamily(
        new Profile(
            "wide-exponent",
            "products over nearly the whole exponent range, for exact and binned algorithms",
            "none",
            OWN + "random signs, exponents of the factors uniform from -470 to 470"),
        Reach.uncontrolled(1, LARGEST),
        OrdinaryVectors::wideExponent);
  }

  private static Family<Vectors> nearOverflow() {
    return new DotFamily(
        new Profile(
            "near-overflow",
            "factors too large to be split by multiplication, though nothing else overflows",
            "none",
            OWN + "one factor above 2^997, the other ordinary, random signs"),
        Reach.uncontrolled(1, LARGEST_NEAR_OVERFLOW),
        OrdinaryVectors::nearOverflow);
  }

  private static Family<Vectors> nearUnderflow() {
    return new DotFamily(
        new Profile(
            "near-underflow",
            "products whose last bits are below the least double, so that no two-product is exact",
            "none",
            OWN + "random signs, exponents of the products from -1074 to -1024"),
        Reach.uncontrolled(1, LARGEST),
        OrdinaryVectors::nearUnderflow);
  }
}
