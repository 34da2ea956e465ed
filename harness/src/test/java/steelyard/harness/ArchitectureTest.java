package steelyard.harness;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** Holds the house: which room may know which. */
@AnalyzeClasses(packages = "steelyard", importOptions = ImportOption.DoNotIncludeTests.class)
final class ArchitectureTest {

  @ArchTest
  static final ArchRule algorithmsKnowOnlyThemselves =
      noClasses()
          .that()
          .resideInAPackage("steelyard.algorithms..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("steelyard.problems..", "steelyard.results..", "steelyard.harness..");

  @ArchTest
  static final ArchRule problemsKnowOnlyThemselves =
      noClasses()
          .that()
          .resideInAPackage("steelyard.problems..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "steelyard.algorithms..", "steelyard.results..", "steelyard.harness..");

  @ArchTest
  static final ArchRule resultsKnowOnlyThemselves =
      noClasses()
          .that()
          .resideInAPackage("steelyard.results..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage(
              "steelyard.algorithms..", "steelyard.problems..", "steelyard.harness..");

  /** Whatever lies below these packages belongs to one task, or is arithmetic that tasks share. */
  @ArchTest
  static final ArchRule tasksAreFoundByTheirBindingsAlone =
      noClasses()
          .that()
          .resideInAPackage("steelyard.harness..")
          .and()
          .resideOutsideOfPackage("steelyard.harness.task..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("steelyard.algorithms.*..", "steelyard.problems.*..");

  @ArchTest
  static final ArchRule onlyTheCommandLineKnowsTheCommandLine =
      noClasses()
          .that()
          .resideOutsideOfPackage("steelyard.harness.cli..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("steelyard.harness.cli..", "picocli..");

  @ArchTest
  static final ArchRule packagesFormNoCycles =
      slices().matching("steelyard.(*).(*)..").should().beFreeOfCycles();
}
