package steelyard.harness.plan;

import java.util.List;
import steelyard.harness.data.DoubleText;
import steelyard.results.text.NearestName;

/**
 * Reads what each family contributes to an entry: its conditions and sizes. A family that the entry
 * names must reach everything that is asked of it. Families that it leaves to the default all take
 * part, each with what it can reach: the conditions up to its largest, and the sizes nearest to
 * those asked for.
 */
final class ShareReader {

  static final int MAX_SIZE = 10_000_000;

  private static final String CONDITIONS = "conditions";
  private static final String SIZES = "sizes";
  private static final List<Integer> DEFAULT_SIZES = List.of(100);
  private static final List<Double> DEFAULT_CONDITIONS =
      List.of(1.0, 1e4, 1e8, 1e12, 1e16, 1e24, 1e32);

  private final PlanTable table;
  private final String task;
  private final List<Catalogue.FamilyEntry> families;
  private final boolean named;

  /**
   * Makes a reader of an entry.
   *
   * @param table the entry
   * @param task the id of its task
   * @param families the families that take part
   * @param named whether the entry names them
   */
  ShareReader(PlanTable table, String task, List<Catalogue.FamilyEntry> families, boolean named) {
    this.table = table;
    this.task = task;
    this.families = families;
    this.named = named;
  }

  List<FamilyShare> shares() {
    checkCommonConditions();
    checkCommonSizes();
    checkFamilies(CONDITIONS, families.stream().filter(f -> f.reach().controlled()).toList());
    checkFamilies(SIZES, families);
    return families.stream().map(this::share).toList();
  }

  private FamilyShare share(Catalogue.FamilyEntry family) {
    List<Integer> sizes = sizes(family);
    return new FamilyShare(family.id(), conditions(family, sizes), sizes);
  }

  static String sizeOutOfReach(String task, Catalogue.FamilyEntry family, int size) {
    return "size "
        + size
        + " is out of reach of family '"
        + family.id()
        + "' of task '"
        + task
        + "', which makes sizes from "
        + family.reach().minSize()
        + " to "
        + family.reach().maxSize();
  }

  private List<Double> conditions(Catalogue.FamilyEntry family, List<Integer> sizes) {
    if (!family.reach().controlled()) {
      return List.of();
    }
    if (hasOwn(CONDITIONS, family)) {
      PlanTable own = table.table(CONDITIONS);
      return reachable(own, family.id(), conditionList(own, family.id()), family, sizes);
    }
    boolean common = hasCommon(CONDITIONS);
    List<Double> wanted = common ? conditionList(table, CONDITIONS) : DEFAULT_CONDITIONS;
    if (common && named) {
      return reachable(table, CONDITIONS, wanted, family, sizes);
    }
    List<Double> within = wanted.stream().filter(c -> family.makes(c, sizes)).toList();
    return within.isEmpty() ? List.of(most(family, sizes)) : within;
  }

  private List<Integer> sizes(Catalogue.FamilyEntry family) {
    if (hasOwn(SIZES, family)) {
      PlanTable own = table.table(SIZES);
      return reachableSizes(own, family.id(), sizeList(own, family.id()), family);
    }
    boolean common = hasCommon(SIZES);
    List<Integer> wanted = common ? sizeList(table, SIZES) : DEFAULT_SIZES;
    return common && named
        ? reachableSizes(table, SIZES, wanted, family)
        : wanted.stream().map(family::nearestSize).distinct().toList();
  }

  private List<Double> reachable(
      PlanTable at,
      String key,
      List<Double> wanted,
      Catalogue.FamilyEntry family,
      List<Integer> sizes) {
    for (double condition : wanted) {
      if (!family.makes(condition, sizes)) {
        throw at.fail(key, conditionOutOfReach(family, condition, sizes));
      }
    }
    return wanted;
  }

  private static double most(Catalogue.FamilyEntry family, List<Integer> sizes) {
    return sizes.stream().mapToDouble(family.reach()::maxConditionAt).min().orElseThrow();
  }

  private List<Integer> reachableSizes(
      PlanTable at, String key, List<Integer> wanted, Catalogue.FamilyEntry family) {
    for (int size : wanted) {
      if (!family.makes(size)) {
        throw at.fail(key, sizeOutOfReach(task, family, size));
      }
    }
    return wanted;
  }

  private String conditionOutOfReach(
      Catalogue.FamilyEntry family, double condition, List<Integer> sizes) {
    double most = most(family, sizes);
    String atSize =
        most < family.reach().maxCondition()
            ? " at size " + sizes.stream().min(Integer::compare).orElseThrow()
            : "";
    return "condition "
        + DoubleText.shortest(condition)
        + " is out of reach of family '"
        + family.id()
        + "' of task '"
        + task
        + "', which reaches conditions from 1 to "
        + DoubleText.shortest(most)
        + atSize;
  }

  /** What no family at all can reach is a mistake, even where the families are left open. */
  private void checkCommonConditions() {
    List<Catalogue.FamilyEntry> controlled =
        families.stream().filter(family -> family.reach().controlled()).toList();
    for (double condition :
        hasCommon(CONDITIONS) ? conditionList(table, CONDITIONS) : List.<Double>of()) {
      if (!named
          && !controlled.isEmpty()
          && controlled.stream().noneMatch(f -> f.makes(condition, sizes(f)))) {
        double most =
            controlled.stream().mapToDouble(f -> f.reach().maxCondition()).max().orElseThrow();
        throw table.fail(
            CONDITIONS,
            "condition "
                + DoubleText.shortest(condition)
                + " is out of reach of every family of task '"
                + task
                + "'; the widest reaches "
                + DoubleText.shortest(most));
      }
    }
  }

  private void checkCommonSizes() {
    for (int size : hasCommon(SIZES) ? sizeList(table, SIZES) : List.<Integer>of()) {
      if (!named && families.stream().noneMatch(family -> family.makes(size))) {
        throw table.fail(
            SIZES, "size " + size + " is out of reach of every family of task '" + task + "'");
      }
    }
  }

  private void checkFamilies(String key, List<Catalogue.FamilyEntry> takers) {
    List<String> known = takers.stream().map(Catalogue.FamilyEntry::id).toList();
    for (String family : table.hasTable(key) ? table.table(key).keys() : List.<String>of()) {
      if (!known.contains(family)) {
        throw table
            .table(key)
            .fail(
                family,
                "'"
                    + key
                    + "' are set for '"
                    + family
                    + "', which is no family of this entry that takes any; "
                    + NearestName.hint(family, known));
      }
    }
  }

  private boolean hasOwn(String key, Catalogue.FamilyEntry family) {
    return table.hasTable(key) && table.table(key).has(family.id());
  }

  private boolean hasCommon(String key) {
    return table.has(key) && !table.hasTable(key);
  }

  private static List<Double> conditionList(PlanTable at, String key) {
    List<Double> conditions = at.numbers(key);
    for (double condition : conditions) {
      if (condition < 1) {
        throw at.fail(
            key,
            "a condition number is 1 or more, found "
                + DoubleText.shortest(condition)
                + " in '"
                + key
                + "'");
      }
    }
    return conditions;
  }

  private static List<Integer> sizeList(PlanTable at, String key) {
    return at.wholeNumbers(key, 1, MAX_SIZE);
  }
}
