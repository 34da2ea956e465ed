package steelyard.harness.plan;

import java.util.List;
import java.util.Optional;

/**
 * What one family contributes to a weighing: a problem for each condition, size and repeat; or one
 * problem alone, where it stands for files.
 *
 * @param family its id
 * @param conditions the target condition numbers; empty for a family without a knob, which
 *     contributes one problem for each size and repeat
 * @param sizes the sizes
 * @param files the files that it stands for, if it does
 */
public record FamilyShare(
    String family, List<Double> conditions, List<Integer> sizes, Optional<OwnFiles> files) {

  /** Copies the lists. */
  public FamilyShare {
    conditions = List.copyOf(conditions);
    sizes = List.copyOf(sizes);
  }

  /** Makes a share of a family that generates its problems. */
  public FamilyShare(String family, List<Double> conditions, List<Integer> sizes) {
    this(family, conditions, sizes, Optional.empty());
  }

  static FamilyShare of(OwnFiles files) {
    return new FamilyShare(
        files.source().familyId(), List.of(), List.of(files.size()), Optional.of(files));
  }

  /** Says whether its problems are generated, and not read from files. */
  boolean generated() {
    return files.isEmpty();
  }

  /** Says whether the target condition number is a knob of the family. */
  public boolean controlled() {
    return !conditions.isEmpty();
  }
}
