package steelyard.harness.export;

import java.util.OptionalDouble;
import steelyard.problems.Problem;

/**
 * A problem with what is needed to make it again.
 *
 * @param id its id, such as {@code sum/cancelling/k1e12/n1000/r3}
 * @param task the id of the task
 * @param family the id of the family
 * @param targetCondition the target condition number; empty for a family without a knob
 * @param seed the seed of the plan that it belongs to
 * @param problem the problem
 */
public record ExportedProblem(
    String id,
    String task,
    String family,
    OptionalDouble targetCondition,
    long seed,
    Problem<?> problem) {}
