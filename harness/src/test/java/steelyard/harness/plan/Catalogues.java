package steelyard.harness.plan;

import java.util.List;
import steelyard.harness.plan.Catalogue.FamilyEntry;
import steelyard.harness.plan.Catalogue.TaskEntry;
import steelyard.problems.Reach;

/** Catalogues that tests read plans against. */
final class Catalogues {

  /** Two tasks with one family of each kind. */
  static final Catalogue SMALL =
      new Catalogue(
          List.of(
              new TaskEntry(
                  "sum",
                  List.of(
                      new FamilyEntry("cancelling", Reach.upTo(1e32, 2, 1_000_000)),
                      new FamilyEntry("same-sign", Reach.uncontrolled(1, 1_000_000))),
                  List.of("recursive", "kahan", "pairwise")),
              new TaskEntry(
                  "solve",
                  List.of(
                      new FamilyEntry("spectrum", Reach.upTo(1e13, 1, 200)),
                      new FamilyEntry("hilbert", Reach.uncontrolled(2, 12))),
                  List.of("gepp", "cramer"))));

  private Catalogues() {}

  /** Three tasks with families of many reaches. */
  static Catalogue three() {
    List<FamilyEntry> sums =
        List.of(
            new FamilyEntry("same-sign", Reach.uncontrolled(1, 1_000_000)),
            new FamilyEntry("cancelling", Reach.upTo(1e60, 3, 1_000_000)),
            new FamilyEntry("exp-series", Reach.upTo(1e17, 8, 500)),
            new FamilyEntry("subnormal", Reach.uncontrolled(2, 200)),
            new FamilyEntry("depot-ledger", Reach.uncontrolled(1, 100_000)));
    return new Catalogue(
        List.of(
            new TaskEntry("sum", sums, List.of("recursive", "kahan")),
            new TaskEntry(
                "dot",
                List.of(
                    new FamilyEntry("cancelling", Reach.upTo(1e40, 6, 1_000_000)),
                    new FamilyEntry("same-sign", Reach.uncontrolled(1, 1_000_000))),
                List.of("naive", "fma")),
            new TaskEntry(
                "solve",
                List.of(
                    new FamilyEntry("spectrum-geometric", Reach.upTo(1e16, 2, 200)),
                    new FamilyEntry("badly-scaled", Reach.upTo(1e12, 2, 100)),
                    new FamilyEntry("hilbert", Reach.uncontrolled(2, 12))),
                List.of("gepp", "cramer"))));
  }
}
