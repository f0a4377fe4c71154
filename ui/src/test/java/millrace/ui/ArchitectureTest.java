package millrace.ui;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import org.junit.jupiter.api.Test;

class ArchitectureTest {
  private final JavaClasses classes =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("millrace.ui");

  @Test
  void nothingKnowsSpark() {
    noClasses()
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("org.apache.spark..", "millrace.analytics.spark..")
        .check(classes);
  }

  @Test
  void onlyTheReaderKnowsTheDatabase() {
    noClasses()
        .that()
        .resideOutsideOfPackage("millrace.ui.mart")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("java.sql..", "org.duckdb..")
        .check(classes);
  }
}
