package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Set;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import millrace.etl.record.Admission;
import millrace.etl.record.Sex;
import millrace.etl.record.UnitKind;
import org.junit.jupiter.api.Test;

/** Extract contract, row rules: repeated-key; a later row with a key already seen. */
class RepeatedKeyRuleTest {
  @Test
  void theFirstRowOfAPatientStands() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.PATIENTS, "sex=male")
            .add(ContractTable.PATIENTS, "sex=female")
            .add(ContractTable.PATIENTS, "sex=male", "died_at=2031-03-20")
            .check();

    assertEquals(
        List.of("3 repeated-key patient_id", "4 repeated-key patient_id"),
        checked.broken(ContractTable.PATIENTS));
    assertEquals(Sex.MALE, checked.patients().get(0).patient().orElseThrow().sex());
  }

  @Test
  void aBrokenFirstRowHasBeenSeenToo() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.PATIENTS, "sex=none")
            .add(ContractTable.PATIENTS, "sex=female")
            .add(ContractTable.UNITS, "kind=none")
            .add(ContractTable.UNITS)
            .check();

    assertEquals(
        List.of("2 unknown-word sex", "3 repeated-key patient_id"),
        checked.broken(ContractTable.PATIENTS));
    assertEquals(
        List.of("2 unknown-word kind", "3 repeated-key unit_id"),
        checked.broken(ContractTable.UNITS));
  }

  @Test
  void aRowThatBreaksAnEarlierRuleIsReportedByThat() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.PATIENTS)
            .add(ContractTable.PATIENTS, "birth_date=")
            .check();

    assertEquals(List.of("3 missing birth_date"), checked.broken(ContractTable.PATIENTS));
  }

  @Test
  void twoPatientsMayAgreeInAllButTheKey() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.PATIENTS)
            .add(ContractTable.PATIENTS, "patient_id=p1")
            .check();

    assertEquals(List.of(), checked.quarantine());
    assertEquals(2, checked.account(ContractTable.PATIENTS).kept());
  }

  @Test
  void theFirstRowOfAUnitStands() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.UNITS, "kind=surgical")
            .add(ContractTable.UNITS, "kind=medical")
            .add(ContractTable.UNITS, "unit_id=HDU", "kind=step-down")
            .check();

    assertEquals(List.of("3 repeated-key unit_id"), checked.broken(ContractTable.UNITS));
    assertEquals(UnitKind.SURGICAL, checked.units().get("ICU").kind());
    assertEquals(Set.of("ICU", "HDU"), checked.units().keySet());
  }

  @Test
  void theFirstRowOfAnAdmissionStands() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.ADMISSIONS, "admitted_at=2031-02-20T08:00")
            .check();

    assertEquals(List.of("3 repeated-key admission_id"), checked.broken(ContractTable.ADMISSIONS));
    assertEquals(2, checked.only(CheckedPatient::admissions).source().line());
  }

  @Test
  void theFirstRowStandsAcrossPatients() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.UNITS)
            .add(ContractTable.PATIENTS)
            .add(ContractTable.PATIENTS, "patient_id=P2")
            .add(ContractTable.ADMISSIONS, "patient_id=P2")
            .add(ContractTable.ADMISSIONS, "patient_id=P1")
            .add(ContractTable.UNIT_STAYS)
            .add(ContractTable.CONDITIONS, "patient_id=P1")
            .check();

    assertEquals(List.of("3 repeated-key admission_id"), checked.broken(ContractTable.ADMISSIONS));
    assertEquals(List.of(), checked.patients().get(0).admissions());
    assertEquals(1, checked.patients().get(1).stays().size());
    assertEquals(
        List.of("other-admission of another patient 1"),
        checked.findings(ContractTable.CONDITIONS));
  }

  @Test
  void aBrokenFirstAdmissionLeavesNone() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.UNITS)
            .add(ContractTable.PATIENTS)
            .add(ContractTable.ADMISSIONS, "admitted_at=soon")
            .add(ContractTable.ADMISSIONS)
            .add(ContractTable.UNIT_STAYS)
            .check();

    assertEquals(
        List.of("2 unreadable admitted_at", "3 repeated-key admission_id"),
        checked.broken(ContractTable.ADMISSIONS));
    assertEquals(List.of("2 orphan admission_id"), checked.broken(ContractTable.UNIT_STAYS));
  }

  @Test
  void anAdmissionOfAnUnknownPatientHasBeenSeenToo() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.PATIENTS)
            .add(ContractTable.ADMISSIONS, "patient_id=P9")
            .add(ContractTable.ADMISSIONS)
            .check();

    assertEquals(
        List.of("2 orphan patient_id", "3 repeated-key admission_id"),
        checked.broken(ContractTable.ADMISSIONS));
  }

  @Test
  void rowsWithoutAKeyRepeatNone() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.ADMISSIONS, "admission_id=")
            .add(ContractTable.ADMISSIONS, "admission_id=", "discharged_at=")
            .check();

    assertEquals(
        List.of("3 missing admission_id", "4 missing admission_id"),
        checked.broken(ContractTable.ADMISSIONS));
  }

  @Test
  void aCopyIsMergedAndRepeatsNothing() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.UNITS)
            .add(ContractTable.PATIENTS)
            .add(ContractTable.ADMISSIONS)
            .check();

    assertEquals(List.of(), checked.quarantine());
    for (ContractTable table :
        List.of(ContractTable.UNITS, ContractTable.PATIENTS, ContractTable.ADMISSIONS)) {
      assertEquals(new Accounting.Line(2, 1, 1, 0), checked.account(table));
    }
  }

  @Test
  void aCopyOfARepeatingRowIsMerged() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.ADMISSIONS, "discharged_at=")
            .add(ContractTable.ADMISSIONS, "discharged_at=")
            .check();

    assertEquals(new Accounting.Line(3, 1, 1, 1), checked.account(ContractTable.ADMISSIONS));
    assertEquals(
        List.of(2),
        checked.all(CheckedPatient::admissions).stream()
            .map(Admission::source)
            .map(s -> s.line())
            .toList());
  }
}
