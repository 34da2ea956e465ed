package steelyard.results;

/** How an answer sits among the doubles, as the problem judged it. */
public enum Rounding {
  /** Every entry is a double nearest to the exact one. */
  NEAREST,
  /** Every entry is one of the two doubles around the exact one, or equals it. */
  FAITHFUL,
  /** Neither, or it could not be proved. */
  OTHER
}
