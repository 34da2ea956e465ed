package steelyard.harness.api;

import java.nio.file.Path;
import java.util.List;
import steelyard.algorithms.sum.Summation;
import steelyard.results.choice.Choice;
import steelyard.results.choice.Requirement;
import steelyard.results.run.Run;

/** The example of the README. */
final class Example {
  private Example() {}

  static Choice choose(Summation mine, Path folder) {
    // begin
    Steelyard steelyard = Steelyard.standard().with(Summation.class, "mine", mine).withoutTiming();
    Run run =
        steelyard.runText(
            """
            [[weigh]]
            task = "sum"
            families = ["cancelling"]
            candidates = ["recursive", "exact", "mine"]
            """);
    Steelyard.write(run, folder);
    run.verdicts()
        .forEach(verdict -> System.out.println(verdict.candidate() + ": " + verdict.grade()));
    return Steelyard.choose(run, new Requirement("sum", 1e-15, 1e12, 100, List.of(), List.of()));
    // end
  }
}
