package steelyard.harness.bring;

import java.lang.invoke.MethodHandles;
import java.util.function.Supplier;

/**
 * Gives access to the classes beside it. {@link CandidateLoader} defines it once more among the
 * classes of a candidate, because only from there can a direct call of the candidate be made.
 */
public final class Anchor implements Supplier<MethodHandles.Lookup> {

  /** Makes one. */
  public Anchor() {}

  @Override
  public MethodHandles.Lookup get() {
    return MethodHandles.lookup();
  }
}
