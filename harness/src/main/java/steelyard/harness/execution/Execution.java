package steelyard.harness.execution;

import java.util.List;
import steelyard.results.Observation;
import steelyard.results.Timing;

/**
 * What executing a plan gave.
 *
 * @param observations the rows of the accuracy phase
 * @param timings the rows of the timing phase; empty where the plan has none
 * @param complete whether nothing is missing
 * @param shortfall why something is missing, if it is
 * @param strayCalls how many calls never returned and still kept a processor busy during the timing
 */
public record Execution(
    List<Observation> observations,
    List<Timing> timings,
    boolean complete,
    String shortfall,
    int strayCalls) {}
