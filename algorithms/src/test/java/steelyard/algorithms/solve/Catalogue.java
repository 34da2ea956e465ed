package steelyard.algorithms.solve;

import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import steelyard.algorithms.Candidate;

/** The candidates as test arguments; asserts nothing. */
final class Catalogue {

  /** The unit roundoff of binary64. */
  static final double U = 0x1p-53;

  private Catalogue() {}

  static Stream<Named<Candidate<LinearSolver>>> all() {
    return LinearSolvers.all().stream().map(candidate -> Named.of(candidate.id(), candidate));
  }

  /** Returns those that need no symmetry. */
  static Stream<Named<Candidate<LinearSolver>>> general() {
    return all().filter(named -> named.getPayload().scope().traits().isEmpty());
  }

  static Candidate<LinearSolver> candidate(String id) {
    return LinearSolvers.all().stream()
        .filter(candidate -> candidate.id().equals(id))
        .findFirst()
        .orElseThrow(() -> new AssertionError("no candidate " + id));
  }

  static double[] solve(String id, double[][] a, double[] b) {
    return candidate(id).kernel().solve(a, b);
  }
}
