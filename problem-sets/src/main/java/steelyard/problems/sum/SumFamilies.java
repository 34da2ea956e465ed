package steelyard.problems.sum;

import java.util.List;
import steelyard.problems.Family;
import steelyard.problems.Family.Profile;
import steelyard.problems.Reach;
import steelyard.problems.generate.Cancellation;

/** The catalogue of the families of the task {@code sum}. */
public final class SumFamilies {
  private static final int LARGEST = 10_000_000;
  private static final String OWN = "own construction: ";

  private SumFamilies() {}

  /** Returns the families, the plainest first. */
  public static List<Family<Terms>> all() {
    return List.of(
        sameSign(),
        randomSigns(),
        cancelling(),
        expSeries(),
        lateDominant(),
        wideExponent(),
        overflow(),
        subnormal(),
        depotLedger());
  }

  private static Family<Terms> sameSign() {
    return new SumFamily(
        new Profile(
            "same-sign",
            "growth of the error with the number of terms where nothing cancels",
            "none",
            OWN + "random terms of one sign, condition number 1"),
        Reach.uncontrolled(1, LARGEST),
        OrdinaryTerms::sameSign);
  }

  private static Family<Terms> randomSigns() {
    return new SumFamily(
        new Profile(
            "random-signs",
            "the everyday case: mild cancellation, condition number about the square root of n",
            "none",
            OWN + "random terms of random sign"),
        Reach.uncontrolled(1, LARGEST),
        OrdinaryTerms::randomSigns);
  }

  private static Family<Terms> cancelling() {
    return new SumFamily(
        new Profile(
            "cancelling",
            "how much cancellation over all orders of magnitude an algorithm survives",
            "condition number; n terms allow at most 2^(50(n-1))",
            "after Ogita, Rump, Oishi, SIAM J. Sci. Comput. 26 (2005), Algorithm 6.1, for terms"
                + " instead of products and with the last term calibrated exactly"),
        Reach.upTo(1e100, 2, LARGEST).limitedBy(Cancellation::largestRatio),
        CancellingTerms::generate);
  }

  private static Family<Terms> expSeries() {
    return new SumFamily(
        new Profile(
            "exp-series",
            "cancellation as it occurs in practice: a series used where it should not be",
            "condition number exp(2t); a small n allows less",
            "the power series of exp(-t); Higham, Accuracy and Stability of Numerical Algorithms,"
                + " 2nd ed., 2002, Chapter 4"),
        Reach.upTo(1e16, 2, LARGEST).limitedBy(ExponentialSeries::largestCondition),
        ExponentialSeries::generate);
  }

  private static Family<Terms> lateDominant() {
    return new SumFamily(
        new Profile(
            "late-dominant",
            "compensation that forgets the running sum when a larger term arrives",
            "condition number, by the size of the late term",
            "after Neumaier, Z. Angew. Math. Mech. 54 (1974) 39-51: one large term and its"
                + " negative among ordinary ones"),
        Reach.upTo(1e100, 3, LARGEST),
        LateDominantTerms::generate);
  }

  private static Family<Terms> wideExponent() {
    return new SumFamily(
        new Profile(
            "wide-exponent",
            "terms over nearly the whole exponent range, for exact and binned algorithms",
            "none",
            OWN + "random signs, exponents uniform from -950 to 950"),
        Reach.uncontrolled(1, LARGEST),
        OrdinaryTerms::wideExponent);
  }

  private static Family<Terms> overflow() {
    return new SumFamily(
        new Profile(
            "overflow",
            "partial sums that overflow although the sum does not",
            "none",
            OWN + "terms near the largest double, the positive ones first"),
        Reach.uncontrolled(3, LARGEST),
        ExtremeTerms::overflow);
  }

  private static Family<Terms> subnormal() {
    return new SumFamily(
        new Profile(
            "subnormal",
            "terms below the normal doubles: flushing to zero, scaling that loses bits",
            "none",
            OWN + "random signs, exponents uniform from -1073 to -1012"),
        Reach.uncontrolled(1, LARGEST),
        ExtremeTerms::subnormal);
  }

  private static Family<Terms> depotLedger() {
    return new SumFamily(
        new Profile(
            "depot-ledger",
            "a ledger of decimal amounts whose balance is tiny beside its entries",
            "none",
            OWN + "invented weighbridge tickets of a grain depot, in tonnes"),
        Reach.uncontrolled(2, LARGEST),
        DepotLedger::generate);
  }
}
