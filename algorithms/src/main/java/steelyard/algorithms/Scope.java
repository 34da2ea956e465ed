package steelyard.algorithms;

import java.util.Set;

/**
 * The problems that a candidate is for. Elsewhere it is not applicable, which is no failure.
 *
 * @param traits what must be true of the input, each a short phrase such as {@code
 *     positive-definite}; a problem carries the traits that were verified for it
 * @param maxSize the largest problem size that it is for
 */
public record Scope(Set<String> traits, int maxSize) {

  /** Every problem of the task. */
  public static final Scope EVERYTHING = new Scope(Set.of(), Integer.MAX_VALUE);

  /** Copies the traits. */
  public Scope {
    traits = Set.copyOf(traits);
  }

  /** Returns the scope of problems that have all these traits. */
  public static Scope requiring(String... traits) {
    return new Scope(Set.of(traits), Integer.MAX_VALUE);
  }

  /** Returns the scope of problems of at most this size. */
  public static Scope upTo(int maxSize) {
    return new Scope(Set.of(), maxSize);
  }

  /** Says whether a problem with these traits and this size is inside the scope. */
  public boolean covers(Set<String> problemTraits, int size) {
    return size <= maxSize && problemTraits.containsAll(traits);
  }
}
