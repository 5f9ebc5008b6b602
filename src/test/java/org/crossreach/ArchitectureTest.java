package org.crossreach;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption.DoNotIncludeTests;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.Architectures.LayeredArchitecture;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * Data go one way through the packages, and no package knows one that comes after it; only the
 * command line prints and ends the program.
 */
@AnalyzeClasses(packages = "org.crossreach", importOptions = DoNotIncludeTests.class)
class ArchitectureTest {

  private static final String ROOT = "org.crossreach.";

  /** The packages from the recorded samples to the reader, each knowing those before it. */
  private static final List<String> STAGES =
      List.of(
          "screen",
          "motion",
          "section",
          "profile",
          "discharge",
          "agreement",
          "evidence",
          "report",
          "archive",
          "cli");

  @ArchTest static final ArchRule arrowsPointOneWay = arrows();

  @ArchTest
  static final ArchRule packagesHaveNoCycles =
      slices().matching(ROOT + "(*)..").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule onlyTheCommandLinePrints =
      noClasses()
          .that(not(resideInAPackage(ROOT + "cli")))
          .should()
          .accessField(System.class, "out")
          .orShould()
          .accessField(System.class, "err")
          .orShould()
          .accessField(java.io.FileDescriptor.class, "out")
          .orShould()
          .accessField(java.io.FileDescriptor.class, "err")
          .orShould()
          .callMethod(Throwable.class, "printStackTrace");

  @ArchTest
  static final ArchRule onlyTheMainClassEndsTheProgram =
      noClasses()
          .that()
          .doNotHaveFullyQualifiedName(ROOT + "cli.Crossreach")
          .should()
          .callMethod(System.class, "exit", int.class)
          .orShould()
          .callMethod(Runtime.class, "exit", int.class)
          .orShould()
          .callMethod(Runtime.class, "halt", int.class);

  @ArchTest
  static final ArchRule namesSayWhatAClassIs =
      noClasses()
          .should()
          .haveNameMatching(".*(Utils?|Helpers?|Common|Managers?)(\\$.*)?")
          .orShould()
          .resideInAnyPackage("..utils..", "..util..", "..helpers..", "..common..", "..managers..");

  @ArchTest
  static final ArchRule onlyTheCommandLineKnowsPicocli =
      noClasses()
          .that(not(resideInAPackage(ROOT + "cli")))
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("picocli..", "me.tongfei..");

  @ArchTest
  static void everyPackageExplainsItself(JavaClasses classes) {
    Path sources = Path.of("src", "main", "java");
    for (var inside : classes.getPackage("org.crossreach").getSubpackages()) {
      Path folder = sources.resolve(inside.getName().replace('.', '/'));
      assertTrue(
          Files.exists(folder.resolve("package-info.java")), folder + " has no package-info.java");
    }
  }

  /** The arrows of the way of the data; packages that do not exist yet are allowed. */
  private static LayeredArchitecture arrows() {
    LayeredArchitecture arrows =
        layeredArchitecture().consideringOnlyDependenciesInLayers().withOptionalLayers(true);
    for (String each : List.of("survey", "settings", "ingest", "simulate")) {
      arrows = arrows.layer(each).definedBy(ROOT + each + "..");
    }
    for (String stage : STAGES) {
      arrows = arrows.layer(stage).definedBy(ROOT + stage + "..");
    }
    arrows =
        arrows
            .whereLayer("survey")
            .mayNotAccessAnyLayer()
            .whereLayer("settings")
            .mayNotAccessAnyLayer()
            .whereLayer("ingest")
            .mayOnlyAccessLayers("survey", "settings")
            .whereLayer("simulate")
            .mayOnlyAccessLayers("survey", "ingest")
            .whereLayer("ingest")
            .mayOnlyBeAccessedByLayers("simulate", "archive", "cli")
            .whereLayer("simulate")
            .mayOnlyBeAccessedByLayers("cli");
    for (int i = 0; i < STAGES.size(); i++) {
      List<String> later = STAGES.subList(i + 1, STAGES.size());
      arrows =
          later.isEmpty()
              ? arrows.whereLayer(STAGES.get(i)).mayNotBeAccessedByAnyLayer()
              : arrows
                  .whereLayer(STAGES.get(i))
                  .mayOnlyBeAccessedByLayers(later.toArray(String[]::new));
    }
    return arrows;
  }
}
