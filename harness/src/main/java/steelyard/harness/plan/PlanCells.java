package steelyard.harness.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * Spreads a plan out into problems and timings. Entries may overlap: a problem that several ask for
 * is made once, for the candidates of all of them. Tasks and families come in the order in which
 * the plan first names them, then condition, size and repeat, each ascending.
 */
final class PlanCells {

  private final List<Weighing> weighings;

  PlanCells(List<Weighing> weighings) {
    this.weighings = weighings;
  }

  List<ProblemCell> problems() {
    Map<Object, ProblemCell> cells = new LinkedHashMap<>();
    for (int index = 0; index < weighings.size(); index++) {
      for (FamilyShare share : weighings.get(index).families()) {
        for (ProblemCell cell : problems(index, share)) {
          ProblemKey key =
              new ProblemKey(
                  cell.task(), cell.family(), cell.condition(), cell.size(), cell.repeat());
          cells.merge(key, cell, ProblemCell::mergedWith);
        }
      }
    }
    Map<FamilyKey, Integer> ranks = ranks();
    return cells.values().stream()
        .sorted(
            Comparator.<ProblemCell>comparingInt(
                    c -> ranks.get(new FamilyKey(c.task(), c.family())))
                .thenComparingDouble(c -> c.condition().orElse(0))
                .thenComparingInt(ProblemCell::size)
                .thenComparingInt(ProblemCell::repeat))
        .toList();
  }

  List<TimingCell> timings(TimingEffort effort) {
    Map<Object, TimingCell> cells = new LinkedHashMap<>();
    for (int index = 0; index < weighings.size(); index++) {
      for (TimingCell cell : timings(index, effort)) {
        TimingKey key = new TimingKey(cell.task(), cell.family(), cell.size());
        cells.merge(key, cell, TimingCell::mergedWith);
      }
    }
    Map<FamilyKey, Integer> ranks = ranks();
    return cells.values().stream()
        .sorted(
            Comparator.<TimingCell>comparingInt(c -> ranks.get(new FamilyKey(c.task(), c.family())))
                .thenComparingInt(TimingCell::size))
        .toList();
  }

  static List<String> union(List<String> left, List<String> right) {
    Set<String> all = new LinkedHashSet<>(left);
    all.addAll(right);
    return List.copyOf(all);
  }

  private List<ProblemCell> problems(int index, FamilyShare share) {
    Weighing weighing = weighings.get(index);
    List<ProblemCell> cells = new ArrayList<>();
    for (OptionalDouble condition : targets(share)) {
      for (int size : share.sizes()) {
        for (int repeat = 1; repeat <= weighing.repeats(share); repeat++) {
          cells.add(
              new ProblemCell(
                  index,
                  weighing.task(),
                  share.family(),
                  condition,
                  size,
                  repeat,
                  weighing.candidates(),
                  weighing.timeoutMs()));
        }
      }
    }
    return cells;
  }

  private List<TimingCell> timings(int index, TimingEffort effort) {
    Weighing weighing = weighings.get(index);
    List<TimingCell> cells = new ArrayList<>();
    if (weighing.time().isPresent()) {
      FamilyShare share = weighing.share(weighing.time().get());
      List<OptionalDouble> targets = targets(share);
      OptionalDouble middle = targets.get(targets.size() / 2);
      boolean ownSizes = effort.sizes().isEmpty() || !share.generated();
      for (int size : ownSizes ? share.sizes() : effort.sizes()) {
        cells.add(
            new TimingCell(
                index, weighing.task(), share.family(), middle, size, weighing.candidates()));
      }
    }
    return cells;
  }

  private static List<OptionalDouble> targets(FamilyShare share) {
    return share.controlled()
        ? share.conditions().stream().sorted().map(OptionalDouble::of).toList()
        : List.of(OptionalDouble.empty());
  }

  /** Tasks in the order of the plan, and within each its families in the order of the plan. */
  private Map<FamilyKey, Integer> ranks() {
    Map<String, Set<String>> families = new LinkedHashMap<>();
    for (Weighing weighing : weighings) {
      Set<String> known = families.computeIfAbsent(weighing.task(), t -> new LinkedHashSet<>());
      weighing.families().forEach(share -> known.add(share.family()));
    }
    Map<FamilyKey, Integer> ranks = new LinkedHashMap<>();
    families.forEach(
        (task, ids) -> ids.forEach(id -> ranks.put(new FamilyKey(task, id), ranks.size())));
    return ranks;
  }

  private record FamilyKey(String task, String family) {}

  private record TimingKey(String task, String family, int size) {}

  private record ProblemKey(
      String task, String family, OptionalDouble condition, int size, int repeat) {}
}
