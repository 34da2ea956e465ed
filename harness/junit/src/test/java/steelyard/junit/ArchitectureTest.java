package steelyard.junit;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** Holds what the assertions may know. */
@AnalyzeClasses(packages = "steelyard.junit", importOptions = ImportOption.DoNotIncludeTests.class)
final class ArchitectureTest {

  @ArchTest
  static final ArchRule aNewTaskNeedsNothingHere =
      noClasses()
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("steelyard.algorithms.*..", "steelyard.problems.*..");

  @ArchTest
  static final ArchRule noTimesAndNoCommandsAreWanted =
      noClasses()
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("steelyard.harness.timing..", "steelyard.harness.cli..", "picocli..");
}
