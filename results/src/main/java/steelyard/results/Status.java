package steelyard.results;

import java.util.Locale;

/** What became of one candidate on one problem. */
public enum Status {
  /** The answer was judged. */
  OK,
  /** The answer is, or contains, a NaN. */
  NAN,
  /** The answer is, or contains, an infinity although the exact answer is finite. */
  INFINITE,
  /** The answer is null or has the wrong length, or what a program said is no answer. */
  MALFORMED,
  /** The candidate threw. */
  EXCEPTION,
  /** The JVM or the program in which the candidate ran ended during the call. */
  CRASHED,
  /** The candidate did not return in time. */
  TIMEOUT,
  /** The candidate changed its input. */
  MODIFIED_INPUT,
  /** Two calls on the same input gave different answers. */
  NONDETERMINISTIC,
  /** The reference is not sharp enough to tell the error. */
  UNCERTIFIED,
  /** The candidate says that it is not for this problem. */
  NOT_APPLICABLE;

  /** Returns the name as the tables have it, such as {@code modified-input}. */
  public String text() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /** Says whether this counts against the candidate. */
  public boolean isFailure() {
    return this != OK && this != UNCERTIFIED && this != NOT_APPLICABLE;
  }
}
