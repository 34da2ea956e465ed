package steelyard.harness.data;

import java.util.List;
import steelyard.problems.Data;

/** Inputs with everything in them that is easily lost on the way. */
final class InputParts {

  private InputParts() {}

  static List<Data.Part> awkward() {
    double quiet = Double.longBitsToDouble(0x7ff8_0000_dead_beefL);
    double signalling = Double.longBitsToDouble(0xfff0_0000_0000_0001L);
    return List.of(
        new Data.Matrix("a", new double[][] {{1, -0.0, quiet}, {Double.MIN_VALUE, 2, 3}}),
        new Data.Vector("Gewicht é", new double[] {signalling, Double.NEGATIVE_INFINITY}),
        new Data.Vector("empty", new double[0]),
        new Data.Matrix("nothing", new double[0][]));
  }
}
