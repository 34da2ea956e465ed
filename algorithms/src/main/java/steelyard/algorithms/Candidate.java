package steelyard.algorithms;

import java.util.Objects;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * One implementation of a task.
 *
 * @param <K> the task's interface
 * @param id short name, lower case letters, digits and hyphens; unique within the task
 * @param kernel the implementation; it must not modify its input
 * @param description one line that says what it does
 * @param cost floating-point operations to leading order, as text
 * @param source where it was published, or which library it comes from
 * @param bound the a-priori error bound that it claims, if one is published
 * @param scope the problems that it is for
 * @param precisionBits the bits of the significand in which it computes: 53 for binary64, 24 for
 *     binary32; its unit roundoff is 2 to the power -precisionBits
 * @param dependsOnCores whether its answer legitimately depends on the number of processor cores
 */
public record Candidate<K>(
    String id,
    K kernel,
    String description,
    String cost,
    String source,
    Optional<Bound> bound,
    Scope scope,
    int precisionBits,
    boolean dependsOnCores) {

  /** The precision of {@code double}. */
  public static final int BINARY64 = 53;

  /** The precision of {@code float}. */
  public static final int BINARY32 = 24;

  private static final Pattern ID = Pattern.compile("[a-z0-9]+(-[a-z0-9]+)*");

  /**
   * Checks that nothing is missing.
   *
   * @throws IllegalArgumentException if the id is not lower case letters, digits and hyphens
   */
  public Candidate {
    Objects.requireNonNull(kernel, "kernel");
    Objects.requireNonNull(description, "description");
    Objects.requireNonNull(cost, "cost");
    Objects.requireNonNull(source, "source");
    Objects.requireNonNull(bound, "bound");
    Objects.requireNonNull(scope, "scope");
    if (!ID.matcher(id).matches()) {
      throw new IllegalArgumentException(
          "candidate id '" + id + "' must be lower case letters, digits and hyphens");
    }
  }

  /** Returns a candidate for every problem of its task, without a claimed bound. */
  public static <K> Candidate<K> of(
      String id, K kernel, String description, String cost, String source) {
    return new Candidate<>(
        id, kernel, description, cost, source, Optional.empty(), Scope.EVERYTHING, BINARY64, false);
  }

  /** Returns this candidate with a claimed bound. */
  public Candidate<K> claiming(Bound claimed) {
    return new Candidate<>(
        id,
        kernel,
        description,
        cost,
        source,
        Optional.of(claimed),
        scope,
        precisionBits,
        dependsOnCores);
  }

  /** Returns this candidate restricted to some problems. */
  public Candidate<K> within(Scope narrower) {
    return new Candidate<>(
        id, kernel, description, cost, source, bound, narrower, precisionBits, dependsOnCores);
  }

  /** Returns this candidate marked as one whose answer depends on the number of cores. */
  public Candidate<K> dependingOnCores() {
    return new Candidate<>(
        id, kernel, description, cost, source, bound, scope, precisionBits, true);
  }

  /** Returns this candidate marked as one that computes in another precision. */
  public Candidate<K> inPrecision(int bits) {
    return new Candidate<>(
        id, kernel, description, cost, source, bound, scope, bits, dependsOnCores);
  }
}
