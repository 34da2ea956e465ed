package steelyard.harness.data;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import steelyard.problems.Data;

class PartsCopyTest {

  @Test
  void hasTheSameBits() {
    assertThat(PartsCopy.sameBits(PartsCopy.of(InputParts.awkward()), InputParts.awkward()))
        .isTrue();
  }

  @Test
  void sharesNoArray() {
    List<Data.Part> parts = InputParts.awkward();
    List<Data.Part> copy = PartsCopy.of(parts);
    ((Data.Matrix) copy.get(0)).rows()[1][2] = 7;
    ((Data.Vector) copy.get(1)).values()[0] = 7;

    assertThat(PartsCopy.sameBits(parts, InputParts.awkward())).isTrue();
    assertThat(PartsCopy.sameBits(parts, copy)).isFalse();
  }

  @Test
  void noticesASingleBit() {
    assertThat(same(vector(0.0), vector(-0.0))).isFalse();
    assertThat(same(vector(Double.NaN), vector(Double.longBitsToDouble(0x7ff8_0000_0000_0001L))))
        .isFalse();
    assertThat(same(vector(1, 2), vector(1, Math.nextUp(2.0)))).isFalse();
    assertThat(same(matrix(new double[] {1}), matrix(new double[] {-1}))).isFalse();
  }

  @Test
  void noticesOtherNamesAndShapes() {
    assertThat(same(vector(1), vector(1, 2))).isFalse();
    assertThat(same(vector(1), new Data.Vector("y", new double[] {1}))).isFalse();
    assertThat(same(vector(1), matrix(new double[] {1}))).isFalse();
    assertThat(same(matrix(new double[] {1}), vector(1))).isFalse();
    assertThat(same(matrix(new double[] {1}), matrix(new double[] {1}, new double[] {1})))
        .isFalse();
    assertThat(PartsCopy.sameBits(List.of(vector(1)), List.of())).isFalse();
  }

  private static boolean same(Data.Part left, Data.Part right) {
    return PartsCopy.sameBits(List.of(left), List.of(right));
  }

  private static Data.Part vector(double... values) {
    return new Data.Vector("x", values);
  }

  private static Data.Part matrix(double[]... rows) {
    return new Data.Matrix("x", rows);
  }
}
