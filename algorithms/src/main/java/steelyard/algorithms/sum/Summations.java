package steelyard.algorithms.sum;

import java.util.List;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.Scope;
import steelyard.algorithms.exact.LongAccumulator;

/** The catalogue of summation candidates. */
public final class Summations {

  private static final String HIGHAM =
      "Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., 2002, ";
  private static final String ORO =
      "Ogita, Rump, Oishi, Accurate sum and dot product, SIAM J. Sci. Comput. 26 (2005) 1955-1988, ";

  private Summations() {}

  /** Returns all candidates, the textbook one first and the others from plain to exact. */
  public static List<Candidate<Summation>> all() {
    return List.of(
        recursive(),
        sorted(),
        pairwise(),
        blocked(),
        unrolled(),
        kahan(),
        neumaier(),
        klein(),
        sum2(),
        sumK(3, "13n"),
        sumK(4, "19n"),
        doubleDouble(),
        accSum(),
        exact(),
        jdkStream(),
        jdkParallelStream(),
        bigDecimal(),
        commonsNumbers(),
        commonsMath());
  }

  private static Candidate<Summation> recursive() {
    return candidate(
            "recursive",
            new RecursiveSum(),
            "One term after the other, in the given order",
            "n",
            HIGHAM + "section 4.1")
        .claiming(SumBounds.anyOrder());
  }

  private static Candidate<Summation> sorted() {
    return candidate(
            "sorted",
            new SortedSum(),
            "One term after the other, by increasing magnitude",
            "n, and n log2 n comparisons",
            HIGHAM + "sections 4.1 and 4.2")
        .claiming(SumBounds.anyOrder());
  }

  private static Candidate<Summation> pairwise() {
    return candidate(
            "pairwise",
            new PairwiseSum(),
            "Left half plus right half, down to blocks of 32 terms",
            "n",
            "Linz, Accurate floating-point summation, Comm. ACM 13 (1970) 361-362")
        .claiming(
            SumBounds.tree(PairwiseSum::height, "h(n) = n-1 for n <= 32, 1 + h(ceil(n/2)) beyond"));
  }

  private static Candidate<Summation> blocked() {
    return candidate(
            "blocked",
            new BlockedSum(),
            "Sums of blocks of 128 terms, then their sum",
            "n",
            "Blanchard, Higham, Mary, A class of fast and accurate summation algorithms,"
                + " SIAM J. Sci. Comput. 42 (2020) A1541-A1557")
        .claiming(
            SumBounds.tree(
                BlockedSum::height, "h(n) = n-1 for n <= 128, 126 + ceil(n/128) beyond"));
  }

  private static Candidate<Summation> unrolled() {
    return candidate(
            "unrolled-8",
            new UnrolledSum(),
            "Eight interleaved sums, added pairwise at the end",
            "n",
            HIGHAM + "section 4.1")
        .claiming(
            SumBounds.tree(
                UnrolledSum::height, "h(n) = n-1 for n < 8, at most floor(n/8) + 6 beyond"));
  }

  private static Candidate<Summation> kahan() {
    return candidate(
        "kahan",
        new KahanSum(),
        "Each addition's rounding error goes into the next term",
        "4n",
        "Kahan, Further remarks on reducing truncation errors, Comm. ACM 8 (1965) 40");
  }

  private static Candidate<Summation> neumaier() {
    return candidate(
            "neumaier",
            new NeumaierSum(),
            "The additions' rounding errors are summed apart; finds the larger summand by a branch",
            "4n, and n comparisons",
            "Neumaier, Rundungsfehleranalyse einiger Verfahren zur Summation endlicher Summen,"
                + " ZAMM 54 (1974) 39-51")
        .claiming(SumBounds.correctionApart());
  }

  private static Candidate<Summation> klein() {
    return candidate(
        "klein",
        new KleinSum(),
        "Neumaier's method applied to its own corrections: second order",
        "7n, and 2n comparisons",
        "Klein, A generalized Kahan-Babuska summation algorithm, Computing 76 (2006) 279-293");
  }

  private static Candidate<Summation> sum2() {
    return candidate(
            "sum2",
            new Sum2(),
            "The additions' rounding errors are summed apart; branch-free",
            "7n",
            ORO + "Algorithm 4.4")
        .claiming(SumBounds.sum2());
  }

  private static Candidate<Summation> sumK(int fold, String cost) {
    return candidate(
            "sum" + fold,
            new SumK(fold),
            "Error-free vector transformations, as if in " + fold + "-fold precision",
            cost,
            ORO + "Algorithm 4.8")
        .claiming(SumBounds.sumK(fold));
  }

  private static Candidate<Summation> doubleDouble() {
    return candidate(
            "double-double",
            new DoubleDoubleSum(),
            "Recursive, in an unevaluated sum of two doubles",
            "10n",
            "Dekker, A floating-point technique for extending the available precision,"
                + " Numer. Math. 18 (1971) 224-242")
        .claiming(SumBounds.doubleDouble());
  }

  private static Candidate<Summation> accSum() {
    return candidate(
            "accsum",
            new AccSum(),
            "Cuts leading bits off all terms until the rest no longer matters; faithful",
            "(4m+3)n, m cuts growing with log kappa",
            "Rump, Ogita, Oishi, Accurate floating-point summation part I: faithful rounding,"
                + " SIAM J. Sci. Comput. 31 (2008) 189-224, Algorithm 4.5")
        .within(Scope.upTo(AccSum.MAX_TERMS))
        .claiming(SumBounds.faithful());
  }

  private static Candidate<Summation> exact() {
    return candidate(
            "exact",
            LongAccumulator::sum,
            "Adds integers in a fixed-point register of 67 chunks; correctly rounded",
            "2n integer additions, no floating-point operation",
            "Neal, Fast exact summation using small and large superaccumulators,"
                + " arXiv:1505.05571, 2015, section 3")
        .claiming(SumBounds.correctlyRounded());
  }

  private static Candidate<Summation> jdkStream() {
    return candidate(
        "jdk-stream",
        LibrarySums::jdkStream,
        "DoubleStream.sum(), compensated; the library publishes no bound",
        "5n",
        "JDK, java.util.stream.DoubleStream");
  }

  private static Candidate<Summation> jdkParallelStream() {
    return candidate(
            "jdk-parallel-stream",
            LibrarySums::jdkParallelStream,
            "DoubleStream.parallel().sum(), compensated; the library publishes no bound",
            "5n, over all cores",
            "JDK, java.util.stream.DoubleStream")
        .dependingOnCores();
  }

  private static Candidate<Summation> bigDecimal() {
    return candidate(
        "big-decimal",
        LibrarySums::bigDecimal,
        "Exact decimal sum, converted once at the end",
        "n additions of decimals of up to 1100 digits",
        "JDK, java.math.BigDecimal");
  }

  private static Candidate<Summation> commonsNumbers() {
    return candidate(
        "commons-numbers",
        LibrarySums::commonsNumbers,
        "Sum.of, compensated; the library publishes no bound",
        "7n",
        "Apache Commons Numbers 1.3, org.apache.commons.numbers.core.Sum");
  }

  private static Candidate<Summation> commonsMath() {
    return candidate(
        "commons-math",
        LibrarySums::commonsMath,
        "StatUtils.sum, a plain loop; the library publishes no bound",
        "n",
        "Apache Commons Math 3.6.1, org.apache.commons.math3.stat.StatUtils");
  }

  private static Candidate<Summation> candidate(
      String id, Summation kernel, String description, String cost, String source) {
    return Candidate.of(id, kernel, description, cost, source);
  }
}
