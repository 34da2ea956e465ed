package steelyard.results.choice;

/**
 * A candidate that is not for some of the problems.
 *
 * @param count for how many it is not
 * @param problem one of them
 */
public record Inapplicable(String candidate, int count, String problem) {}
