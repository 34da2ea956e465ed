package steelyard.problems.sum;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.generate.Draw;

/**
 * Invented data: the weighbridge tickets of one silo of a grain depot, in tonnes, intake positive
 * and dispatch negative. The bridge weighs in steps of 20 kg, so that each ticket is a decimal that
 * no double holds exactly. The last load leaves only sweepings behind, and the sum of the tickets
 * is tiny beside each of them.
 */
final class DepotLedger {
  private static final int STEP_KG = 20;
  private static final int LIGHTEST_STEPS = 400;
  private static final int HEAVIEST_STEPS = 2000;
  private static final int MOST_SWEEPINGS_STEPS = 10;

  // Less than the mean load: so many kilograms a remaining ticket can certainly clear.
  private static final long CLEARED_PER_TICKET_KG = 12_000;
  private static final double KG_PER_TONNE = 1000;

  private DepotLedger() {}

  static double[] generate(Family.Request request, UniformRandomProvider random) {
    double[] tickets = new double[request.size()];
    long stockKg = 0;
    for (int i = 0; i < tickets.length - 1; i++) {
      long loadKg = STEP_KG * (long) Draw.between(random, LIGHTEST_STEPS, HEAVIEST_STEPS);
      boolean mustDispatch = stockKg > CLEARED_PER_TICKET_KG * (tickets.length - 1 - i);
      boolean dispatch = mustDispatch || random.nextBoolean();
      if (dispatch && stockKg > loadKg) {
        loadKg = -loadKg;
      }
      stockKg += loadKg;
      tickets[i] = loadKg / KG_PER_TONNE;
    }
    long sweepingsKg = STEP_KG * (long) Draw.between(random, 1, MOST_SWEEPINGS_STEPS);
    tickets[tickets.length - 1] = (sweepingsKg - stockKg) / KG_PER_TONNE;
    return tickets;
  }
}
