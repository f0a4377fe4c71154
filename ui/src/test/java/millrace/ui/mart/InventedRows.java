package millrace.ui.mart;

import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import millrace.analytics.mart.AdmissionRow;
import millrace.analytics.mart.DoseLine;
import millrace.analytics.mart.DrugRateRow;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.FindingRow;
import millrace.analytics.mart.FlowRow;
import millrace.analytics.mart.LinkRow;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.PressureLine;
import millrace.analytics.mart.ResultLine;
import millrace.analytics.mart.StayLine;
import millrace.analytics.mart.TestingRow;
import millrace.analytics.mart.UnitRateRow;
import millrace.analytics.mart.UnitRow;

/** Rows of an invented hospital: one counted episode in March, one of the community in April. */
final class InventedRows {
  static final Instant ONSET = Instant.parse("2031-03-14T06:10:00Z");
  private static final long DAY = 86_400;

  private InventedRows() {}

  static List<? extends Record> of(MartTable table) {
    return switch (table) {
      case ADMISSIONS -> List.of(admission());
      case EPISODES ->
          List.of(
              episode("e-0-1", ONSET, "hospital", "gentamicin", "aminoglycoside", true, "2031-03"),
              episode(
                  "e-0-2", ONSET.plus(Duration.ofDays(30)), "community", "", "", false, "2031-04"));
      case UNIT_RATES -> rates();
      case DRUG_RATES -> List.of(drugRate());
      case LINKS ->
          List.of(
              new LinkRow(
                  "p",
                  ONSET,
                  "gentamicin",
                  "aminoglycoside",
                  "direct tubular toxicity",
                  at(-72),
                  at(-48),
                  2,
                  2));
      case FLOW -> List.of(new FlowRow("eligible", 9), new FlowRow("not-assessable", 1));
      case FINDINGS -> List.of(new FindingRow("bare-date", "conditions", "recorded_at", 3));
      case UNITS -> List.of(new UnitRow("u1", "Curlew Ward", "ward"));
      case TESTING -> List.of(new TestingRow("2031-03", "u1", 10 * DAY, 12));
      case RESULTS ->
          List.of(
              result(-48, 80_000, 2),
              result(0, 130_000, 3),
              result(24, 170_000, 4),
              result(96, 90_000, 5));
      case DOSES ->
          List.of(
              dose("gentamicin", true, -72, 2),
              dose("gentamicin", true, -48, 3),
              dose("ibuprofen", true, -2, 4));
      case PRESSURES -> List.of(pressure(-10, 80, 2), pressure(-9, 55, 3));
      case STAYS ->
          List.of(
              new StayLine("p", "a", "u1", at(-120), Optional.of(at(200)), "unit_stays.csv", 2));
      default -> List.of();
    };
  }

  private static Instant at(int hours) {
    return ONSET.plus(Duration.ofHours(hours));
  }

  private static AdmissionRow admission() {
    return new AdmissionRow(
        "a",
        "p",
        "eligible",
        at(-120),
        Optional.of(at(200)),
        Optional.of("home"),
        "female",
        70,
        OptionalLong.of(80_000),
        4,
        OptionalLong.of(3 * DAY));
  }

  private static EpisodeRow episode(
      String id,
      Instant onset,
      String origin,
      String agents,
      String classes,
      boolean counted,
      String month) {
    return new EpisodeRow(
        id,
        "p",
        Optional.of("a"),
        Optional.of("eligible"),
        onset,
        origin,
        "RATIO_7D;RISE_48H",
        OptionalLong.of(80_000),
        OptionalLong.of(130_000),
        OptionalLong.of(170_000),
        Optional.of(onset.plus(Duration.ofDays(1))),
        2,
        Optional.of(onset.plus(Duration.ofDays(4))),
        "persistent",
        false,
        Optional.of("recovered"),
        Optional.of("u1"),
        Optional.of("u1"),
        agents,
        classes,
        "1",
        "",
        60,
        OptionalDouble.of(55),
        600,
        10,
        1,
        false,
        counted,
        counted,
        month);
  }

  private static List<UnitRateRow> rates() {
    return List.of(
        rate("2031-02", "at-onset", 0),
        rate("2031-03", "at-onset", 1),
        rate("2031-03", "day-before", 1));
  }

  private static UnitRateRow rate(String month, String attribution, long episodes) {
    return new UnitRateRow(
        month,
        "u1",
        attribution,
        100 * DAY,
        episodes,
        episodes,
        OptionalDouble.of(10.0 * episodes),
        OptionalDouble.of(0),
        OptionalDouble.of(55.7));
  }

  private static DrugRateRow drugRate() {
    OptionalDouble two = OptionalDouble.of(2);
    return new DrugRateRow(
        "class",
        "aminoglycoside",
        50 * DAY,
        1,
        150 * DAY,
        0,
        two,
        OptionalDouble.of(0.1),
        OptionalDouble.empty(),
        OptionalDouble.of(0.4),
        two,
        OptionalDouble.of(0.5),
        OptionalDouble.of(8),
        OptionalDouble.of(0.4));
  }

  private static ResultLine result(int hours, long nanomoles, long line) {
    return new ResultLine(
        "p",
        at(hours),
        Optional.empty(),
        nanomoles,
        "used",
        Optional.of("a"),
        "inpatient",
        "results.csv",
        line);
  }

  private static DoseLine dose(String agent, boolean exposing, int hours, long line) {
    return new DoseLine(
        "p",
        at(hours),
        Optional.empty(),
        agent,
        agent,
        "iv",
        "1 unit",
        "administered",
        Optional.of(agent),
        Optional.of("class"),
        exposing,
        "",
        DAY,
        14 * DAY,
        "administrations.csv",
        line);
  }

  private static PressureLine pressure(int hours, double map, long line) {
    return new PressureLine(
        "p",
        at(hours),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.of(map),
        OptionalDouble.of(map),
        "cuff",
        false,
        map < 65,
        3_600,
        "blood_pressures.csv",
        line);
  }
}
