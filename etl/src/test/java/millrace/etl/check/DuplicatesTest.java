package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.Line;
import millrace.etl.fixture.RowsInMemory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Extract contract, duplicates: rows equal as text, blanks trimmed, are merged before the rules.
 */
class DuplicatesTest {
  private static RowsInMemory twice(ContractTable table, String line, String other) {
    return RowsInMemory.besides(table).line(table, line).line(table, other);
  }

  /** Two identical finals: domain reference 10, V8c. */
  @ParameterizedTest
  @EnumSource(ContractTable.class)
  void equalRowsAreOne(ContractTable table) {
    String line = Line.of(table);
    Checked checked = twice(table, line, line).line(table, line).check();

    assertEquals(new Accounting.Line(3, 1, 2, 0), checked.account(table));
    assertEquals(List.of(), checked.broken(table));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        " P1 ,A1,2160-0, ,2031-03-02T06:00,,1.0,mg/dL,,",
        "\"P1\",\" A1\",\"2160-0\",\"\",\"2031-03-02T06:00\",\"\",\"1.0\",\"mg/dL\",\"\",\"\"",
        "P1,A1,2160-0,,2031-03-02T06:00,,1.0,mg/dL",
        "P1,A1,2160-0,,2031-03-02T06:00,,1.0,mg/dL,,,,",
        "P1,\tA1,2160-0,,2031-03-02T06:00,,1.0,\"mg/dL\r\n\",,"
      })
  void blanksAndQuotesAreNoDifference(String other) {
    Checked checked = twice(ContractTable.RESULTS, Line.of(ContractTable.RESULTS), other).check();

    assertEquals(new Accounting.Line(2, 1, 1, 0), checked.account(ContractTable.RESULTS));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "value=1.00",
        "unit=mg/dl",
        "status=final",
        "collected_at=2031-03-02 06:00",
        "admission_id=",
        "setting=unknown"
      })
  void anotherTextIsAnotherRow(String change) {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.RESULTS)
            .add(ContractTable.RESULTS, change)
            .check();

    assertEquals(new Accounting.Line(2, 2, 0, 0), checked.account(ContractTable.RESULTS));
    assertEquals(2, checked.all(CheckedPatient::results).size());
  }

  @Test
  void rowsOfFilesWithOtherColumnsAreComparedByColumn() {
    RowsInMemory rows = RowsInMemory.ofOnePatient().add(ContractTable.RESULTS);
    int other =
        rows.file(
            ContractTable.RESULTS,
            "unit",
            "value",
            "collected_at",
            "analyte",
            "admission_id",
            "patient_id");
    Checked checked =
        rows.line(ContractTable.RESULTS, other, "mg/dL,1.0,2031-03-02T06:00,2160-0,A1,P1").check();

    assertEquals(new Accounting.Line(2, 1, 1, 0), checked.account(ContractTable.RESULTS));
    assertEquals(2, checked.only(CheckedPatient::results).source().line());
  }

  @Test
  void theCopiesOfABrokenRowAreMerged() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.RESULTS, "value=high")
            .add(ContractTable.RESULTS)
            .add(ContractTable.RESULTS, "value=high")
            .add(ContractTable.RESULTS, "value=high")
            .check();

    assertEquals(List.of("2 unreadable value"), checked.broken(ContractTable.RESULTS));
    assertEquals(new Accounting.Line(4, 1, 2, 1), checked.account(ContractTable.RESULTS));
  }

  @Test
  void mergedRowsAddNoFinding() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.RESULTS, "value=<0.5")
            .add(ContractTable.RESULTS, "value=<0.5")
            .check();

    assertEquals(List.of("bounded-value value 1"), checked.findings(ContractTable.RESULTS));
  }

  @Test
  void manyRowsOfOnePatientMergeOnlyWithTheirEquals() {
    RowsInMemory rows = RowsInMemory.ofOnePatient();
    for (int i = 0; i < 600; i++) {
      rows.add(ContractTable.RESULTS, "value=" + (1 + i % 200));
    }
    Checked checked = rows.check();

    assertEquals(new Accounting.Line(600, 40, 400, 160), checked.account(ContractTable.RESULTS));
  }
}
