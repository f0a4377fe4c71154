package millrace.sampledata;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import org.junit.jupiter.api.Test;

/** What the packages may know of. */
final class ArchitectureTest {
  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("millrace.sampledata");

  @Test
  void knowsNoEngineNoFrameworkNoDatabase() {
    noClasses()
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(
            "org.apache.spark..",
            "org.springframework..",
            "com.vaadin..",
            "java.sql..",
            "javax.sql..",
            "org.duckdb..")
        .check(CLASSES);
  }

  @Test
  void knowsNoOtherModule() {
    noClasses()
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("millrace.etl..", "millrace.analytics..", "millrace.ui..")
        .check(CLASSES);
  }

  @Test
  void onlyTheMainClassKnowsTheCommandLineLibraryAndTheClock() {
    noClasses()
        .that()
        .doNotHaveSimpleName("SampleDataMain")
        .should()
        .dependOnClassesThat()
        .resideInAPackage("picocli..")
        .orShould()
        .callMethod(System.class, "nanoTime")
        .orShould()
        .callMethod(System.class, "currentTimeMillis")
        .orShould()
        .callMethod(Math.class, "random")
        .check(CLASSES);
  }

  @Test
  void packagesHaveNoCycle() {
    slices().matching("millrace.sampledata.(*)..").should().beFreeOfCycles().check(CLASSES);
  }
}
