package steelyard.problems.solve;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.apache.commons.math3.fraction.BigFraction;

/** The errors of an answer in rational arithmetic, straight from their definitions. */
public record ExactErrors(LinearSystem system, BigFraction[] solution, double[] answer) {

  /** Returns the normwise backward error of Rigal and Gaches. */
  public BigFraction normwise() {
    BigFraction matrixNorm = BigFraction.ZERO;
    BigFraction residual = BigFraction.ZERO;
    for (int i = 0; i < answer.length; i++) {
      BigFraction sum = BigFraction.ZERO;
      for (double entry : system.a()[i]) {
        sum = sum.add(RationalInverse.exact(entry).abs());
      }
      matrixNorm = larger(matrixNorm, sum);
      residual = larger(residual, residual(i));
    }
    BigFraction size = matrixNorm.multiply(norm(answer)).add(norm(system.b()));
    return residual.divide(size);
  }

  /** Returns the componentwise backward error of Oettli and Prager. */
  public BigFraction componentwise() {
    BigFraction largest = BigFraction.ZERO;
    for (int i = 0; i < answer.length; i++) {
      BigFraction size = RationalInverse.exact(system.b()[i]).abs();
      for (int j = 0; j < answer.length; j++) {
        size = size.add(product(i, j).abs());
      }
      largest = larger(largest, residual(i).divide(size));
    }
    return largest;
  }

  /** Returns the forward error in the maximum norm. */
  public BigFraction forward() {
    BigFraction largest = BigFraction.ZERO;
    for (int i = 0; i < answer.length; i++) {
      largest = larger(largest, error(i));
    }
    return largest.divide(RationalInverse.norm(solution));
  }

  /** Returns the largest relative error of an entry. */
  public BigFraction worstEntry() {
    BigFraction largest = BigFraction.ZERO;
    for (int i = 0; i < answer.length; i++) {
      largest = larger(largest, error(i).divide(solution[i].abs()));
    }
    return largest;
  }

  BigFraction[] residuals() {
    return IntStream.range(0, answer.length).mapToObj(this::residual).toArray(BigFraction[]::new);
  }

  private BigFraction error(int i) {
    return RationalInverse.exact(answer[i]).subtract(solution[i]).abs();
  }

  private BigFraction residual(int i) {
    BigFraction residual = RationalInverse.exact(system.b()[i]);
    for (int j = 0; j < answer.length; j++) {
      residual = residual.subtract(product(i, j));
    }
    return residual.abs();
  }

  private BigFraction product(int i, int j) {
    return RationalInverse.exact(system.a()[i][j]).multiply(RationalInverse.exact(answer[j]));
  }

  private static BigFraction norm(double[] x) {
    return RationalInverse.norm(
        Arrays.stream(x).mapToObj(RationalInverse::exact).toArray(BigFraction[]::new));
  }

  private static BigFraction larger(BigFraction p, BigFraction q) {
    return p.compareTo(q) >= 0 ? p : q;
  }
}
