package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Extract contract, row rules: orphan. A row refers to rows that are kept. */
class OrphanRuleTest {
  private static Stream<ContractTable> tablesWith(String column, ContractTable owner) {
    return Arrays.stream(ContractTable.values())
        .filter(t -> t != owner)
        .filter(t -> t.columns().stream().anyMatch(c -> c.name().equals(column)));
  }

  private static Stream<ContractTable> tablesOfPatients() {
    return tablesWith("patient_id", ContractTable.PATIENTS);
  }

  private static Stream<ContractTable> tablesOfAdmissions() {
    return tablesWith("admission_id", ContractTable.ADMISSIONS);
  }

  private static Stream<ContractTable> tablesThatMayNameAnAdmission() {
    return tablesOfAdmissions().filter(t -> t != ContractTable.UNIT_STAYS);
  }

  private static List<String> lastBroken(RowsInMemory rows, ContractTable table) {
    List<String> broken = rows.check().broken(table);
    return broken.isEmpty() ? broken : broken.subList(broken.size() - 1, broken.size());
  }

  @ParameterizedTest
  @MethodSource("tablesOfPatients")
  void aRowOfAnUnknownPatientIsAnOrphan(ContractTable table) {
    RowsInMemory rows = RowsInMemory.besides(table).add(table, "patient_id=P2");

    assertEquals(List.of("2 orphan patient_id"), rows.check().broken(table));
  }

  @ParameterizedTest
  @MethodSource("tablesOfPatients")
  void aRowOfAPatientInTheQuarantineIsAnOrphan(ContractTable table) {
    RowsInMemory rows =
        RowsInMemory.empty()
            .add(ContractTable.UNITS)
            .add(ContractTable.PATIENTS, "sex=none")
            .add(table);

    assertEquals(List.of("2 orphan patient_id"), rows.check().broken(table));
  }

  @ParameterizedTest
  @MethodSource("tablesOfAdmissions")
  void aRowOfAnUnknownAdmissionIsAnOrphan(ContractTable table) {
    RowsInMemory rows = RowsInMemory.ofOnePatient().add(table, "admission_id=A2");

    assertEquals(List.of("2 orphan admission_id"), rows.check().broken(table));
  }

  @ParameterizedTest
  @MethodSource("tablesOfAdmissions")
  void aRowOfAnAdmissionInTheQuarantineIsAnOrphan(ContractTable table) {
    RowsInMemory rows =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.ADMISSIONS, "admission_id=A2", "discharged_at=2031-02-01T08:00")
            .add(table, "admission_id=A2");

    assertEquals(List.of("3 reversed discharged_at"), lastBroken(rows, ContractTable.ADMISSIONS));
    assertEquals(List.of("2 orphan admission_id"), rows.check().broken(table));
  }

  @ParameterizedTest
  @MethodSource("tablesThatMayNameAnAdmission")
  void anAdmissionNeedNotBeNamed(ContractTable table) {
    Checked checked = RowsInMemory.ofOnePatient().add(table, "admission_id=").check();

    assertEquals(List.of(), checked.broken(table));
    assertEquals(1, checked.account(table).kept());
  }

  @ParameterizedTest
  @MethodSource("tablesThatMayNameAnAdmission")
  void anotherPatientsAdmissionIsAFinding(ContractTable table) {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.PATIENTS, "patient_id=P2")
            .add(ContractTable.ADMISSIONS, "patient_id=P2", "admission_id=A2")
            .add(table, "admission_id=A2")
            .check();

    assertEquals(List.of(), checked.broken(table));
    assertEquals(1, checked.account(table).kept());
    assertTrue(checked.findings(table).contains("other-admission of another patient 1"));
  }

  @Test
  void aStayInAnUnknownUnitIsAnOrphan() {
    RowsInMemory rows =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.UNITS, "unit_id=HDU", "kind=none")
            .add(ContractTable.UNIT_STAYS, "unit_id=M1")
            .add(ContractTable.UNIT_STAYS, "unit_id=HDU")
            .add(ContractTable.UNIT_STAYS, "unit_id=icu");

    assertEquals(
        List.of("2 orphan unit_id", "3 orphan unit_id", "4 orphan unit_id"),
        rows.check().broken(ContractTable.UNIT_STAYS));
  }

  @Test
  void aStayReachesThePatientOfItsAdmission() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.PATIENTS, "patient_id=P2")
            .add(ContractTable.ADMISSIONS, "patient_id=P2", "admission_id=A2")
            .add(ContractTable.UNIT_STAYS, "admission_id=A2")
            .check();

    CheckedPatient second = checked.patients().get(1);
    assertEquals("P2", second.patient().orElseThrow().patientId());
    assertEquals("A2", second.stays().get(0).admissionId());
  }
}
