package millrace.etl;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaCall;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.security.SecureRandom;
import java.time.Clock;
import java.util.Random;
import java.util.Set;
import java.util.UUID;
import java.util.concurrent.ThreadLocalRandom;
import org.junit.jupiter.api.Test;

class ArchitectureTest {
  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("millrace.etl");

  private static final String EDGE = "millrace.etl.spark..";

  private static final String[] FRAMEWORKS = {
    "org.apache.spark..",
    "org.apache.hadoop..",
    "scala..",
    "org.springframework..",
    "com.vaadin..",
    "java.sql..",
    "javax.sql..",
    "org.duckdb.."
  };

  private static final Set<String> CLOCK_CALLS = Set.of("now", "currentTimeMillis", "nanoTime");

  private static final DescribedPredicate<JavaCall<?>> READS_A_CLOCK_OR_CHANCE =
      DescribedPredicate.describe(
          "read a clock or chance",
          call -> {
            JavaClass owner = call.getTargetOwner();
            boolean clock =
                (owner.getPackageName().startsWith("java.time")
                        || owner.isEquivalentTo(System.class))
                    && CLOCK_CALLS.contains(call.getName());
            return clock
                || owner.isAssignableTo(Clock.class)
                || owner.isAssignableTo(Random.class)
                || owner.isEquivalentTo(SecureRandom.class)
                || owner.isEquivalentTo(ThreadLocalRandom.class)
                || (owner.isEquivalentTo(UUID.class) && call.getName().equals("randomUUID"))
                || (owner.isEquivalentTo(Math.class) && call.getName().equals("random"));
          });

  private static ArchRule frameworksAreFarFrom(String... allowed) {
    return noClasses()
        .that()
        .resideInAPackage("millrace.etl..")
        .and()
        .resideOutsideOfPackages(allowed)
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(FRAMEWORKS);
  }

  @Test
  void onlyTheEdgeKnowsAFramework() {
    frameworksAreFarFrom(EDGE).check(CLASSES);
  }

  @Test
  void theEdgeWouldBreakThatRule() {
    assertTrue(frameworksAreFarFrom("none").evaluate(CLASSES).hasViolation());
  }

  @Test
  void rulesReadNoClockAndNoChance() {
    noClasses()
        .that()
        .resideOutsideOfPackage(EDGE)
        .should()
        .callMethodWhere(READS_A_CLOCK_OR_CHANCE)
        .orShould()
        .callConstructorWhere(READS_A_CLOCK_OR_CHANCE)
        .check(CLASSES);
  }

  @Test
  void aCallOfAClockBreaksThatRule() {
    JavaClasses own = new ClassFileImporter().importClasses(ReadsTheClock.class);

    assertTrue(
        noClasses().should().callMethodWhere(READS_A_CLOCK_OR_CHANCE).evaluate(own).hasViolation());
  }

  @Test
  void packagesStandInNoCircle() {
    slices().matching("millrace.etl.(*)..").should().beFreeOfCycles().check(CLASSES);
  }

  /** What the rule of clocks is to find. */
  private static final class ReadsTheClock {
    static long now() {
      return java.time.Instant.now().getEpochSecond();
    }
  }
}
