package millrace.etl.spark;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import millrace.etl.check.CheckedPatient;
import millrace.etl.check.Findings;
import millrace.etl.check.Quarantined;
import millrace.etl.contract.ContractException;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.FilesOfAnExtract;
import millrace.etl.fixture.Line;
import millrace.etl.fixture.RowsInMemory;
import millrace.etl.record.CreatinineResult;
import org.apache.spark.sql.SparkSession;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ExtractReaderTest {
  private static final CutSizes WHOLE = new CutSizes(1 << 30, 1 << 30);

  /** A part for each record, and several parts of patients. */
  private static final CutSizes SMALL = new CutSizes(1, 700);

  private static SparkSession spark;
  private static Checked inSmallParts;
  private static String fingerprintOfParts;

  @TempDir static Path written;
  @TempDir Path folder;

  @BeforeAll
  static void readOneExtract() throws IOException {
    spark =
        SparkSession.builder()
            .appName("etl tests")
            .master("local[2]")
            .config("spark.driver.host", "127.0.0.1")
            .config("spark.driver.bindAddress", "127.0.0.1")
            .config("spark.ui.enabled", "false")
            .config("spark.sql.session.timeZone", "UTC")
            .config("spark.sql.shuffle.partitions", "2")
            .config("spark.sql.adaptive.enabled", "false")
            .config("spark.sql.codegen.wholeStage", "false")
            .config("spark.shuffle.sort.bypassMergeThreshold", "1")
            .config("spark.sql.shuffle.orderIndependentChecksum.enabled", "false")
            .getOrCreate();
    writeExtract();
    ReadExtract parts = open(written, SMALL);
    fingerprintOfParts = parts.fingerprint();
    inSmallParts = check(parts);
  }

  @AfterAll
  static void stop() {
    spark.stop();
  }

  /** What all rows of an extract became. */
  private record Outcome(
      List<CheckedPatient> patients,
      List<Quarantined> quarantine,
      List<String> findings,
      List<String> accounts) {
    static Outcome of(Checked checked) {
      List<String> findings = new ArrayList<>();
      checked.findings().forEach((key, count) -> findings.add(key + " " + count));
      return new Outcome(
          checked.patients().stream().filter(p -> p.patient().isPresent()).toList(),
          checked.quarantine().stream().sorted(Comparator.comparing(Quarantined::source)).toList(),
          findings,
          Arrays.stream(ContractTable.values()).map(t -> t + " " + checked.account(t)).toList());
    }
  }

  private static ReadExtract open(Path folder, CutSizes cuts) {
    return new ExtractReader(spark, folder, cuts, step -> {}).open();
  }

  private static Checked check(ReadExtract read) {
    PatientStream stream =
        new PatientStream(read.patientBlocks().collectAsList().iterator(), read.context().value());
    List<CheckedPatient> patients = new ArrayList<>();
    List<Quarantined> quarantine = new ArrayList<>(read.quarantine());
    stream.forEachRemaining(patients::add);
    patients.forEach(p -> quarantine.addAll(p.quarantine()));
    patients.sort(
        Comparator.comparing((CheckedPatient p) -> p.patient().map(q -> q.patientId()).orElse("")));
    stream.findings().forEach(read.findings()::add);
    stream.accounting().lines().forEach(read.accounting()::add);
    return new Checked(
        patients,
        read.context().value().units(),
        read.context().value().codes(),
        read.findings(),
        read.accounting(),
        quarantine);
  }

  /** Three patients over several files, with rows that break rules and rows without a key. */
  private static void writeExtract() throws IOException {
    new FilesOfAnExtract(written)
        .file(
            ContractTable.PATIENTS,
            "patients-1.csv",
            Line.of(ContractTable.PATIENTS),
            Line.of(ContractTable.PATIENTS, "patient_id=P2"),
            ",female,1970,")
        .text(
            ContractTable.PATIENTS,
            "patients-2.csv",
            "\uFEFFsex,patient_id,birth_date\r\nfemale,\"P1\",1960-01-01\r\n\r\nmale, P3 ,1980\r\n")
        .file(
            ContractTable.ADMISSIONS,
            "admissions-1.csv.gz",
            Line.of(ContractTable.ADMISSIONS),
            Line.of(ContractTable.ADMISSIONS, "admission_id=A2", "patient_id=P2"),
            Line.of(ContractTable.ADMISSIONS, "admission_id=", "patient_id=P2"),
            Line.of(ContractTable.ADMISSIONS, "admission_id=A8", "patient_id="))
        .file(
            ContractTable.ADMISSIONS,
            "admissions-2.csv",
            Line.of(ContractTable.ADMISSIONS, "admission_id=A2", "patient_id=P3"),
            Line.of(ContractTable.ADMISSIONS, "admission_id=A9", "patient_id=P9"))
        .file(
            ContractTable.UNIT_STAYS,
            "unit_stays-1.csv",
            Line.of(ContractTable.UNIT_STAYS, "admission_id=A2"),
            Line.of(ContractTable.UNIT_STAYS, "admission_id="),
            Line.of(ContractTable.UNIT_STAYS, "admission_id=A9"))
        .file(
            ContractTable.UNIT_STAYS,
            "unit_stays-2.csv.gz",
            Line.of(ContractTable.UNIT_STAYS),
            Line.of(ContractTable.UNIT_STAYS, "admission_id="),
            Line.of(ContractTable.UNIT_STAYS, "admission_id=A2", "left_at="))
        .file(ContractTable.UNITS, "units.csv", Line.of(ContractTable.UNITS), "ICU,Again,other,")
        .text(
            ContractTable.RESULTS,
            "results-1.csv",
            """
            value,unit,\"patient_id\",analyte,collected_at,comment
            1.0,mg/dL,P1,2160-0,2031-03-02T06:00,\"seen
            twice, \"\"again\"\"\"
            1.1,mg/dL,P2,2160-0,2031-03-02T06:00,

            1.2,mg/dL,P1,2160-0,2031-03-03T06:00,
            """)
        .file(
            ContractTable.RESULTS,
            "results-2.csv.gz",
            Line.of(ContractTable.RESULTS, "collected_at=2031-03-04T06:00", "value=1.3"),
            Line.of(ContractTable.RESULTS, "patient_id=P3", "admission_id=A2"),
            Line.of(ContractTable.RESULTS, "patient_id=P9", "admission_id="),
            Line.of(ContractTable.RESULTS, "patient_id="),
            Line.of(ContractTable.RESULTS, "patient_id="))
        .file(
            ContractTable.ADMINISTRATIONS,
            "administrations.csv",
            Line.of(ContractTable.ADMINISTRATIONS, "drug=GENT", "code_system=local"))
        .file(
            ContractTable.BLOOD_PRESSURES,
            "blood_pressures.csv",
            Line.of(ContractTable.BLOOD_PRESSURES),
            Line.of(ContractTable.BLOOD_PRESSURES, "systolic=110"))
        .file(ContractTable.CODE_MAP, "code_map.csv", "administrations,GENT,atc,J01GB03,")
        .described();
  }

  private static void assertSameAsInMemory(Checked read) throws IOException {
    Outcome inMemory = Outcome.of(RowsInMemory.of(written).check());

    // The unknown column belongs to the header, and so to no row.
    assertEquals(List.of("unknown-column comment 1"), unknownColumns(read));
    assertEquals(inMemory.patients(), Outcome.of(read).patients());
    assertEquals(inMemory.quarantine(), Outcome.of(read).quarantine());
    assertEquals(inMemory.accounts(), Outcome.of(read).accounts());
    assertTrue(Outcome.of(read).findings().containsAll(inMemory.findings()));
    assertEquals(inMemory.findings().size() + 1, Outcome.of(read).findings().size());
  }

  @Test
  void readInSmallPartsItIsWhatItIsInMemory() throws IOException {
    assertSameAsInMemory(inSmallParts);
  }

  @Test
  void readWholeItIsWhatItIsInMemory() throws IOException {
    ReadExtract whole = open(written, WHOLE);

    assertSameAsInMemory(check(whole));
    assertEquals(whole.fingerprint(), fingerprintOfParts);
  }

  private static List<String> unknownColumns(Checked read) {
    return read.findings(ContractTable.RESULTS).stream()
        .filter(f -> f.startsWith("unknown-column"))
        .toList();
  }

  @Test
  void theRowsOfAPatientMeetOnce() {
    List<CheckedPatient> known =
        inSmallParts.patients().stream().filter(p -> p.patient().isPresent()).toList();

    assertEquals(
        List.of("P1", "P2", "P3"),
        known.stream().map(p -> p.patient().orElseThrow().patientId()).toList());
    assertEquals(
        List.of(88_400L, 106_080L, 114_920L),
        known.get(0).results().stream().map(CreatinineResult::nanomolesPerLitre).toList());
    assertEquals("J01GB03", known.get(0).administrations().get(0).atc());
    assertEquals(1, known.get(0).pressures().size());
  }

  @Test
  void staysReachThePatientOfTheirAdmission() {
    List<CheckedPatient> known =
        inSmallParts.patients().stream().filter(p -> p.patient().isPresent()).toList();

    assertEquals(
        List.of(1, 2, 0), known.stream().map(CheckedPatient::stays).map(List::size).toList());
    assertEquals(
        List.of(1, 1, 0), known.stream().map(CheckedPatient::admissions).map(List::size).toList());
  }

  @Test
  void rowsWithoutAKeyReachTheQuarantine() {
    Checked read = inSmallParts;

    assertEquals(List.of("4 missing patient_id"), read.broken(ContractTable.PATIENTS));
    assertEquals(
        List.of(
            "4 missing admission_id",
            "5 missing patient_id",
            "2 repeated-key admission_id",
            "3 orphan patient_id"),
        read.broken(ContractTable.ADMISSIONS));
    assertEquals(
        List.of("3 missing admission_id", "4 orphan admission_id"),
        read.broken(ContractTable.UNIT_STAYS));
    assertEquals(
        List.of("4 orphan patient_id", "5 missing patient_id"), read.broken(ContractTable.RESULTS));
    assertEquals(List.of("3 repeated-key unit_id"), read.broken(ContractTable.UNITS));
  }

  @Test
  void whatTheContractDoesNotHaveIsNotedOnce() throws IOException {
    new FilesOfAnExtract(folder)
        .required()
        .text(
            ContractTable.BODY_MEASURES, "body_measures.csv", "patient_id,measured_at,shoe_size\n")
        .resource("allergies", "allergies.csv")
        .described();
    List<String> findings = new ArrayList<>();
    open(folder, WHOLE)
        .findings()
        .forEach((Findings.Key key, Long count) -> findings.add(key.kind().word() + " " + count));

    assertEquals(List.of("unknown-column 1", "unknown-table 1", "empty-table 1"), findings);
  }

  @Test
  void theFingerprintTellsExtractsApart() throws IOException {
    new FilesOfAnExtract(folder).required().described();
    String before = open(folder, WHOLE).fingerprint();

    Files.writeString(
        folder.resolve("units.csv"), Files.readString(folder.resolve("units.csv")) + "\n");
    assertNotEquals(before, open(folder, WHOLE).fingerprint());
  }

  @Test
  void aRequiredTableWithoutRowsIsRefused() throws IOException {
    new FilesOfAnExtract(folder)
        .required()
        .text(ContractTable.UNITS, "units.csv", "unit_id,name,kind\n")
        .described();

    assertEquals(
        "units.csv has a header and no row; the table units is required: export its rows",
        assertThrows(ContractException.class, () -> open(folder, WHOLE)).getMessage());
  }

  @Test
  void aMissingColumnIsRefused() throws IOException {
    new FilesOfAnExtract(folder)
        .required()
        .text(ContractTable.UNITS, "units.csv", "unit_id,name\nICU,Intensive care\n")
        .described();

    assertTrue(
        assertThrows(ContractException.class, () -> open(folder, WHOLE))
            .getMessage()
            .startsWith("units.csv, line 1: the table units needs the column kind"));
  }

  @Test
  void aRefusalOfATaskIsTheCauseOfWhatIsThrown() throws IOException {
    new FilesOfAnExtract(folder)
        .required()
        .text(ContractTable.UNITS, "units.csv", "unit_id,name,kind\nICU,\"Intensive care,other\n")
        .described();
    Throwable thrown = assertThrows(Exception.class, () -> open(folder, WHOLE));
    while (thrown.getCause() != null && !(thrown instanceof ContractException)) {
      thrown = thrown.getCause();
    }

    assertTrue(thrown instanceof ContractException, thrown.toString());
    assertTrue(thrown.getMessage().startsWith("units.csv, line 2: a quoted field"));
  }
}
