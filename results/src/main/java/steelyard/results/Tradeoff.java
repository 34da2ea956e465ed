package steelyard.results;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The errors of one candidate on one family and size beside its time: a row of {@code
 * tradeoffs.csv}. What each column means, with its unit, stands in the schema of that table.
 *
 * @param timedFamily the family on which the time was measured; usually one stands for all families
 *     of a size
 * @param onFrontier whether no other candidate of the row's family and size is both as accurate and
 *     as fast; empty where no time was measured
 */
public record Tradeoff(
    String task,
    String family,
    int size,
    String candidate,
    int problems,
    int failures,
    OptionalDouble worstForwardError,
    OptionalDouble medianForwardError,
    OptionalDouble worstBackwardError,
    OptionalDouble worstExcess,
    Optional<String> timedFamily,
    OptionalDouble timeNs,
    OptionalDouble timeLowNs,
    OptionalDouble timeHighNs,
    OptionalDouble ratio,
    OptionalDouble ratioLow,
    OptionalDouble ratioHigh,
    Optional<Boolean> onFrontier) {}
