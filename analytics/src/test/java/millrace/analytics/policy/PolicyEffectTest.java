package millrace.analytics.policy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.fixture.ExtractFolder;
import millrace.analytics.fixture.Runs;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What single settings change in a run. */
final class PolicyEffectTest {
  private static final String PATIENTS =
      """
      patient onset male 1960-01-01
      admitted 2030-03-01T20:00 2030-03-09T08:00 M1
      stay HDU 2030-03-03T20:00 2030-03-09T08:00
      creatinine 2030-03-02T08:00 1.0
      creatinine 2030-03-04T08:00 1.3
      dose J01GB03 iv 2030-03-02T09:00 ordered
      dose C01CA03 iv 2030-03-03T08:00..2030-03-03T20:00
      dose B05BA03 iv 2030-03-03T08:00
      dose B05XA03 iv 2030-03-03T09:00
      pressure 2030-03-04T04:00 60
      pressure 2030-03-04T05:00 70
      pressure 2030-03-04T06:00 70
      patient dip male 1960-01-01
      admitted 2030-03-01T08:00 2030-03-12T08:00 M1
      creatinine 2030-03-01T09:00 1.0
      creatinine 2030-03-02T09:00 1.6
      creatinine 2030-03-03T09:00 1.1
      creatinine 2030-03-04T09:00 1.6
      creatinine 2030-03-06T09:00 1.0
      creatinine 2030-03-09T09:00 1.0
      patient history male 1960-01-01
      creatinine 2029-06-01T09:00 1.0
      creatinine 2030-02-01T09:00 1.2
      admitted 2030-03-01T08:00 2030-03-12T08:00 M1
      creatinine 2030-03-01T09:00 1.4
      creatinine 2030-03-03T09:00 0.97
      creatinine 2030-03-10T09:00 0.95
      patient unknown male 1970-01-01
      admitted 2030-03-01T08:00 2030-03-12T08:00 M1
      creatinine 2030-03-01T06:00 1.0
      creatinine 2030-03-03T09:00 1.0
      patient filtered male 1960-01-01
      admitted 2030-03-01T08:00 2030-03-12T08:00 M1
      creatinine 2030-03-01T09:00 1.0
      creatinine 2030-03-02T09:00 1.1
      replacement 2030-03-03T08:00 2030-03-03T12:00 acute intermittent
      creatinine 2030-03-04T09:00 1.0
      patient grafted male 1960-01-01
      admitted 2030-03-01T08:00 2030-03-12T08:00 M1
      condition Z94.0 icd10
      creatinine 2030-03-01T09:00 1.0
      creatinine 2030-03-02T09:00 1.1
      patient treated male 1960-01-01
      admitted 2030-03-01T08:00 2030-03-12T08:00 M1
      creatinine 2030-03-01T09:00 1.0
      creatinine 2030-03-06T09:00 1.6
      dose J01GB03 iv 2030-03-02T09:00
      """;

  @TempDir private static Path shared;
  private static Exports defaults;

  @TempDir private Path folder;

  @BeforeAll
  static void run() {
    defaults = Runs.run(extract(), shared);
  }

  private static ExtractFolder extract() {
    return new ExtractFolder("UTC", "2029-01-01", "2031-01-01").timetable(PATIENTS);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "hospital_onset: 72 h     | onset | origin          | hospital             | community",
        "lapse: 30 d              | onset | closed_at       | 2030-06-02T08:00:00Z | 2030-04-03T08:00:00Z",
        "prolonged: 100 d         | onset | prolonged       | true                 | false",
        "rise: 40000              | onset | onset_at        | 2030-03-04T08:00:00Z | none",
        "rise_window: 47 h        | onset | onset_at        | 2030-03-04T08:00:00Z | none",
        "ceiling: 100000          | onset | stage           | 1                    | 3",
        "day_before: 1 h          | onset | unit_day_before | M1                   | HDU",
        "ordered_doses: count     | onset | linked_agents   | -                    | gentamicin",
        "map_floor: 71            | onset | minutes_low     | 60.0000              | 180.0000",
        "pressure_window: 3 h     | onset | observed_hours  | 3.0000               | 2.0000",
        "spell_least: 61 min      | onset | spells          | 1                    | 0",
        "recent_hypotension: 1 h  | onset | recent_hypotension | true              | false",
        "vasopressors: [B01AC06]  | onset | vasopressor     | true                 | false",
        "'hold: {critical-care: 15 min, elsewhere: 30 min}' | onset | observed_hours | 3.0000 | 1.5000",
        "transient: 10 d          | dip   | course          | persistent           | transient",
        "reversal: 1 h            | dip   | onset_at        | 2030-03-02T09:00:00Z | 2030-03-02T09:00:00Z;2030-03-04T09:00:00Z"
      })
  void settingChangesTheEpisode(
      String setting, String patient, String column, String before, String after) {
    assertChange(setting, ExportTable.EPISODES, patient, column, before, after);
  }

  /** Back-calculated: CKD-EPI 2021 gives a man of 60 years 75 mL/min/1.73 m2 at 1.1226 mg/dL. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "baseline: rolling-only        | history  | baseline_mg_dl | 1.1000 | -",
        "baseline: first-value         | history  | baseline_mg_dl | 1.1000 | 1.4000",
        "baseline: lowest-first-week   | history  | baseline_mg_dl | 1.1000 | 0.9700",
        "baseline: latest-outpatient   | history  | baseline_mg_dl | 1.1000 | 1.2000",
        "baseline: back-calculated-75  | history  | baseline_mg_dl | 1.1000 | 1.1000",
        "baseline: back-calculated-75  | unknown  | baseline_mg_dl | -      | 1.1226",
        "baseline_from: 100 d          | history  | baseline_mg_dl | 1.1000 | 1.2000",
        "baseline_until: 60 d          | history  | baseline_mg_dl | 1.1000 | 1.0000",
        "arrival_window: 1 h           | unknown  | results        | 2      | 1",
        "replacement_washout: 1 h      | filtered | results        | 2      | 3",
        "min_age: 65                   | unknown  | class          | eligible | under-age",
        "least_results: 3              | unknown  | class          | eligible | not-assessable",
        "transplant_icd10: [Z99.9]     | grafted  | class          | transplant | eligible",
        "maintenance_dialysis_icd10: ['Z94*'] | grafted | class    | transplant | maintenance-dialysis"
      })
  void settingChangesTheAdmission(
      String setting, String patient, String column, String before, String after) {
    assertChange(setting, ExportTable.ADMISSIONS, patient, column, before, after);
  }

  private void assertChange(
      String setting, ExportTable table, String patient, String column, String old, String now) {
    assertEquals(old, value(defaults, table, patient, column));
    assertEquals(now, value(Runs.run(extract(), folder, setting), table, patient, column));
  }

  private static String value(Exports exports, ExportTable table, String patient, String column) {
    List<String> values = exports.brief(table, patient, column);
    return values.isEmpty() ? "none" : String.join(";", values);
  }

  @Test
  void printedDefaultsChangeNothing() {
    Exports printed = Runs.run(extract(), folder, PolicyReader.defaultText());

    for (ExportTable table : ExportTable.values()) {
      assertEquals(defaults.text(table), printed.text(table));
    }
  }

  @Test
  void runStoresTheSettingsItUsed() {
    Map<String, String> used =
        Runs.run(extract(), folder, "min_age: 17").manifest().policySettings();

    assertEquals("17", used.get("min_age"));
    assertEquals("90 d", used.get("lapse"));
  }

  @Test
  void ownWatchlistAndCombinationsReplaceTheShippedOnes() throws IOException {
    Files.writeString(
        folder.resolve("own.csv"),
        """
        agent,atc,class,mechanism,routes,lag_hours,look_back_days,burden
        sugar,B05BA,fluid,osmotic,iv,12,2,Y
        salt,B05XA,fluid,osmotic,iv;po,0.5,3,N
        """);
    Files.writeString(folder.resolve("pairs.csv"), "name,members\nsweet and salty,sugar;salt\n");
    Exports own = Runs.run(extract(), folder, "{watchlist: own.csv, combinations: pairs.csv}");

    assertEquals(
        List.of("agent salt", "agent sugar", "class fluid", "combination sweet and salty"),
        own.rows(ExportTable.DRUG_RATES).stream()
            .filter(r -> !r.get("level").equals("burden"))
            .map(r -> Exports.brief(r, "level", "subject"))
            .toList());
    Map<String, String> episode = own.of(ExportTable.EPISODES, "onset").get(0);
    assertEquals("salt;sugar", episode.get("linked_agents"));
    assertEquals("1", episode.get("burden"));
    assertEquals("sweet and salty", episode.get("combinations"));
  }

  @Test
  void fewEpisodesAndDaysGiveNoRatioUnlessThePolicyAsksForIt() {
    Exports few = Runs.run(extract(), folder, "{fewest_episodes: 1, fewest_exposed_days: 1}");

    assertTrue(gentamicin(defaults).get("rate_ratio").isEmpty());
    assertTrue(Double.parseDouble(gentamicin(few).get("rate_ratio")) > 1);
    assertEquals(gentamicin(defaults).get("exposed_days"), gentamicin(few).get("exposed_days"));
  }

  private static Map<String, String> gentamicin(Exports exports) {
    return exports.rows(ExportTable.DRUG_RATES, "subject", "gentamicin").get(0);
  }
}
