package steelyard.harness.plan;

/**
 * Something that a candidate must meet.
 *
 * @param task the id of the task
 * @param error the largest relative forward error that is acceptable
 * @param conditionUpTo the largest condition number for which it must hold
 * @param size the problem size for which it must hold
 */
public record Requirement(String task, double error, double conditionUpTo, int size) {}
