package steelyard.harness.plan;

import java.util.List;
import java.util.OptionalDouble;

/**
 * One problem on which a plan asks for running times, and whose. It is the first repeat, at the
 * middle one of the entry's conditions: neither the easiest nor the hardest for a candidate whose
 * work depends on the data.
 *
 * @param weighing the first {@code [[weigh]]} entry that asks for it, counted from 0
 * @param task the id of the task
 * @param family the id of the family
 * @param condition the target condition number; empty for a family without a knob
 * @param size n
 * @param candidates the ids of the candidates, of every entry that asks for these times
 */
public record TimingCell(
    int weighing,
    String task,
    String family,
    OptionalDouble condition,
    int size,
    List<String> candidates) {

  /** Copies the list. */
  public TimingCell {
    candidates = List.copyOf(candidates);
  }

  /** Returns this cell, asked for by another entry as well. */
  TimingCell mergedWith(TimingCell later) {
    return new TimingCell(
        weighing, task, family, condition, size, PlanCells.union(candidates, later.candidates));
  }
}
