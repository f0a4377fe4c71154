package millrace.analytics.cases;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.fixture.ExtractFolder;
import millrace.analytics.fixture.Runs;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Invented cases for drugs and low pressure (methods 7, 8), and facts of the trade. */
final class ExposureVignettesTest {
  private static Exports exports;

  @BeforeAll
  static void run(@TempDir Path folder) {
    ExtractFolder extract = new ExtractFolder("UTC", "2026-01-01", "2027-01-01");
    Stream.of(V13, PRESSURE, TRADE).forEach(extract::timetable);
    exports = Runs.run(extract, folder);
  }

  private static final String V13 =
      """
      patient V13 male 1960-01-01
      admitted 2026-06-05T08:00 2026-06-20T08:00 M1
      creatinine 2026-06-05T07:00 0.8
      creatinine 2026-06-13T07:00 0.8
      creatinine 2026-06-14T07:00 0.8
      creatinine 2026-06-15T07:00 1.3
      course J01GB03 iv 2026-06-05T10:00 5
      dose V08AB02 iv 2026-06-11T11:00
      dose J01CR05 iv 2026-06-12T17:00
      dose J01CR05 iv 2026-06-13T01:00
      dose J01CR05 iv 2026-06-13T09:00
      dose J01CR05 iv 2026-06-13T17:00
      dose J01CR05 iv 2026-06-14T01:00
      dose J01CR05 iv 2026-06-14T09:00
      course J01XA01 iv 2026-06-12T18:00 3
      course J01XA01 iv 2026-06-13T06:00 3
      course A07AA09 po 2026-06-10T08:00 5
      course J01XA01 po 2026-06-10T09:00 5
      course S01AA11 ophthalmic 2026-06-13T08:00 3
      dose M01AE01 po 2026-06-14T20:00
      dose C09AA05 po 2026-06-04T09:00
      dose C09AA05 po 2026-06-15T09:00
      """;

  /**
   * Vignette V13: ibuprofen is within its lag, contrast, ramipril and the drops are out, and
   * vancomycin counts by vein alone.
   */
  @Test
  void v13OnlyDosesInTheirWindowAndByTheirRouteAreLinked() {
    assertEquals(
        List.of(
            "gentamicin aminoglycoside 2026-06-05T10:00:00Z 2026-06-09T10:00:00Z 5 5",
            "piperacillin-tazobactam penicillin 2026-06-12T17:00:00Z 2026-06-14T01:00:00Z 3 5",
            "vancomycin IV glycopeptide 2026-06-12T18:00:00Z 2026-06-14T06:00:00Z 3 4"),
        exports.brief(
            ExportTable.LINKS,
            "V13",
            "agent",
            "class",
            "first_dose_at",
            "last_dose_at",
            "dose_days",
            "doses"));
  }

  /**
   * Adapted: gentamicin exposes for 14 d, so that its pair with vancomycin is flagged too, and the
   * burden is what exposes at the instant, not the doses of one day.
   */
  @Test
  void v13PairsAndBurdenFollowTheExposedTimeAtOnset() {
    Map<String, String> episode = exports.of(ExportTable.EPISODES, "V13").get(0);

    assertEquals("2026-06-15T07:00:00Z", episode.get("onset_at"));
    assertEquals("gentamicin;piperacillin-tazobactam;vancomycin IV", episode.get("linked_agents"));
    assertEquals("3+", episode.get("burden"));
    assertEquals(
        "vancomycin IV + aminoglycoside;vancomycin IV + piperacillin-tazobactam",
        episode.get("combinations"));
  }

  private static final String PRESSURE_COURSE =
      """
      creatinine 2026-02-01T09:00 1.0
      creatinine 2026-02-02T15:00 1.5
      pressure 2026-02-02T10:00 70
      pressure 2026-02-02T10:30 60
      pressure 2026-02-02T11:30 55
      pressure 2026-02-02T14:00 72
      """;
  private static final String PRESSURE =
      """
      patient P-ward male 1960-01-01
      admitted 2026-02-01T08:00 2026-02-05T08:00 M1
      %1$s
      patient P-icu male 1960-01-01
      admitted 2026-02-01T08:00 2026-02-05T08:00 ICU
      %1$s
      """
          .formatted(PRESSURE_COURSE);

  /** Worked by hand: 210 min observed, 120 below, 60 x 5 + 60 x 10 = 900 mmHg x min. */
  @Test
  void pressuresHoldForAnHourOnAWard() {
    Map<String, String> episode = exports.of(ExportTable.EPISODES, "P-ward").get(0);

    assertEquals(
        "2026-02-02T15:00:00Z 3.5000 120.0000 55.0000 900.0000 1 true",
        Exports.brief(
            episode,
            "onset_at",
            "observed_hours",
            "minutes_low",
            "lowest_map",
            "area_under_floor",
            "spells",
            "recent_hypotension"));
    // 4.286 mmHg over observed time; 3.0 over the clock would be wrong.
    double depth =
        Double.parseDouble(episode.get("area_under_floor"))
            / (60 * Double.parseDouble(episode.get("observed_hours")));
    assertEquals(4.286, depth, 0.0005);
  }

  /** The same readings held for 15 min each: 60 observed, 30 below, 15 x 5 + 15 x 10. */
  @Test
  void pressuresHoldForAQuarterOfAnHourInCriticalCare() {
    assertEquals(
        List.of("1.0000 30.0000 55.0000 225.0000 1"),
        exports.brief(
            ExportTable.EPISODES,
            "P-icu",
            "observed_hours",
            "minutes_low",
            "lowest_map",
            "area_under_floor",
            "spells"));
  }

  private static String aminoglycosideCourse(int days) {
    StringBuilder lines = new StringBuilder("patient gentamicin-" + days + " male 1960-01-01\n");
    lines.append("admitted 2026-09-01T07:00 2026-09-20T08:00 M1\n");
    lines.append("course J01GB03 iv 2026-09-01T09:00 ").append(days).append('\n');
    for (int day = 1; day < days; day++) {
      lines.append("creatinine 2026-09-%02dT08:00 1.0%n".formatted(day));
    }
    return lines.append("creatinine 2026-09-%02dT08:00 1.6%n".formatted(days)).toString();
  }

  /** 0.8 rising by 0.04 a day: 1.2 on day 11, never 1.5 times the lowest of seven days. */
  private static String slowRise() {
    return "patient slow male 1960-01-01\nadmitted 2026-10-01T07:00 2026-10-20T08:00 M1\n"
        + "course J01GB03 iv 2026-10-01T09:00 10\n"
        + IntStream.range(0, 11)
            .mapToObj(d -> "creatinine 2026-10-%02dT08:00 %.2f%n".formatted(d + 1, 0.8 + 0.04 * d))
            .reduce("", String::concat);
  }

  private static final String TRADE =
      aminoglycosideCourse(8)
          + aminoglycosideCourse(9)
          + aminoglycosideCourse(10)
          + slowRise()
          + """
          patient ramipril male 1940-01-01
          admitted 2026-11-01T07:00 2026-11-09T08:00 M1
          creatinine 2026-11-01T08:00 1.0
          creatinine 2026-11-02T09:00 1.5
          dose C09AA05 po 2026-11-01T08:00
          """;

  /** Common practice, no source: toxic tubular injury shows 7 to 10 days after the start. */
  @ParameterizedTest
  @ValueSource(ints = {8, 9, 10})
  void lateOnsetInADailyAminoglycosideCourseIsLinked(int day) {
    String patient = "gentamicin-" + day;

    assertEquals(
        List.of("2026-09-%02dT08:00:00Z gentamicin".formatted(day)),
        exports.brief(ExportTable.EPISODES, patient, "onset_at", "linked_agents"));
    assertEquals(
        List.of("2026-09-01T09:00:00Z"),
        exports.brief(ExportTable.LINKS, patient, "first_dose_at"));
  }

  /** Common practice, no source: a rise too slow for seven days is among the gradual rises. */
  @Test
  void slowRiseDuringAnAminoglycosideCourseIsGradual() {
    assertEquals(List.of(), exports.of(ExportTable.EPISODES, "slow"));
    assertEquals(
        List.of("slow-1 2026-10-11T08:00:00Z 0.8000 1.2000"),
        exports.brief(
            ExportTable.GRADUAL_RISES,
            "slow",
            "admission_id",
            "first_at",
            "reference_mg_dl",
            "value_mg_dl"));
  }

  /** Common practice, no source: filtration falls soon after the start of a RAS blocker. */
  @Test
  void onsetOnTheSecondDayOfARasBlockerIsLinked() {
    assertEquals(
        List.of("2026-11-02T09:00:00Z ramipril"),
        exports.brief(ExportTable.EPISODES, "ramipril", "onset_at", "linked_agents"));
  }

  @Test
  void everySubjectOfTheWatchlistHasARateRowZerosToo() {
    List<Map<String, String>> rows = exports.rows(ExportTable.DRUG_RATES);

    assertEquals(
        List.of("agent", "burden", "class", "combination"),
        rows.stream().map(r -> r.get("level")).distinct().toList());
    assertEquals(
        List.of("0", "1", "2", "3+"),
        rows.stream()
            .filter(r -> r.get("level").equals("burden"))
            .map(r -> r.get("subject"))
            .toList());
    assertTrue(
        rows.stream()
            .anyMatch(
                r ->
                    r.get("subject").equals("telavancin")
                        && r.get("exposed_days").equals("0.000000")));
  }
}
