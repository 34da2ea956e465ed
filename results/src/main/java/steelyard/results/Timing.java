package steelyard.results;

import java.util.OptionalDouble;

/**
 * One candidate on one family and size: a row of {@code timings.csv}. What each column means, with
 * its unit, stands in the schema of that table.
 *
 * @param textbook the candidate to which the ratio compares, measured in the same run
 * @param ratio time over the textbook candidate's time
 * @param detail why there is no figure; empty where there is one
 */
public record Timing(
    String task,
    String family,
    String problem,
    String candidate,
    int size,
    OptionalDouble timeNs,
    OptionalDouble timeLowNs,
    OptionalDouble timeHighNs,
    OptionalDouble timePerElementNs,
    OptionalDouble allocatedBytes,
    String textbook,
    OptionalDouble ratio,
    OptionalDouble ratioLow,
    OptionalDouble ratioHigh,
    int forks,
    int warmupIterations,
    int measurementIterations,
    int iterationMs,
    String detail) {}
