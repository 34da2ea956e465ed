package steelyard.results.run;

import java.time.Instant;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * Where a run comes from: the content of {@code run.json}.
 *
 * @param toolVersion the version of the program that wrote the run
 * @param plan the name of the plan
 * @param seed the seed of the plan
 * @param ended when the last part of it was done; empty while it is not
 * @param complete whether every part of the plan was done
 * @param libraries the version of each library by its name
 * @param counts how many there are of what, such as observations and timings
 */
public record Provenance(
    String toolVersion,
    String plan,
    long seed,
    Instant started,
    Optional<Instant> ended,
    boolean complete,
    Jvm jvm,
    Machine machine,
    SortedMap<String, String> libraries,
    SortedMap<String, Long> counts) {

  /** Copies the maps, so that nobody changes them later. */
  public Provenance {
    libraries = sortedCopy(libraries);
    counts = sortedCopy(counts);
  }

  private static <V> SortedMap<String, V> sortedCopy(Map<String, V> map) {
    return Collections.unmodifiableSortedMap(new TreeMap<>(map));
  }

  /**
   * The virtual machine that ran the candidates.
   *
   * @param name of the virtual machine
   * @param flags its arguments, in their order
   */
  public record Jvm(String version, String vendor, String name, List<String> flags) {
    /** Copies the list. */
    public Jvm {
      flags = List.copyOf(flags);
    }
  }

  /**
   * The machine.
   *
   * @param cpu the model of its processor
   * @param cores how many the virtual machine may use
   * @param os the name and version of the operating system
   */
  public record Machine(String cpu, int cores, String os) {}
}
