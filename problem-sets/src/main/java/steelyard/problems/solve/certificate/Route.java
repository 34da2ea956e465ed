package steelyard.problems.solve.certificate;

import java.util.Optional;

/** A way to an approximate inverse: an arithmetic and its precision. */
interface Route {
  /** Returns its name, as {@link CertifiedSolution#route()} gives it. */
  String name();

  /** Returns an approximate inverse; empty if the elimination broke down. */
  Optional<ApproximateInverse> invert(ScaledSystem system);
}
