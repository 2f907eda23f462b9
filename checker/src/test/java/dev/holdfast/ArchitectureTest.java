package dev.holdfast;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaMethodCall;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import java.util.Set;

/** The arrows between the packages, and what no class may do. */
@AnalyzeClasses(
    packages = "dev.holdfast",
    importOptions = {ImportOption.DoNotIncludeTests.class})
class ArchitectureTest {
  @ArchTest
  static final ArchRule ARROWS_POINT_DOWN =
      layeredArchitecture()
          .consideringOnlyDependenciesInLayers()
          .layer("cli")
          .definedBy("dev.holdfast.cli..")
          .layer("report")
          .definedBy("dev.holdfast.report..")
          .layer("history")
          .definedBy("dev.holdfast.history..")
          .layer("check")
          .definedBy("dev.holdfast.check..")
          .layer("family")
          .definedBy("dev.holdfast.family..")
          .layer("plan")
          .definedBy("dev.holdfast.plan..")
          .layer("design")
          .definedBy("dev.holdfast.design..")
          .layer("numeric")
          .definedBy("dev.holdfast.numeric..")
          .whereLayer("cli")
          .mayNotBeAccessedByAnyLayer()
          .whereLayer("report")
          .mayOnlyBeAccessedByLayers("cli")
          .whereLayer("history")
          .mayOnlyBeAccessedByLayers("cli", "report")
          .whereLayer("check")
          .mayOnlyBeAccessedByLayers("cli", "report", "history")
          .whereLayer("family")
          .mayOnlyBeAccessedByLayers("check")
          .whereLayer("plan")
          .mayOnlyBeAccessedByLayers("cli", "report", "history", "check")
          .whereLayer("design")
          .mayOnlyBeAccessedByLayers("cli", "report", "check", "family")
          .whereLayer("numeric")
          .mayOnlyBeAccessedByLayers("design", "family");

  @ArchTest
  static final ArchRule NO_PACKAGES_IN_A_CIRCLE =
      slices().matching("dev.holdfast.(**)").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule CELLS_DO_NOT_KNOW_THE_CATALOGUE =
      noClasses()
          .that()
          .resideInAPackage("dev.holdfast.design..")
          .and()
          .resideOutsideOfPackage("dev.holdfast.design.catalogue")
          .should()
          .dependOnClassesThat()
          .resideInAPackage("dev.holdfast.design.catalogue");

  @ArchTest
  static final ArchRule DISTRIBUTIONS_COME_FROM_WHERE_THEIR_TAILS_ARE_RIGHT =
      noClasses()
          .should()
          .dependOnClassesThat()
          .resideInAPackage("org.apache.commons.math3.distribution..");

  @ArchTest
  static final ArchRule ONLY_MAIN_ENDS_THE_PROGRAM =
      noClasses()
          .that()
          .doNotHaveFullyQualifiedName("dev.holdfast.cli.Main")
          .should()
          .callMethod(System.class, "exit", int.class);

  @ArchTest
  static final ArchRule ONLY_MAIN_TOUCHES_THE_STANDARD_STREAMS =
      noClasses()
          .should()
          .accessField(System.class, "out")
          .orShould()
          .accessField(System.class, "err");

  @ArchTest
  static final ArchRule NO_STATE_IS_SHARED = fields().that().areStatic().should().beFinal();

  @ArchTest
  static final ArchRule NOTHING_READS_A_CLOCK =
      noClasses()
          .should()
          .callMethod(System.class, "currentTimeMillis")
          .orShould()
          .callMethod(System.class, "nanoTime")
          .orShould()
          .callMethod(java.time.LocalDate.class, "now");

  /** What of Math is exact, and so the same everywhere. */
  private static final Set<String> EXACT =
      Set.of(
          "abs",
          "addExact",
          "ceil",
          "copySign",
          "floor",
          "floorDiv",
          "floorMod",
          "fma",
          "getExponent",
          "max",
          "min",
          "multiplyExact",
          "nextDown",
          "nextUp",
          "rint",
          "round",
          "scalb",
          "signum",
          "sqrt",
          "subtractExact",
          "toIntExact",
          "ulp");

  private static final DescribedPredicate<JavaMethodCall> INEXACT_MATH =
      DescribedPredicate.describe(
          "a method of Math that may differ between machines",
          call ->
              call.getTargetOwner().isEquivalentTo(Math.class) && !EXACT.contains(call.getName()));

  @ArchTest
  static final ArchRule FUNCTIONS_ARE_THE_SAME_ON_EVERY_MACHINE =
      noClasses().should().callMethodWhere(INEXACT_MATH);
}
