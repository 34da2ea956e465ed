package depot;

/** How an invented grain depot adds up what its weighbridge has weighed. */
public final class Weighbridge {
  private Weighbridge() {}

  /** The total as it always was. */
  public static double total(double[] kilograms) {
    double total = 0;
    for (double each : kilograms) {
      total += each;
    }
    return total;
  }

  /** The total in single precision, as the old display had it. */
  public static float total(float[] kilograms) {
    float total = 0;
    for (float each : kilograms) {
      total += each;
    }
    return total;
  }

  /** The total from two running totals, of what came in and what went out. */
  public static double inAndOut(double[] kilograms) {
    double in = 0;
    double out = 0;
    for (double each : kilograms) {
      if (each > 0) {
        in += each;
      } else {
        out += each;
      }
    }
    return in + out;
  }
}
