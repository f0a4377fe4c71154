package millrace.analytics;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZonedDateTime;
import org.junit.jupiter.api.Test;

/** What the packages may know of, and that the rules know no clock and no chance. */
final class ArchitectureTest {
  private static final String EDGE = "millrace.analytics.(spark|command)..";

  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("millrace.analytics");

  @Test
  void onlyTheEdgeKnowsTheEngine() {
    noClasses()
        .that()
        .resideOutsideOfPackages("millrace.analytics.spark..", "millrace.analytics.command..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(
            "org.apache.spark..",
            "org.apache.hadoop..",
            "org.apache.parquet..",
            "scala..",
            "picocli..",
            "millrace.etl.spark..")
        .check(CLASSES);
  }

  @Test
  void nothingKnowsAFrameworkOrADatabase() {
    noClasses()
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(
            "org.springframework..", "com.vaadin..", "java.sql..", "javax.sql..", "org.duckdb..")
        .check(CLASSES);
  }

  @Test
  void onlyTheCommandLineKnowsItsLibrary() {
    noClasses()
        .that()
        .resideOutsideOfPackage("millrace.analytics.command..")
        .should()
        .dependOnClassesThat()
        .resideInAPackage("picocli..")
        .check(CLASSES);
  }

  @Test
  void rulesKnowNoClockAndNoChance() {
    noClasses()
        .that(DescribedPredicate.not(JavaClass.Predicates.resideInAPackage(EDGE)))
        .should()
        .callMethod(Instant.class, "now")
        .orShould()
        .callMethod(LocalDate.class, "now")
        .orShould()
        .callMethod(LocalDateTime.class, "now")
        .orShould()
        .callMethod(ZonedDateTime.class, "now")
        .orShould()
        .callMethod(System.class, "currentTimeMillis")
        .orShould()
        .callMethod(System.class, "nanoTime")
        .orShould()
        .callMethod(Math.class, "random")
        .orShould()
        .dependOnClassesThat()
        .haveNameMatching("java\\.util\\.(Random|SplittableRandom|concurrent\\.ThreadLocalRandom)")
        .check(CLASSES);
  }

  @Test
  void packagesHaveNoCycle() {
    slices().matching("millrace.analytics.(*)..").should().beFreeOfCycles().check(CLASSES);
  }

  @Test
  void publishedRowsAreRecordsOfPlainValues() {
    classes()
        .that()
        .resideInAPackage("millrace.analytics.mart")
        .and()
        .haveSimpleNameEndingWith("Row")
        .should()
        .beRecords()
        .check(CLASSES);
  }
}
