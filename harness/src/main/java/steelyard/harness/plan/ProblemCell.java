package steelyard.harness.plan;

import java.util.List;
import java.util.OptionalDouble;

/**
 * One problem that a plan asks for, and who is weighed on it.
 *
 * @param weighing the first {@code [[weigh]]} entry that asks for it, counted from 0
 * @param task the id of the task
 * @param family the id of the family
 * @param condition the target condition number; empty for a family without a knob
 * @param size n
 * @param repeat its number among the problems alike, counted from 1
 * @param candidates the ids of the candidates, of every entry that asks for the problem
 * @param timeoutMs how long one call may take, in milliseconds: the longest of those entries
 */
public record ProblemCell(
    int weighing,
    String task,
    String family,
    OptionalDouble condition,
    int size,
    int repeat,
    List<String> candidates,
    int timeoutMs) {

  /** Copies the list. */
  public ProblemCell {
    candidates = List.copyOf(candidates);
  }

  /** Returns this cell, asked for by another entry as well. */
  ProblemCell mergedWith(ProblemCell later) {
    return new ProblemCell(
        weighing,
        task,
        family,
        condition,
        size,
        repeat,
        PlanCells.union(candidates, later.candidates),
        Math.max(timeoutMs, later.timeoutMs));
  }
}
