package steelyard.junit;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** On which problems a kernel is tried; what is not said is left to the defaults of plans. */
record Trial(
    List<String> families,
    OptionalDouble largestCondition,
    List<Integer> sizes,
    int repeats,
    long seed,
    long timeoutMs) {
  private static final double CONDITION_STEP = 100;

  static final Trial STANDARD =
      new Trial(List.of(), OptionalDouble.empty(), List.of(), 3, 1, 10_000);

  Trial onFamilies(List<String> wanted) {
    return new Trial(wanted, largestCondition, sizes, repeats, seed, timeoutMs);
  }

  Trial upToCondition(double condition) {
    if (!(condition >= 1)) {
      throw new IllegalArgumentException(
          "the largest condition number must be at least 1, found " + condition);
    }
    return new Trial(families, OptionalDouble.of(condition), sizes, repeats, seed, timeoutMs);
  }

  Trial ofSizes(int... wanted) {
    return new Trial(
        families,
        largestCondition,
        Arrays.stream(wanted).boxed().toList(),
        repeats,
        seed,
        timeoutMs);
  }

  Trial withRepeats(int wanted) {
    return new Trial(families, largestCondition, sizes, wanted, seed, timeoutMs);
  }

  Trial withSeed(long wanted) {
    return new Trial(families, largestCondition, sizes, repeats, wanted, timeoutMs);
  }

  Trial withTimeout(Duration timeout) {
    return new Trial(families, largestCondition, sizes, repeats, seed, timeout.toMillis());
  }

  /** Returns the plan that tries candidates of a task on these problems. */
  String plan(String task, List<String> candidates) {
    StringBuilder plan = new StringBuilder("name = \"accuracy\"\n");
    plan.append("seed = ").append(seed).append("\n[[weigh]]\n");
    plan.append("task = \"").append(task).append("\"\n");
    plan.append("candidates = ").append(quoted(candidates)).append('\n');
    if (!families.isEmpty()) {
      plan.append("families = ").append(quoted(families)).append('\n');
    }
    if (largestCondition.isPresent()) {
      plan.append("conditions = ").append(conditions(largestCondition.getAsDouble())).append('\n');
    }
    if (!sizes.isEmpty()) {
      plan.append("sizes = ").append(sizes).append('\n');
    }
    plan.append("repeats = ").append(repeats).append('\n');
    plan.append("timeout_ms = ").append(timeoutMs).append('\n');
    return plan.toString();
  }

  private static List<String> conditions(double largest) {
    List<String> conditions = new ArrayList<>();
    for (double condition = 1; condition < largest; condition *= CONDITION_STEP) {
      conditions.add(String.format(Locale.ROOT, "%e", condition));
    }
    conditions.add(String.format(Locale.ROOT, "%e", largest));
    return conditions;
  }

  private static String quoted(List<String> names) {
    return names.stream()
        .map(name -> "\"" + name.replace("\\", "\\\\").replace("\"", "\\\"") + "\"")
        .collect(Collectors.joining(", ", "[", "]"));
  }

  /** Returns what was tried, for a message. */
  String text() {
    return (families.isEmpty() ? "all families" : String.join(", ", families))
        + (largestCondition.isPresent()
            ? ", condition numbers up to " + largestCondition.getAsDouble()
            : "")
        + (sizes.isEmpty()
            ? ""
            : ", n = " + sizes.stream().map(String::valueOf).collect(Collectors.joining(", ")))
        + ", seed "
        + seed;
  }
}
