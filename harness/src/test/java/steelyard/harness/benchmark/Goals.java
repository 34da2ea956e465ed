package steelyard.harness.benchmark;

import static steelyard.harness.benchmark.Goal.atMost;
import static steelyard.harness.benchmark.Goal.fasterBy;

import java.util.ArrayList;
import java.util.List;

/** The ratios of two kernels that the table shows. */
final class Goals {
  private Goals() {}

  static List<Goal> all() {
    List<Goal> goals = new ArrayList<>();
    for (String data :
        List.of("narrow/100000", "wide/100000", "narrow/10000000", "wide/10000000")) {
      goals.add(
          atMost(
              3, "exact sum " + data + " to naive loop", "sum-exact/" + data, "sum-naive/" + data));
      goals.add(
          fasterBy(
              100,
              "exact sum " + data + " against BigDecimal",
              "sum-exact/" + data,
              "sum-bigdecimal/" + data));
    }
    for (String n : List.of("1000", "10000", "100000", "1000000")) {
      String data = "narrow/" + n;
      goals.add(
          atMost(
              7, "exact dot " + data + " to naive loop", "dot-exact/" + data, "dot-naive/" + data));
      goals.add(
          fasterBy(
              80,
              "exact dot " + data + " against BigDecimal",
              "dot-exact/" + data,
              "dot-bigdecimal/" + data));
    }
    goals.add(
        atMost(
            7,
            "exact dot wide/100000 to naive loop",
            "dot-exact/wide/100000",
            "dot-naive/wide/100000"));
    for (String n : List.of("100", "200", "500", "1000")) {
      goals.add(solve(15, "spectrum-geometric/1e10/" + n));
    }
    for (String n : List.of("100", "200")) {
      goals.add(
          fasterBy(
              100,
              "certified solve " + n + " against 60-digit elimination",
              "solve-certified/spectrum-geometric/1e10/" + n,
              "solve-bigdecimal/spectrum-geometric/1e10/" + n));
    }
    goals.add(solve(150, "spectrum-geometric/1e14/200"));
    for (String kappa : List.of("1e17", "1e20", "1e24", "1e28")) {
      goals.add(solve(150, "nearly-dependent/" + kappa + "/200"));
    }
    goals.add(
        fasterBy(
            1,
            "exact rational solution of 200 equations against 60-digit elimination",
            "solve-rational/spectrum-geometric/1e10/200",
            "solve-bigdecimal/spectrum-geometric/1e10/200"));
    for (String n : List.of("100", "200", "500")) {
      goals.add(
          atMost(
              1,
              "prescribed spectrum " + n + " to LU",
              "make-reflected/" + n,
              "solve-lu/spectrum-geometric/1e10/" + n));
    }
    goals.add(
        fasterBy(
            12, "cancelling dot product against BigDecimal", "make-dot", "make-dot-bigdecimal"));
    goals.add(
        atMost(1.5, "accuracy phase to its candidates and references", "phase/1", "phase-parts"));
    goals.add(fasterBy(1.7, "accuracy phase on two threads against one", "phase/2", "phase/1"));
    return goals;
  }

  private static Goal solve(double limit, String system) {
    return atMost(
        limit,
        "certified solve " + system + " to LU",
        "solve-certified/" + system,
        "solve-lu/" + system);
  }
}
