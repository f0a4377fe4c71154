package millrace.analytics.spark;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.fixture.ExtractFolder;
import millrace.analytics.fixture.RandomHospital;
import millrace.analytics.fixture.Runs;
import millrace.etl.contract.ContractTable;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What must not matter, on small random hospitals. */
final class RandomHospitalRunTest {
  private static final int PATIENTS = 15;
  private static final Pattern DATE = Pattern.compile("\\d{4}-\\d\\d-\\d\\d");
  private static final List<ExportTable> BY_PATIENT =
      List.of(
          ExportTable.ADMISSIONS,
          ExportTable.EPISODES,
          ExportTable.GRADUAL_RISES,
          ExportTable.LINKS);

  @TempDir private Path folder;

  private static ExtractFolder hospital(String timetable) {
    return new ExtractFolder("UTC", "2030-01-01", "2031-12-01").timetable(timetable);
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2})
  void orderOfAllRowsChangesNothing(long seed) {
    ExtractFolder ordered = hospital(RandomHospital.timetable(seed, PATIENTS));
    ExtractFolder shuffled = hospital(RandomHospital.timetable(seed, PATIENTS));
    Random random = new Random(seed);
    for (ContractTable table : ContractTable.values()) {
      if (!shuffled.lines(table).isEmpty()) {
        Collections.shuffle(shuffled.lines(table), random);
      }
    }

    assertSame(run(ordered, "ordered"), run(shuffled, "shuffled"), List.of(ExportTable.values()));
  }

  @ParameterizedTest
  @ValueSource(longs = {4, 5})
  void unitOfTheLaboratoryChangesNothing(long seed) {
    ExtractFolder milligrams = hospital(RandomHospital.timetable(seed, PATIENTS));
    ExtractFolder micromoles = hospital(RandomHospital.timetable(seed, PATIENTS));
    micromoles.lines(ContractTable.RESULTS).replaceAll(RandomHospitalRunTest::inMicromoles);

    assertNotEquals(
        milligrams.lines(ContractTable.RESULTS), micromoles.lines(ContractTable.RESULTS));
    assertSame(run(milligrams, "mg"), run(micromoles, "umol"), List.of(ExportTable.values()));
  }

  private static String inMicromoles(String line) {
    String[] fields = line.split(",", -1);
    int value = ContractTable.RESULTS.column("value");
    int unit = ContractTable.RESULTS.column("unit");
    fields[value] = new BigDecimal(fields[value]).multiply(new BigDecimal("88.4")).toPlainString();
    fields[unit] = "umol/L";
    return String.join(",", fields);
  }

  /** The zone is UTC, so that every day has the same length. */
  @ParameterizedTest
  @ValueSource(longs = {7, 8})
  void movingOnePatientByWholeDaysMovesItsRowsAndNoOthers(long seed) {
    int days = 11 + (int) seed;
    String timetable = RandomHospital.timetable(seed, PATIENTS);
    String moved = moveLastPatient(timetable, days);
    String last = "r" + (PATIENTS - 1);
    Exports before = run(hospital(timetable), "before");
    Exports after = run(hospital(moved), "after");

    for (ExportTable table : BY_PATIENT) {
      assertEquals(rowsOf(before, table, last, false), rowsOf(after, table, last, false));
      assertEquals(
          rowsOf(before, table, last, true).stream().map(row -> shifted(row, days)).toList(),
          rowsOf(after, table, last, true));
    }
  }

  private static String moveLastPatient(String timetable, int days) {
    int last = timetable.indexOf("patient r" + (PATIENTS - 1));
    return timetable.substring(0, last) + shifted(timetable.substring(last), days);
  }

  private static String shifted(String text, int days) {
    return DATE.matcher(text).replaceAll(d -> LocalDate.parse(d.group()).plusDays(days).toString());
  }

  private static List<String> rowsOf(Exports exports, ExportTable table, String id, boolean own) {
    return exports.rows(table).stream()
        .filter(row -> row.get("patient_id").equals(id) == own)
        .map(row -> String.join(",", row.values()))
        .toList();
  }

  @ParameterizedTest
  @ValueSource(longs = {10})
  void onePatientMoreWhoseCreatinineNeverChangesLeavesTheOthersAlone(long seed) {
    String timetable = RandomHospital.timetable(seed, PATIENTS);
    String constant =
        """
        patient constant female 1950-02-02
        admitted 2030-05-01T08:00 2030-05-11T08:00 M1
        creatinine 2030-05-01T09:00 1.1
        creatinine 2030-05-04T09:00 1.1
        creatinine 2030-05-09T09:00 1.1
        dose J01GB03 iv 2030-05-02T09:00
        pressure 2030-05-03T09:00 50
        """;
    Exports without = run(hospital(timetable), "without");
    Exports with = run(hospital(timetable + constant), "with");

    for (ExportTable table : BY_PATIENT) {
      assertEquals(
          rowsOf(without, table, "constant", false), rowsOf(with, table, "constant", false));
    }
    assertEquals(
        List.of("eligible 8.000000"),
        with.brief(ExportTable.ADMISSIONS, "constant", "class", "at_risk_days"));
    assertEquals(List.of(), with.of(ExportTable.EPISODES, "constant"));
    assertEquals(without.text(ExportTable.QUARANTINE), with.text(ExportTable.QUARANTINE));
  }

  private Exports run(ExtractFolder extract, String name) {
    return Runs.run(extract, folder.resolve(name));
  }

  private static void assertSame(Exports one, Exports other, List<ExportTable> tables) {
    // An empty hospital would prove nothing.
    assertNotEquals(0, one.rows(ExportTable.EPISODES).size());
    Stream.concat(tables.stream(), BY_PATIENT.stream())
        .forEach(t -> assertEquals(one.text(t), other.text(t), t.name()));
  }
}
