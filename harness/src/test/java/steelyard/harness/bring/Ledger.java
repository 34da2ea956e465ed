package steelyard.harness.bring;

import java.util.List;
import steelyard.algorithms.sum.Summation;

/** What users bring along, the good and the bad, for tests. */
public final class Ledger {
  private static int calls;

  /** Makes one. */
  public Ledger() {}

  public static double net(double[] terms) {
    double sum = 0;
    for (double term : terms) {
      sum += term;
    }
    return sum;
  }

  public static float net(float[] terms) {
    float sum = 0;
    for (float term : terms) {
      sum += term;
    }
    return sum;
  }

  public double backwards(double[] terms) {
    double sum = 0;
    for (int i = terms.length - 1; i >= 0; i--) {
      sum += terms[i];
    }
    return sum;
  }

  public static double ofList(List<Double> terms) {
    return terms.size();
  }

  public static int rounded(double[] terms) {
    return (int) net(terms);
  }

  static double hidden(double[] terms) {
    return net(terms);
  }

  public static double throwing(double[] terms) {
    throw new IllegalStateException("no wheat");
  }

  public static double nan(double[] terms) {
    return Double.NaN;
  }

  public static double[] empty(double[][] a, double[] b) {
    return new double[0];
  }

  public static double[] nothing(double[][] a, double[] b) {
    return null;
  }

  @SuppressWarnings("InfiniteRecursion")
  public static double recursing(double[] terms) {
    return recursing(terms) + 1;
  }

  public static double writing(double[] terms) {
    terms[0] = 1;
    return 0;
  }

  public static float writing(float[] terms) {
    terms[0] = 1;
    return 0;
  }

  public static double counting(double[] terms) {
    calls++;
    return calls;
  }

  public static double printing(double[] terms) {
    System.out.println("weighed");
    System.err.println("weighed");
    return net(terms);
  }

  public static double starting(double[] terms) {
    new Thread(
            () -> {
              while (true) {
                Thread.onSpinWait();
              }
            })
        .start();
    return net(terms);
  }

  public static double endless(double[] terms) {
    while (true) {
      Thread.onSpinWait();
    }
  }

  public static double hoarding(double[] terms) {
    Object kept = null;
    while (true) {
      kept = new Object[] {kept, new long[1 << 24]};
    }
  }

  public static double exiting(double[] terms) {
    System.exit(7);
    return 0;
  }

  public static double halting(double[] terms) {
    Runtime.getRuntime().halt(9);
    return 0;
  }

  /** A class that implements the task's interface. */
  public static final class Total implements Summation {
    /** Makes one. */
    public Total() {}

    @Override
    public double sum(double[] terms) {
      return net(terms);
    }
  }

  /** A class of which there are no objects. */
  public abstract static class Abstract implements Summation {
    public double half(double[] terms) {
      return sum(terms) / 2;
    }
  }

  /** A class that cannot be initialized. */
  public static final class Broken {
    private static final int NUMBER = Integer.parseInt("none");

    private Broken() {}

    public static double net(double[] terms) {
      return NUMBER;
    }
  }
}
