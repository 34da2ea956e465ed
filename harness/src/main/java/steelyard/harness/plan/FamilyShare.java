package steelyard.harness.plan;

import java.util.List;

/**
 * What one family contributes to a weighing: a problem for each condition, size and repeat.
 *
 * @param family its id
 * @param conditions the target condition numbers; empty for a family without a knob, which
 *     contributes one problem for each size and repeat
 * @param sizes the sizes
 */
public record FamilyShare(String family, List<Double> conditions, List<Integer> sizes) {

  /** Copies the lists. */
  public FamilyShare {
    conditions = List.copyOf(conditions);
    sizes = List.copyOf(sizes);
  }

  /** Says whether the target condition number is a knob of the family. */
  public boolean controlled() {
    return !conditions.isEmpty();
  }
}
