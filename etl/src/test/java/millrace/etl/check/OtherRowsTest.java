package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import millrace.etl.record.BodyHeight;
import millrace.etl.record.Condition;
import millrace.etl.record.DischargeStatus;
import millrace.etl.record.KidneyReplacement;
import millrace.etl.record.Modality;
import millrace.etl.record.Patient;
import millrace.etl.record.ReplacementPurpose;
import millrace.etl.record.Seconds;
import millrace.etl.record.Sex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What becomes of the rows of the tables that have no rule of their own; and the code map. */
class OtherRowsTest {
  @Test
  void aPatientKeepsWhatItsRowSays() {
    Patient patient =
        RowsInMemory.ofOnePatient("sex=other").check().patients().get(0).patient().orElseThrow();

    assertEquals("P1", patient.patientId());
    assertEquals(Sex.OTHER, patient.sex());
    assertEquals("1960-01-01", patient.birthDate().toString());
    assertEquals(Seconds.ABSENT, patient.diedAt());
  }

  @Test
  void anAdmissionWithoutStatusHasNone() {
    RowsInMemory rows =
        RowsInMemory.ofOnePatient()
            .add(
                ContractTable.ADMISSIONS,
                "admission_id=A2",
                "discharge_status=",
                "admitted_at=2031-04-01T08:00",
                "discharged_at=");

    assertEquals(
        List.of(Optional.of(DischargeStatus.HOME), Optional.empty()),
        rows.check().all(CheckedPatient::admissions).stream()
            .map(a -> a.dischargeStatus())
            .toList());
  }

  /** Methods 6: codes compare without point and case. */
  @ParameterizedTest
  @CsvSource({"N18.6, N186", "z99.2, Z992", "V45.11, V4511", "T86 .1, T861", "403.01, 40301"})
  void aConditionHasItsCodeWithoutPointAndInCapitals(String written, String code) {
    Condition condition =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.CONDITIONS, "code=" + written)
            .check()
            .only(CheckedPatient::conditions);

    assertEquals(code, condition.code());
    assertEquals("A1", condition.admissionId());
  }

  @ParameterizedTest
  @CsvSource({
    "170,      170000000",
    "118.5,    118500000",
    "49.00005, 49000050",
    "300,      300000000",
    "0,        ",
    "-170,     ",
    "300.1,    ",
    "1e20,     ",
    "'',       "
  })
  void aHeightIsKeptWhereAPersonCanHaveIt(String written, Long microCentimetres) {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.BODY_MEASURES, "height_cm=" + written, "weight_kg=70")
            .check();

    assertEquals(
        microCentimetres == null ? List.of() : List.of(microCentimetres),
        checked.all(CheckedPatient::heights).stream().map(BodyHeight::microCentimetres).toList());
    assertEquals(new Accounting.Line(1, 1, 0, 0), checked.account(ContractTable.BODY_MEASURES));
  }

  @Test
  void aReplacementKeepsWhatItsRowSays() {
    KidneyReplacement said =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.KIDNEY_REPLACEMENTS, "modality=intermittent", "purpose=maintenance")
            .check()
            .only(CheckedPatient::replacements);

    assertEquals(Modality.INTERMITTENT, said.modality());
    assertEquals(ReplacementPurpose.MAINTENANCE, said.purpose());
    assertEquals(Seconds.ABSENT, said.endedAt());
  }

  @Test
  void aReplacementThatSaysLittleIsOfUnknownKind() {
    KidneyReplacement said =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.KIDNEY_REPLACEMENTS)
            .check()
            .only(CheckedPatient::replacements);

    assertEquals(Modality.UNKNOWN, said.modality());
    assertEquals(ReplacementPurpose.UNKNOWN, said.purpose());
  }

  @Test
  void urineIsCheckedAndCounted() {
    Checked checked = RowsInMemory.ofOnePatient().add(ContractTable.URINE_OUTPUTS).check();

    assertEquals(new Accounting.Line(1, 1, 0, 0), checked.account(ContractTable.URINE_OUTPUTS));
  }

  @Test
  void theCodeMapHoldsOnlyCodesThatAreUsed() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.CODE_MAP)
            .add(ContractTable.CODE_MAP, "local_code=K", "code_system=own")
            .add(
                ContractTable.CODE_MAP,
                "table=administrations",
                "local_code=GENT",
                "code_system=atc",
                "code=J01GB03")
            .add(ContractTable.CODE_MAP, "table=conditions", "local_code=D", "code_system=icd10")
            .check();

    assertEquals(Optional.of("2160-0"), checked.codes().loinc("CREA"));
    assertEquals(Optional.empty(), checked.codes().loinc("K"));
    assertEquals(Optional.of("J01GB03"), checked.codes().atc("GENT"));
    assertEquals(Optional.empty(), checked.codes().atc("D"));
    assertEquals(new Accounting.Line(4, 4, 0, 0), checked.account(ContractTable.CODE_MAP));
  }

  @Test
  void theFirstEntryOfALocalCodeStandsAndTheOtherIsCounted() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.CODE_MAP, "code=2160-0")
            .add(ContractTable.CODE_MAP, "code=2161-8")
            .check();

    assertEquals(Optional.of("2160-0"), checked.codes().loinc("CREA"));
    assertEquals(List.of("repeated-code CREA 1"), checked.findings(ContractTable.CODE_MAP));
  }

  @Test
  void theQuarantineHoldsTheRowAsItIsWritten() {
    String raw = " P2,\"fe\"\"male\" ,1960,\u00B5";
    Quarantined row =
        RowsInMemory.empty().line(ContractTable.PATIENTS, raw).check().quarantine().get(0);

    assertEquals(raw, row.raw());
    assertEquals(ContractTable.PATIENTS, row.table());
    assertEquals(2, row.source().line());
  }
}
