package millrace.analytics.cases;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.fixture.ExtractFolder;
import millrace.analytics.fixture.Runs;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Invented cases for units of measure and for several results at one instant (methods 1, 2). */
final class LineVignettesTest {
  private static Exports exports;

  @BeforeAll
  static void run(@TempDir Path folder) {
    exports =
        Runs.run(
            new ExtractFolder("UTC", "2026-01-01", "2027-01-01").timetable(V7).timetable(V8),
            folder);
  }

  private static List<String> episodes(String patient) {
    return exports.brief(
        ExportTable.EPISODES,
        patient,
        "onset_at",
        "origin",
        "evidence",
        "reference_mg_dl",
        "stage");
  }

  private static final String V7 =
      """
      patient V7 female 1970-01-01
      admitted 2026-07-01T07:00 2026-07-06T10:00 M1
      creatinine 2026-07-01T08:00 88umol/L
      creatinine 2026-07-02T08:00 1.3
      creatinine 2026-07-02T20:00 124umol/L
      patient V7b female 1970-01-01
      admitted 2026-07-01T07:00 2026-07-06T10:00 M1
      creatinine 2026-07-01T08:00 89umol/L
      creatinine 2026-07-02T08:00 1.3
      creatinine 2026-07-02T20:00 124umol/L
      patient V7c female 1970-01-01
      admitted 2026-07-01T07:00 2026-07-06T10:00 M1
      creatinine 2026-07-01T08:00 88umol/L
      creatinine 2026-07-02T08:00 114umol/L
      patient V7d female 1970-01-01
      admitted 2026-07-01T07:00 2026-07-06T10:00 M1
      creatinine 2026-07-01T08:00 1.0
      creatinine 2026-07-02T08:00 115
      """;

  /** 88 umol/L are 0.9955 mg/dL, and 1.3 mg/dL are 26.92 umol/L more. */
  @Test
  void v7UnitsMeetOnOneExactScale() {
    assertEquals(List.of("2026-07-02T08:00:00Z community RISE_48H 0.9955 1"), episodes("V7"));
    assertEquals(
        List.of("1.3000 1.4027 2026-07-02T20:00:00Z"),
        exports.brief(ExportTable.EPISODES, "V7", "onset_mg_dl", "peak_mg_dl", "peak_at"));
  }

  /** 25.92 umol/L are too few; 12 h later it is 35. */
  @Test
  void v7bRiseJustBelowTheThresholdWaitsForTheNextResult() {
    assertEquals(List.of("2026-07-02T20:00:00Z community RISE_48H 1.0068 1"), episodes("V7b"));
  }

  @Test
  void v7cRiseOfTwentySixMicromolesIsNone() {
    assertEquals(List.of(), episodes("V7c"));
  }

  @Test
  void v7dMicromolesWrittenAsMilligramsGoToTheQuarantine() {
    assertEquals(List.of(), episodes("V7d"));
    assertEquals(
        List.of("results implausible value"),
        exports.rows(ExportTable.QUARANTINE).stream()
            .filter(r -> r.get("raw").startsWith("V7d,"))
            .map(r -> Exports.brief(r, "table", "rule", "column"))
            .toList());
  }

  private static final String V8 =
      """
      patient V8 male 1970-01-01
      admitted 2026-08-01T05:00 2026-08-06T10:00 M1
      creatinine 2026-07-01T06:00 1.0
      creatinine 2026-08-01T06:00 1.0 final
      creatinine 2026-08-01T06:00 1.4 preliminary
      creatinine 2026-08-02T06:00 1.1
      patient V8b male 1970-01-01
      admitted 2026-08-01T05:00 2026-08-06T10:00 M1
      creatinine 2026-07-01T06:00 1.0
      creatinine 2026-08-01T06:00 1.0
      creatinine 2026-08-01T06:00 1.6
      creatinine 2026-08-02T06:00 1.1
      patient V8c male 1970-01-01
      admitted 2026-08-01T05:00 2026-08-06T10:00 M1
      creatinine 2026-08-01T06:00 1.0
      creatinine 2026-08-01T06:00 1.0
      patient V8-reported male 1970-01-01
      admitted 2026-08-01T05:00 2026-08-06T10:00 M1
      creatinine 2026-07-01T06:00 1.0
      creatinine 2026-08-01T06:00 1.0 reported=2026-08-01T07:00
      creatinine 2026-08-01T06:00 1.6 reported=2026-08-01T08:00
      """;

  @Test
  void v8PreliminaryValueIsSetApart() {
    assertEquals(List.of(), episodes("V8"));
    assertEquals(
        List.of("not-final status"),
        exports.rows(ExportTable.QUARANTINE).stream()
            .filter(r -> r.get("raw").startsWith("V8,"))
            .map(r -> Exports.brief(r, "rule", "column"))
            .toList());
  }

  /** Adapted: the extract does not tell a laboratory from a bedside device (methods 2). */
  @Test
  void v8bLowerOfTwoFinalValuesAtOneInstantStands() {
    assertEquals(List.of(), episodes("V8b"));
    assertEquals(List.of("2"), exports.brief(ExportTable.ADMISSIONS, "V8b", "results"));
  }

  @Test
  void v8cTwoIdenticalResultsAreOneAndLeaveTheAdmissionUnassessable() {
    assertEquals(
        List.of("not-assessable 1"),
        exports.brief(ExportTable.ADMISSIONS, "V8c", "class", "results"));
  }

  /** Methods 2: the latest report when every one has its time. */
  @Test
  void v8LatestReportStandsWhenAllAreReported() {
    assertEquals(
        List.of("2026-08-01T06:00:00Z community RATIO_BASELINE 1.0000 1"), episodes("V8-reported"));
  }
}
