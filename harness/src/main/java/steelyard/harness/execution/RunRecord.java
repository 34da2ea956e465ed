package steelyard.harness.execution;

import java.time.Instant;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import steelyard.harness.bring.Origin;
import steelyard.harness.plan.Addition;
import steelyard.harness.plan.Plan;
import steelyard.results.run.Provenance;

/** Collects what a run records of where it comes from. */
public final class RunRecord {

  private RunRecord() {}

  /** Returns the record of a run. */
  public static Provenance of(Plan plan, Execution execution, Instant started, Instant ended) {
    TreeMap<String, Long> counts = new TreeMap<>();
    counts.put("observations", (long) execution.observations().size());
    counts.put("timings", (long) execution.timings().size());
    counts.put("problems_planned", (long) plan.problems().size());
    return new Provenance(
        ProgramVersion.text(),
        plan.name(),
        plan.seed(),
        started,
        Optional.of(ended),
        execution.complete(),
        new Provenance.Jvm(
            System.getProperty("java.version"),
            System.getProperty("java.vendor"),
            System.getProperty("java.vm.name"),
            Machine.flags()),
        new Provenance.Machine(Machine.processor(), Machine.cores(), Machine.operatingSystem()),
        libraries(plan),
        counts);
  }

  private static SortedMap<String, String> libraries(Plan plan) {
    SortedMap<String, String> libraries = new TreeMap<>(Libraries.versions());
    for (Addition addition : plan.additions()) {
      libraries.put(addition.task() + ":" + addition.id(), Origin.of(addition));
    }
    return libraries;
  }
}
