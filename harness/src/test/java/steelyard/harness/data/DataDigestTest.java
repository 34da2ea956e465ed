package steelyard.harness.data;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import steelyard.problems.Data;

class DataDigestTest {

  private static final double NAN_WITH_PAYLOAD = Double.longBitsToDouble(0x7ff8_0000_0000_0001L);

  /**
   * The value was computed with Python's hashlib from the bytes {@code 'v'}, length and bytes of
   * the name, 1, 2, and the bits of 1 and -0.
   */
  @Test
  void isTheStartOfASha256() {
    assertThat(DataDigest.of(List.of(new Data.Vector("x", new double[] {1, -0.0}))))
        .isEqualTo("0e2e9488a01faea9");
  }

  @Test
  void tellsBitsNamesShapesAndOrderApart() {
    Data.Part x = new Data.Vector("x", new double[] {1, 2, 3, 4});
    Data.Part b = new Data.Vector("b", new double[] {5});

    assertThat(
            List.of(
                digest(),
                digest(x),
                digest(new Data.Vector("y", new double[] {1, 2, 3, 4})),
                digest(new Data.Matrix("x", new double[][] {{1, 2, 3, 4}})),
                digest(new Data.Matrix("x", new double[][] {{1, 2}, {3, 4}})),
                digest(new Data.Matrix("x", new double[][] {{1}, {2}, {3}, {4}})),
                digest(new Data.Vector("x", new double[] {1, 2, 3, Math.nextUp(4.0)})),
                digest(x, b),
                digest(b, x),
                digest(new Data.Vector("x", new double[] {0.0})),
                digest(new Data.Vector("x", new double[] {-0.0})),
                digest(new Data.Vector("x", new double[] {Double.NaN}))))
        .doesNotHaveDuplicates()
        .allMatch(digest -> digest.matches("[0-9a-f]{16}"));
  }

  @Test
  void takesEveryNanForTheSame() {
    assertThat(digest(new Data.Vector("x", new double[] {NAN_WITH_PAYLOAD})))
        .isEqualTo(digest(new Data.Vector("x", new double[] {Double.NaN})));
  }

  @Test
  void isThatOfTheParts() {
    Data.Part x = new Data.Vector("x", new double[] {1});
    Data data = () -> List.of(x);

    assertThat(DataDigest.of(data)).isEqualTo(digest(x));
  }

  private static String digest(Data.Part... parts) {
    return DataDigest.of(List.of(parts));
  }
}
