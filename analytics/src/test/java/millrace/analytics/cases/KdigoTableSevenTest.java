package millrace.analytics.cases;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.fixture.ExtractFolder;
import millrace.analytics.fixture.Runs;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The published cases A to H: KDIGO 2012, Kidney Int Suppl 2:19, Table 7. The values are from
 * memory; the answers follow the guideline's commentary on the table (pages 28, 30 and 31).
 */
final class KdigoTableSevenTest {
  /** Baseline, then the values of days 1, 2, 3 and 7 in mg/dL. */
  private static final Map<String, List<String>> CASES =
      Map.of(
          "A", List.of("1.0", "1.3", "1.5", "2.0", "1.0"),
          "B", List.of("1.0", "1.1", "1.2", "1.4", "1.0"),
          "C", List.of("0.4", "0.5", "0.6", "0.7", "0.4"),
          "D", List.of("1.0", "1.1", "1.2", "1.3", "1.5"),
          "E", List.of("1.0", "1.3", "1.5", "1.8", "2.2"),
          "F", List.of("unknown", "3.0", "2.6", "2.2", "1.0"),
          "G", List.of("unknown", "1.8", "2.0", "2.2", "1.6"),
          "H", List.of("unknown", "3.0", "3.1", "3.0", "2.9"),
          // Case A as if its baseline were unknown, too.
          "A-unknown", List.of("unknown", "1.3", "1.5", "2.0", "1.0"));

  private static final int[] DAYS = {1, 2, 3, 7};
  private static final String RATIO_ALONE = "rise: 100000000";
  private static final String RISE_ALONE =
      "{ratio_window: 0 s, baseline_reach: 0 s, fall_window: 0 s}";

  private static Exports both;
  private static Exports ratioAlone;
  private static Exports riseAlone;

  @BeforeAll
  static void run(@TempDir Path folder) {
    ExtractFolder extract = new ExtractFolder("UTC", "2030-01-01", "2031-01-01");
    CASES.forEach((name, values) -> extract.timetable(timetable(name, values)));
    both = Runs.run(extract, folder.resolve("both"));
    ratioAlone = Runs.run(extract, folder.resolve("ratio"), RATIO_ALONE);
    riseAlone = Runs.run(extract, folder.resolve("rise"), RISE_ALONE);
  }

  /** Equal clock times, so that day 1 to day 3 is exactly 48 h. */
  private static String timetable(String name, List<String> values) {
    StringBuilder lines = new StringBuilder("patient " + name + " male 1970-01-01\n");
    lines.append("admitted 2030-03-01T08:00 2030-03-12T08:00 M1\n");
    if (!values.get(0).equals("unknown")) {
      lines.append("creatinine 2030-02-01T09:00 ").append(values.get(0)).append('\n');
    }
    for (int i = 0; i < DAYS.length; i++) {
      lines.append("creatinine 2030-03-0%dT09:00 %s%n".formatted(DAYS[i], values.get(i + 1)));
    }
    return lines.toString();
  }

  /** The column of the table for a rise of 50 percent; F is seen only by looking back. */
  @ParameterizedTest
  @CsvSource({"A,yes", "B,no", "C,yes", "D,yes", "E,yes", "F,yes", "G,no", "H,no"})
  void ratioRuleAnswersAsPublished(String name, String answer) {
    assertEquals(answer, isInjured(ratioAlone, name));
  }

  /** The column of the table for a rise of 0.3 mg/dL within 48 h. */
  @ParameterizedTest
  @CsvSource({"A,yes", "B,yes", "C,no", "D,no", "E,yes", "F,no", "G,yes", "H,no"})
  void riseRuleAnswersAsPublished(String name, String answer) {
    assertEquals(answer, isInjured(riseAlone, name));
  }

  @ParameterizedTest
  @CsvSource({
    "A, 2, RATIO_BASELINE, 2",
    "B, 3, RISE_48H, 1",
    "C, 2, RATIO_BASELINE, 1",
    "D, 7, RATIO_BASELINE, 1",
    "E, 2, RATIO_BASELINE, 2",
    "F, 1, FALL_7D, 3",
    "G, 3, RISE_48H, 1"
  })
  void episodeStartsOnTheFirstDayThatMeetsEitherRule(
      String name, int day, String evidence, int stage) {
    assertEquals(
        List.of("2030-03-0%dT09:00:00Z %s %d".formatted(day, evidence, stage)),
        both.brief(ExportTable.EPISODES, name, "onset_at", "evidence", "stage"));
  }

  @Test
  void caseHMeetsNeitherRule() {
    assertEquals(List.of(), both.of(ExportTable.EPISODES, "H"));
  }

  /** Commentary, page 28: A is diagnosed on day 3 by either rule even without a baseline. */
  @Test
  void caseAIsFoundOnDayThreeByEitherRuleWithoutBaseline() {
    List<List<String>> onsets =
        Stream.of(ratioAlone, riseAlone)
            .map(e -> e.brief(ExportTable.EPISODES, "A-unknown", "onset_at", "evidence"))
            .toList();

    assertEquals(
        List.of(List.of("2030-03-03T09:00:00Z RATIO_7D"), List.of("2030-03-03T09:00:00Z RISE_48H")),
        onsets);
  }

  /** Day 3 of E by the 48 h rule alone (first day met, computed). */
  @ParameterizedTest
  @CsvSource({"A,3", "B,3", "E,3", "G,3"})
  void riseRuleIsMetFirstExactlyFortyEightHoursAfterDayOne(String name, int day) {
    assertEquals(
        List.of("2030-03-0" + day + "T09:00:00Z"),
        riseAlone.brief(ExportTable.EPISODES, name, "onset_at"));
  }

  private static String isInjured(Exports exports, String name) {
    return exports.of(ExportTable.EPISODES, name).isEmpty() ? "no" : "yes";
  }
}
