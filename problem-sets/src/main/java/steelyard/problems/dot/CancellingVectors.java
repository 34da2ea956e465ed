package steelyard.problems.dot;

import java.util.Arrays;
import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.exact.ExactSums;
import steelyard.problems.generate.Cancellation;
import steelyard.problems.generate.Draw;

/**
 * Vectors whose products have every order of magnitude and cancel to a wanted condition number, in
 * random order. The roundings of single products already outweigh the result.
 */
final class CancellingVectors implements Cancellation.Ledger {
  // No condition number is below 2, so a smaller target asks for products that do not cancel.
  private static final double LEAST_RATIO = 1;

  private final ExactSums sums = new ExactSums();
  private ExactAccumulator sum = new ExactAccumulator();
  private final UniformRandomProvider random;
  private final double[] x;
  private final double[] y;
  private int count;
  private int added;

  private CancellingVectors(int size, UniformRandomProvider random) {
    this.random = random;
    x = new double[size];
    y = new double[size];
  }

  static Vectors generate(Family.Request request, UniformRandomProvider random) {
    CancellingVectors ledger = new CancellingVectors(request.size(), random);
    double ratio = Math.max(LEAST_RATIO, request.condition() / 2);
    Cancellation.enter(ratio, request.size(), random, ledger);
    Draw.shuffle(random, ledger.x, ledger.y);
    return new Vectors(ledger.x, ledger.y);
  }

  @Override
  public void enter(Dyadic numerator, Dyadic denominator) {
    double factor = factor(leadingExponent(numerator) - leadingExponent(denominator));
    enter(factor, Dyadic.quotient(numerator, denominator.multiply(Dyadic.of(factor))));
  }

  @Override
  public void enter(double product) {
    double factor = factor(Math.getExponent(product));
    enter(factor, product / factor);
  }

  private void enter(double factor, double partner) {
    x[count] = factor;
    y[count] = partner;
    count++;
  }

  // The random products at once, which is the faster way, and later ones singly.
  private void addUp() {
    double[] factors = Arrays.copyOfRange(x, added, count);
    double[] partners = Arrays.copyOfRange(y, added, count);
    sums.addProducts(factors, partners);
    if (added == 0) {
      sum = sums.accumulated();
    } else {
      sum.addProducts(factors, partners);
    }
    added = count;
  }

  // The magnitude of the product is shared evenly between a random factor and its partner.
  private double factor(int exponent) {
    return Draw.signed(random, Math.floorDiv(exponent, 2));
  }

  private static int leadingExponent(Dyadic number) {
    return number.exponent() + number.significand().bitLength();
  }

  @Override
  public double roundedSum() {
    addUp();
    return sum.round();
  }

  @Override
  public Dyadic sum() {
    addUp();
    return sum.value();
  }

  @Override
  public Dyadic absoluteSum() {
    addUp();
    return sums.absoluteSum();
  }
}
