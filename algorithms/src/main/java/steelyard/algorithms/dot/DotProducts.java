package steelyard.algorithms.dot;

import java.util.List;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.exact.LongAccumulator;

/** The catalogue of inner product candidates. */
public final class DotProducts {

  private static final String HIGHAM =
      "Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., 2002, ";
  private static final String ORO =
      "Ogita, Rump, Oishi, Accurate sum and dot product, SIAM J. Sci. Comput. 26 (2005) 1955-1988, ";

  private DotProducts() {}

  /** Returns all candidates, the textbook one first and the others from plain to exact. */
  public static List<Candidate<DotProduct>> all() {
    return List.of(
        recursive(),
        fma(),
        pairwise(),
        unrolled(),
        dot2(),
        dot3(),
        doubleDouble(),
        exact(),
        commonsNumbers(),
        commonsMath());
  }

  private static Candidate<DotProduct> recursive() {
    return candidate(
            "recursive",
            new RecursiveDot(),
            "One rounded product after the other, in the given order",
            "2n",
            HIGHAM + "section 3.1")
        .claiming(DotBounds.anyOrder());
  }

  private static Candidate<DotProduct> fma() {
    return candidate(
            "fma",
            new FmaDot(),
            "A chain of fused multiply-adds: products are not rounded",
            "n fused multiply-adds",
            "IEEE Standard for Floating-Point Arithmetic, IEEE 754-2019, section 5.4.1")
        .claiming(DotBounds.tree(n -> n, "h = n"));
  }

  private static Candidate<DotProduct> pairwise() {
    return candidate(
            "pairwise",
            new PairwiseDot(),
            "Left half plus right half, down to blocks of 32 products",
            "2n",
            HIGHAM + "section 3.1 and (4.6)")
        .claiming(
            DotBounds.tree(
                PairwiseDot::roundings, "h(n) = n for n <= 32, 1 + h(ceil(n/2)) beyond"));
  }

  private static Candidate<DotProduct> unrolled() {
    return candidate(
            "unrolled-8",
            new UnrolledDot(),
            "Eight interleaved inner products, added pairwise at the end",
            "2n",
            HIGHAM + "section 3.1")
        .claiming(
            DotBounds.tree(
                UnrolledDot::roundings, "h(n) = n for n < 8, at most floor(n/8) + 7 beyond"));
  }

  private static Candidate<DotProduct> dot2() {
    return candidate(
            "dot2",
            new Dot2(),
            "The errors of products and additions are summed apart",
            "10n, of which n fused multiply-adds",
            ORO + "Algorithm 5.3")
        .claiming(DotBounds.dot2());
  }

  private static Candidate<DotProduct> dot3() {
    return candidate(
            "dot3",
            new DotK(3),
            "All errors and the recursive product summed by SumK, as if in 3-fold precision",
            "22n, of which n fused multiply-adds",
            ORO + "Algorithm 5.10")
        .claiming(DotBounds.dotK(3));
  }

  private static Candidate<DotProduct> doubleDouble() {
    return candidate(
            "double-double",
            new DoubleDoubleDot(),
            "Exact products added in an unevaluated sum of two doubles",
            "22n, of which n fused multiply-adds",
            "Dekker, A floating-point technique for extending the available precision,"
                + " Numer. Math. 18 (1971) 224-242")
        .claiming(DotBounds.doubleDouble());
  }

  private static Candidate<DotProduct> exact() {
    return candidate(
            "exact",
            LongAccumulator::dot,
            "Integer products added in a fixed-point register of 133 chunks; correctly rounded for"
                + " any exponents",
            "2n integer multiplications and 4n integer additions, no floating-point operation",
            "Kulisch, Miranker, Computer Arithmetic in Theory and Practice, 1981; register as in"
                + " Neal, arXiv:1505.05571, 2015, section 3")
        .claiming(DotBounds.correctlyRounded());
  }

  private static Candidate<DotProduct> commonsNumbers() {
    return candidate(
        "commons-numbers",
        LibraryDots::commonsNumbers,
        "Sum.ofProducts, compensated; the library publishes no bound",
        "25n, and range checks",
        "Apache Commons Numbers 1.3, org.apache.commons.numbers.core.Sum");
  }

  private static Candidate<DotProduct> commonsMath() {
    return candidate(
        "commons-math",
        LibraryDots::commonsMath,
        "MathArrays.linearCombination, compensated; the library publishes no bound",
        "19n",
        "Apache Commons Math 3.6.1, org.apache.commons.math3.util.MathArrays");
  }

  private static Candidate<DotProduct> candidate(
      String id, DotProduct kernel, String description, String cost, String source) {
    return Candidate.of(id, kernel, description, cost, source);
  }
}
