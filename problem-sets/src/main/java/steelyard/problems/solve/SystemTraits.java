package steelyard.problems.solve;

import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.Set;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactSums;
import steelyard.problems.solve.certificate.Definiteness;

/**
 * What is verified of a matrix: {@code symmetric}, {@code positive-definite} (symmetric as well,
 * and proved), {@code diagonally-dominant} (by rows, ties allowed), {@code upper-triangular} and
 * {@code lower-triangular}. A trait that is absent was refuted or could not be proved.
 */
final class SystemTraits {
  private SystemTraits() {}

  static Set<String> of(double[][] a) {
    Set<String> traits = new LinkedHashSet<>();
    if (isSymmetric(a)) {
      traits.add("symmetric");
      if (Definiteness.isProved(a)) {
        traits.add("positive-definite");
      }
    }
    if (isDiagonallyDominant(a)) {
      traits.add("diagonally-dominant");
    }
    if (isTriangular(a, true)) {
      traits.add("upper-triangular");
    }
    if (isTriangular(a, false)) {
      traits.add("lower-triangular");
    }
    return Collections.unmodifiableSet(traits);
  }

  private static boolean isSymmetric(double[][] a) {
    for (int i = 0; i < a.length; i++) {
      for (int j = 0; j < i; j++) {
        if (a[i][j] != a[j][i]) {
          return false;
        }
      }
    }
    return true;
  }

  private static boolean isDiagonallyDominant(double[][] a) {
    for (int i = 0; i < a.length; i++) {
      Dyadic twice = Dyadic.of(a[i][i]).abs().scalb(1);
      if (twice.compareTo(ExactSums.of(a[i]).absoluteSum()) < 0) {
        return false;
      }
    }
    return true;
  }

  private static boolean isTriangular(double[][] a, boolean upper) {
    for (int i = 0; i < a.length; i++) {
      for (int j = 0; j < i; j++) {
        if ((upper ? a[i][j] : a[j][i]) != 0) {
          return false;
        }
      }
    }
    return true;
  }
}
