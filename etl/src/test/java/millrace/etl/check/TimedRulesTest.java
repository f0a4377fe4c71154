package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import millrace.etl.record.Seconds;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Extract contract, row rules: reversed, outside-life, outside-cover; ends cut to the cover. */
class TimedRulesTest {
  /** A table with the column of its first time and that of its end, if it has one. */
  private enum Timed {
    ADMISSIONS("admitted_at", "discharged_at"),
    UNIT_STAYS("entered_at", "left_at"),
    RESULTS("collected_at", ""),
    ADMINISTRATIONS("started_at", "ended_at"),
    BLOOD_PRESSURES("measured_at", ""),
    KIDNEY_REPLACEMENTS("started_at", "ended_at"),
    CONDITIONS("recorded_at", ""),
    URINE_OUTPUTS("started_at", "ended_at"),
    BODY_MEASURES("measured_at", "");

    private final String first;
    private final String end;

    Timed(String first, String end) {
      this.first = first;
      this.end = end;
    }

    ContractTable table() {
      return ContractTable.valueOf(name());
    }

    /** A row that starts then, and has no end unless it must. */
    String[] startingAt(String time) {
      List<String> changes = new ArrayList<>(List.of(first + "=" + time));
      if (!end.isEmpty()) {
        changes.add(end + "=" + (this == URINE_OUTPUTS ? time : ""));
      }
      return changes.toArray(String[]::new);
    }
  }

  private static Stream<Timed> intervals() {
    return Stream.of(Timed.values()).filter(t -> !t.end.isEmpty());
  }

  /** Borders of birth, death and cover, for every timed table. */
  private static Stream<Arguments> borders() {
    List<String> borders =
        List.of(
            ";1959-12-31T23:59:59;outside-life",
            ";1960-01-01T00:00;",
            ";1959-12-31T23:59:59Z;outside-life",
            "2031-03-20T10:00;2031-03-21T10:00;",
            "2031-03-20T10:00;2031-03-21T10:00:01;outside-life",
            "2031-03-20;2031-03-21T23:59:59;",
            "2031-03-20;2031-03-22T00:00;outside-life",
            // A day is 86,400 seconds (methods 1), also over the change of the clock on 30 March.
            "2031-03-29T12:00;2031-03-30T13:00;",
            "2031-03-29T12:00;2031-03-30T13:00:01;outside-life",
            ";2030-12-31T23:59:59;",
            ";2011-05-01T08:00;",
            ";2031-06-30T23:59:59;",
            ";2031-07-01T00:00;outside-cover",
            ";2031-07-01T00:00Z;outside-cover",
            ";2031-06-30T23:00Z;outside-cover",
            ";2031-06-30T22:59:59Z;",
            ";2031-07-02T08:00;outside-cover");
    return Stream.of(Timed.values())
        .flatMap(
            t ->
                borders.stream()
                    .map(b -> b.split(";", -1))
                    .map(b -> Arguments.of(t, b[0], b[1], b[2])));
  }

  private static RowsInMemory besides(Timed timed, String diedAt) {
    RowsInMemory rows =
        RowsInMemory.empty()
            .add(ContractTable.UNITS)
            .add(ContractTable.PATIENTS, "died_at=" + diedAt);
    return timed == Timed.ADMISSIONS ? rows : rows.add(ContractTable.ADMISSIONS);
  }

  @ParameterizedTest
  @MethodSource("borders")
  void theFirstTimeLiesInLifeAndCover(Timed timed, String diedAt, String time, String rule) {
    Checked checked = besides(timed, diedAt).add(timed.table(), timed.startingAt(time)).check();

    assertEquals(
        rule.isEmpty() ? List.of() : List.of("2 " + rule + " " + timed.first),
        checked.broken(timed.table()));
  }

  @ParameterizedTest
  @MethodSource("intervals")
  void anEndBeforeTheStartIsReversed(Timed timed) {
    Checked checked =
        besides(timed, "")
            .add(
                timed.table(),
                timed.first + "=2031-03-02T08:00:01",
                timed.end + "=2031-03-02T08:00:00")
            .check();

    assertEquals(List.of("2 reversed " + timed.end), checked.broken(timed.table()));
  }

  @ParameterizedTest
  @MethodSource("intervals")
  void anEndAtTheStartIsKept(Timed timed) {
    Checked checked =
        besides(timed, "")
            .add(timed.table(), timed.first + "=2031-03-02T08:00", timed.end + "=2031-03-02T08:00")
            .check();

    assertEquals(List.of(), checked.broken(timed.table()));
  }

  @Test
  void instantsAreComparedAndNotTexts() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(
                ContractTable.ADMINISTRATIONS,
                "started_at=2031-03-02T09:00+02:00",
                "ended_at=2031-03-02T08:00Z")
            .add(
                ContractTable.ADMINISTRATIONS,
                "started_at=2031-03-02T08:00Z",
                "ended_at=2031-03-02T09:30+02:00")
            .check();

    assertEquals(List.of("3 reversed ended_at"), checked.broken(ContractTable.ADMINISTRATIONS));
  }

  @Test
  void aReportBeforeItsCollectionIsNoInterval() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.RESULTS, "resulted_at=2031-03-01T06:00")
            .check();

    assertEquals(List.of(), checked.broken(ContractTable.RESULTS));
  }

  @Test
  void aUrineVolumeWithoutStartIsTimedByItsCharting() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.URINE_OUTPUTS, "started_at=", "ended_at=2031-07-01T00:00")
            .add(
                ContractTable.URINE_OUTPUTS,
                "started_at=2031-06-30T23:59",
                "ended_at=2031-07-01T00:59")
            .add(ContractTable.URINE_OUTPUTS, "started_at=", "ended_at=1959-12-31T23:59")
            .check();

    assertEquals(
        List.of("2 outside-cover ended_at", "4 outside-life ended_at"),
        checked.broken(ContractTable.URINE_OUTPUTS));
  }

  @Test
  void aConditionWithoutTimeIsNeverOutside() {
    Checked checked =
        RowsInMemory.ofOnePatient("died_at=2031-01-02T08:00")
            .add(ContractTable.CONDITIONS, "admission_id=", "recorded_at=")
            .check();

    assertEquals(List.of(), checked.broken(ContractTable.CONDITIONS));
    assertEquals(Seconds.ABSENT, checked.only(CheckedPatient::conditions).recordedAt());
  }

  /** Extract contract, common rules: a birth year is 1 July, a birth month its 15th. */
  @ParameterizedTest
  @CsvSource({
    "2031,    2031-06-30T12:00, outside-life",
    "2030,    2030-07-01T00:00, ''",
    "2031-03, 2031-03-14T23:59, outside-life",
    "2031-03, 2031-03-15T00:00, ''"
  })
  void aBirthDateInPartIsMidPeriod(String birthDate, String time, String rule) {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.PATIENTS, "birth_date=" + birthDate)
            .add(ContractTable.BODY_MEASURES, "measured_at=" + time)
            .check();

    assertEquals(
        rule.isEmpty() ? List.of() : List.of("2 " + rule + " measured_at"),
        checked.broken(ContractTable.BODY_MEASURES));
  }

  @ParameterizedTest
  @CsvSource({
    "2031-08-15T08:00,    2031-06-30T23:00:00Z",
    "2031-07-01T00:00:01, 2031-06-30T23:00:00Z",
    "2031-07-01T00:00,    2031-06-30T23:00:00Z",
    "2031-06-30T23:59:59, 2031-06-30T22:59:59Z",
    "'',                  ''"
  })
  void anEndAfterTheCoverIsCutToIt(String written, String end) {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.UNITS)
            .add(ContractTable.PATIENTS)
            .add(ContractTable.ADMISSIONS, "discharged_at=" + written)
            .add(ContractTable.UNIT_STAYS, "left_at=" + written)
            .add(ContractTable.ADMINISTRATIONS, "ended_at=" + written)
            .add(ContractTable.KIDNEY_REPLACEMENTS, "ended_at=" + written)
            .check();
    long expected = end.isEmpty() ? Seconds.ABSENT : Instant.parse(end).getEpochSecond();

    assertEquals(List.of(), checked.quarantine());
    assertEquals(expected, checked.only(CheckedPatient::admissions).dischargedAt());
    assertEquals(expected, checked.only(CheckedPatient::stays).leftAt());
    assertEquals(expected, checked.only(CheckedPatient::administrations).endedAt());
    assertEquals(expected, checked.only(CheckedPatient::replacements).endedAt());
  }

  /** Extract contract, common rules: noon, or the last second of the day of death. */
  @Test
  void aBareDateIsNoonAndADayOfDeathItsLastSecond() {
    Checked checked =
        RowsInMemory.ofOnePatient("died_at=2031-04-05")
            .add(ContractTable.ADMINISTRATIONS, "started_at=2031-03-05")
            .add(ContractTable.KIDNEY_REPLACEMENTS, "started_at=2031-04-05")
            .add(ContractTable.CONDITIONS, "recorded_at=2031-03-05")
            .check();

    assertEquals(
        List.of(
            "2031-04-05T22:59:59Z",
            "2031-03-05T12:00:00Z",
            "2031-04-05T11:00:00Z",
            "2031-03-05T12:00:00Z"),
        Stream.of(
                checked.patients().get(0).patient().orElseThrow().diedAt(),
                checked.only(CheckedPatient::administrations).startedAt(),
                checked.only(CheckedPatient::replacements).startedAt(),
                checked.only(CheckedPatient::conditions).recordedAt())
            .map(s -> Instant.ofEpochSecond(s).toString())
            .toList());
    assertEquals(4, checked.count(FindingKind.BARE_DATE));
  }
}
