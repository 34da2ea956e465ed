package steelyard.results;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SortedMap;
import java.util.TreeMap;
import steelyard.results.run.Provenance;
import steelyard.results.run.Run;

/** An invented run of two tasks, small enough to read and with one of everything. */
public final class SampleRun {
  private static final double U = 0x1p-53;
  private static final String[] FAMILIES = {"positive", "cancelling", "overflow"};
  private static final double[] CONDITIONS = {1, 1e8, 1e4};

  private SampleRun() {}

  /** Returns the run. */
  public static Run run() {
    return Run.of(observations(), timings(), "name = \"sample\"\nseed = 42\n", provenance());
  }

  /** Returns the observations of the run. */
  public static List<Observation> observations() {
    List<Observation> rows = new ArrayList<>();
    for (int f = 0; f < FAMILIES.length; f++) {
      for (int repeat = 0; repeat < 2; repeat++) {
        double condition = CONDITIONS[f] * (1 + repeat / 8.0);
        boolean overflow = FAMILIES[f].equals("overflow");
        rows.add(sum(f, repeat, condition, "naive", 20 * U, overflow ? Status.NAN : Status.OK));
        rows.add(sum(f, repeat, condition, "kahan", 1.5 * U, Status.OK));
        rows.add(sum(f, repeat, condition, "careless", 1e6 * U, Status.OK));
      }
    }
    for (int repeat = 0; repeat < 2; repeat++) {
      ObservationBuilder solve = new ObservationBuilder().size(10).repeat(repeat).condition(1e5);
      rows.add(solve.at("solve", "random", "lu").forward(1e4 * U).backward(2 * U).build());
      rows.add(solve.at("solve", "random", "cholesky").status(Status.NOT_APPLICABLE).build());
    }
    return rows;
  }

  private static Observation sum(
      int family, int repeat, double condition, String candidate, double eta, Status status) {
    return new ObservationBuilder()
        .at("sum", FAMILIES[family], candidate)
        .repeat(repeat)
        .condition(condition)
        .backward(eta)
        .forward(eta * condition)
        .claim(100 * U * condition, eta <= 100 * U)
        .status(status)
        .build();
  }

  /** Returns the timings of the run. */
  public static List<Timing> timings() {
    return List.of(
        timing("sum", "positive", "naive", 100, 80, 1),
        timing("sum", "positive", "kahan", 100, 320, 4),
        timing("sum", "positive", "careless", 100, 79.9, 0.99875),
        timing("solve", "random", "lu", 10, 4000, 1));
  }

  /** Returns a timing with an interval of one per cent to either side. */
  public static Timing timing(
      String task, String family, String candidate, int size, double ns, double ratio) {
    return new Timing(
        task,
        family,
        task + "/" + family + "/n" + size + "/r0",
        candidate,
        size,
        OptionalDouble.of(ns),
        OptionalDouble.of(ns * 0.99),
        OptionalDouble.of(ns * 1.01),
        OptionalDouble.of(task.equals("sum") ? ns / size : ns),
        OptionalDouble.of(0),
        task.equals("sum") ? "naive" : "lu",
        OptionalDouble.of(ratio),
        OptionalDouble.of(ratio * 0.98),
        OptionalDouble.of(ratio * 1.02),
        3,
        5,
        5,
        200,
        "");
  }

  /** Returns where the run comes from. */
  public static Provenance provenance() {
    SortedMap<String, String> libraries = new TreeMap<>();
    libraries.put("jmh-core", "1.37");
    libraries.put("commons-csv", "1.14.1");
    SortedMap<String, Long> counts = new TreeMap<>();
    counts.put("observations", 22L);
    counts.put("timings", 4L);
    return new Provenance(
        "0.1.0",
        "sample",
        42,
        Instant.parse("2026-03-01T22:15:30Z"),
        Optional.of(Instant.parse("2026-03-01T22:16:00.250Z")),
        true,
        new Provenance.Jvm("17.0.1", "Invented", "Invented Server VM", List.of("-Xmx1g")),
        new Provenance.Machine("Invented CPU", 2, "Invented OS 1.0"),
        libraries,
        counts);
  }
}
