package steelyard.problems.sum;

import java.util.Arrays;
import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.exact.ExactSums;
import steelyard.problems.generate.Cancellation;
import steelyard.problems.generate.Draw;

/** Terms of every order of magnitude that cancel to a wanted condition number, in random order. */
final class CancellingTerms implements Cancellation.Ledger {
  private final ExactAccumulator sum = new ExactAccumulator();
  private final double[] terms;
  private int count;

  private CancellingTerms(int size) {
    terms = new double[size];
  }

  static double[] generate(Family.Request request, UniformRandomProvider random) {
    CancellingTerms ledger = new CancellingTerms(request.size());
    Cancellation.enter(request.condition(), request.size(), random, ledger);
    Draw.shuffle(random, ledger.terms);
    return ledger.terms;
  }

  @Override
  public void enter(Dyadic numerator, Dyadic denominator) {
    enter(Dyadic.quotient(numerator, denominator));
  }

  @Override
  public void enter(double term) {
    terms[count++] = term;
    sum.add(term);
  }

  @Override
  public double roundedSum() {
    return sum.round();
  }

  @Override
  public Dyadic sum() {
    return sum.value();
  }

  @Override
  public Dyadic absoluteSum() {
    return ExactSums.of(Arrays.copyOf(terms, count)).absoluteSum();
  }
}
