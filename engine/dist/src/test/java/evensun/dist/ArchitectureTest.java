package evensun.dist;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.GeneralCodingRules.NO_CLASSES_SHOULD_ACCESS_STANDARD_STREAMS;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The layers of the code, each with the reason why. Witness: the compiled classes themselves. */
class ArchitectureTest {

  private static JavaClasses code;

  @BeforeAll
  static void read() {
    code =
        new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("evensun");
  }

  /** A rule about nothing would hold whatever the code does. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "cli",
        "search",
        "spi",
        "result",
        "pluginhost",
        "report",
        "testkit",
        "transfermatrix",
        "effectivemedium",
        "externalprocess",
        "raytrace",
        "transfermatrix.kernel",
        "raytrace.kernel"
      })
  void everyPackageThatARuleNamesHoldsClasses(String name) {
    assertThat(code.that(resideInAPackage("evensun." + name)))
        .anyMatch(type -> !type.getSimpleName().equals("package-info"));
  }

  @Test
  void theSearchKnowsNoOptics() {
    noClasses()
        .that()
        .resideInAPackage("evensun.search..")
        .should()
        .dependOnClassesThat(
            resideInAPackage("evensun..").and(not(resideInAPackage("evensun.search.."))))
        .because("it searches whatever has numbers to vary and a value to raise")
        .check(code);
  }

  @Test
  void theContractNeedsTheJdkAlone() {
    classes()
        .that()
        .resideInAPackage("evensun.spi..")
        .should()
        .onlyDependOnClassesThat()
        .resideInAnyPackage("java..", "evensun.spi..")
        .because("a plugin sees nothing else of Evensun")
        .check(code);
  }

  @Test
  void theLawsNeedTheContractAlone() {
    classes()
        .that()
        .resideInAPackage("evensun.testkit")
        .should()
        .onlyDependOnClassesThat()
        .resideInAnyPackage("java..", "com.sun.management", "evensun.spi..", "evensun.testkit")
        .because("an author tries them on a solver without the rest of Evensun")
        .check(code);
  }

  @ParameterizedTest
  @ValueSource(strings = {"transfermatrix", "effectivemedium", "externalprocess", "raytrace"})
  void aSolverSeesTheContractAndItself(String name) {
    String own = "evensun." + name + "..";
    classes()
        .that()
        .resideInAPackage(own)
        .should()
        .onlyDependOnClassesThat(
            resideInAnyPackage("java..", "evensun.spi..", own)
                .or(not(resideInAnyPackage("evensun..", "org.pf4j.."))))
        .because("solvers that come with Evensun use what every author can use")
        .check(code);
  }

  @Test
  void onlyThePluginHostTouchesPf4j() {
    noClasses()
        .that()
        .resideOutsideOfPackage("evensun.pluginhost..")
        .should()
        .dependOnClassesThat()
        .resideInAPackage("org.pf4j..")
        .because("the rest asks for solvers, wherever they come from")
        .check(code);
    assertThat(code.that(resideInAPackage("evensun.pluginhost..")))
        .anyMatch(
            type ->
                type.getDirectDependenciesFromSelf().stream()
                    .anyMatch(d -> d.getTargetClass().getPackageName().equals("org.pf4j")));
  }

  @Test
  void kernelsKnowNoDomain() {
    classes()
        .that()
        .resideInAPackage("..kernel..")
        .should()
        .onlyDependOnClassesThat()
        .resideInAnyPackage("java.lang..", "java.util..", "..kernel..")
        .because("they work on arrays of numbers")
        .check(code);
  }

  @Test
  void standardStreamsBelongToTheCommandLine() {
    NO_CLASSES_SHOULD_ACCESS_STANDARD_STREAMS
        .because("standard output carries results alone")
        .check(code.that(not(resideInAPackage("evensun.cli.."))));
    assertThat(code.get("evensun.cli.Console").getAccessesFromSelf())
        .anyMatch(access -> access.getTargetOwner().getName().equals("java.lang.System"));
  }

  @Test
  void packagesHaveNoCycles() {
    slices()
        .matching("evensun.(**)")
        .should()
        .beFreeOfCycles()
        .because("a package can then be understood after those it uses")
        .check(code);
  }

  @Test
  void theReportIsMadeOfTheResultAlone() {
    noClasses()
        .that()
        .resideInAPackage("evensun.report..")
        .should()
        .dependOnClassesThat(
            resideInAPackage("evensun..")
                .and(not(resideInAnyPackage("evensun.report..", "evensun.result.."))))
        .because("a page can then be made again from the result file, years later")
        .check(code);
  }
}
