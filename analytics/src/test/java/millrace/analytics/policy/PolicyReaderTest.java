package millrace.analytics.policy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Every setting is read, and defaults are those of the methods. */
final class PolicyReaderTest {
  @TempDir private Path folder;

  private Policy read(String text) {
    try {
      return PolicyReader.read(Files.writeString(folder.resolve("policy.yaml"), text));
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }

  private static Set<String> keys() {
    return PolicyReader.defaults().settings().keySet();
  }

  /** Everything the rules see; not the settings as written. */
  private static List<Object> effective(Policy policy) {
    return List.of(
        policy.line(),
        policy.baseline(),
        policy.criteria(),
        policy.episode(),
        policy.cohort(),
        policy.exposure(),
        policy.pressure());
  }

  @Test
  void defaultTextReadsBackToTheDefaults() {
    assertEquals(PolicyReader.defaults(), read(PolicyReader.defaultText()));
  }

  @Test
  void emptyFileIsTheDefaults() {
    assertEquals(PolicyReader.defaults(), read("# nothing of our own\n"));
  }

  @ParameterizedTest
  @MethodSource("keys")
  void anotherValueOfEverySettingReachesTheRules(String key) {
    String value = PolicyReader.defaults().settings().get(key);

    assertNotEquals(
        effective(PolicyReader.defaults()), effective(read(key + ": " + other(key, value))));
  }

  private static String other(String key, String value) {
    if (value.startsWith("{")) {
      return "{critical-care: 17 s, elsewhere: 19 s}";
    }
    if (value.startsWith("[")) {
      return "[X1]";
    }
    if (value.matches("\\d+")) {
      return value + "1";
    }
    if (value.matches("\\d+ (s|min|h|d)")) {
      return "17 s";
    }
    return switch (key) {
      case "baseline" -> "first-value";
      case "ordered_doses" -> "count";
      case "stratify_by_month" -> "true";
      default -> throw new IllegalArgumentException("no other value of " + key);
    };
  }

  @ParameterizedTest
  @MethodSource("keys")
  void wrongValueOfEverySettingIsRefusedByName(String key) {
    PolicyException refused =
        assertThrows(PolicyException.class, () -> read(key + ": {wrong: value}"));

    assertTrue(refused.getMessage().contains("policy.yaml: " + key + " is "), refused::getMessage);
  }

  @ParameterizedTest
  @MethodSource("keys")
  void everySettingIsExplainedInTheDefaultFile(String key) {
    assertTrue(PolicyReader.defaultText().lines().anyMatch(l -> l.startsWith(key + ":")), key);
  }

  @ParameterizedTest
  @CsvSource({"90 s, 90", "2 min, 120", "3 h, 10800", "4 d, 345600", "5d, 432000"})
  void durationsCarryTheirUnit(String text, long seconds) {
    assertEquals(seconds, read("lapse: " + text).episode().lapseSeconds());
  }

  /** KDIGO 2012: 26.5 umol/L within 48 h, 1.5 times within 7 d, 353.6 umol/L, eGFR 35. */
  @Test
  void criteriaAreThoseOfKdigoByDefault() {
    CriteriaPolicy criteria = PolicyReader.defaults().criteria();

    assertEquals(26_500, criteria.riseNanomolesPerLitre());
    assertEquals(353_600, criteria.ceilingNanomolesPerLitre());
    assertEquals(48 * 3_600, criteria.riseWindowSeconds());
    assertEquals(7 * 86_400, criteria.ratioWindowSeconds());
    assertEquals(35, PolicyReader.defaults().episode().egfrFloor());
  }
}
