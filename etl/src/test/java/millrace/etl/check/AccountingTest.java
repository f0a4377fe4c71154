package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.Function;
import millrace.etl.contract.Column;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Extract contract: rows read = rows kept + rows merged as duplicates + rows quarantined. */
class AccountingTest {
  /** Good in one column, bad in another. */
  private static final String[] VALUES = {
    "",
    "P1",
    "P2",
    "A1",
    "A2",
    "ICU",
    "x",
    "1960",
    "1.0",
    "<2",
    "90",
    "999",
    "mg/dL",
    "2160-0",
    "local",
    "final",
    "cancelled",
    "iv",
    "given",
    "held",
    "female",
    "cuff",
    "2031-03-02",
    "2031-03-02T08:00",
    "2031-03-30T01:30",
    "1950-01-01T08:00",
    "2031-07-01T00:00"
  };

  private record Dirty(ContractTable table, String[] changes) {}

  @Provide
  Arbitrary<List<Dirty>> rows() {
    Arbitrary<ContractTable> table = Arbitraries.of(ContractTable.class);
    return table.flatMap(AccountingTest::dirty).list().ofMaxSize(40);
  }

  private static Arbitrary<Dirty> dirty(ContractTable table) {
    Arbitrary<String> column = Arbitraries.of(table.columns()).map(Column::name);
    return Combinators.combine(column, Arbitraries.of(VALUES))
        .as((name, value) -> name + "=" + value)
        .array(String[].class)
        .ofMaxSize(2)
        .map(changes -> new Dirty(table, changes));
  }

  private static long canonical(Checked checked, ContractTable table) {
    Function<CheckedPatient, List<?>> rows =
        switch (table) {
          case PATIENTS -> p -> p.patient().stream().toList();
          case ADMISSIONS -> CheckedPatient::admissions;
          case UNIT_STAYS -> CheckedPatient::stays;
          case RESULTS -> CheckedPatient::results;
          case ADMINISTRATIONS -> CheckedPatient::administrations;
          case BLOOD_PRESSURES -> CheckedPatient::pressures;
          case KIDNEY_REPLACEMENTS -> CheckedPatient::replacements;
          case CONDITIONS -> CheckedPatient::conditions;
          case BODY_MEASURES -> CheckedPatient::heights;
          case UNITS -> p -> List.of();
          case CODE_MAP, URINE_OUTPUTS -> p -> List.of();
        };
    return checked.patients().stream().mapToLong(p -> rows.apply(p).size()).sum();
  }

  @Property(tries = 400)
  void noRowIsLost(@ForAll("rows") List<Dirty> dirty) {
    RowsInMemory rows = RowsInMemory.ofOnePatient();
    dirty.forEach(d -> rows.add(d.table(), d.changes()));
    Checked checked = rows.check();

    for (ContractTable table : ContractTable.values()) {
      Accounting.Line account = checked.account(table);
      assertTrue(account.balances(), table + " " + account);
      assertEquals(rows.rows(table), account.read());
      assertEquals(checked.broken(table).size(), account.quarantined());
      assertTrue(canonical(checked, table) <= account.kept(), table + " " + account);
    }
    assertEquals(
        checked.quarantine().size(),
        checked.quarantine().stream().map(Quarantined::source).distinct().count());
  }

  @Property(tries = 200)
  void tablesWhoseRowsAreAllUsedKeepAsManyAsTheyGive(@ForAll("rows") List<Dirty> dirty) {
    RowsInMemory rows = RowsInMemory.ofOnePatient();
    dirty.forEach(d -> rows.add(d.table(), d.changes()));
    Checked checked = rows.check();

    for (ContractTable table :
        List.of(
            ContractTable.PATIENTS,
            ContractTable.ADMISSIONS,
            ContractTable.UNIT_STAYS,
            ContractTable.ADMINISTRATIONS,
            ContractTable.BLOOD_PRESSURES,
            ContractTable.KIDNEY_REPLACEMENTS,
            ContractTable.CONDITIONS)) {
      assertEquals(checked.account(table).kept(), canonical(checked, table), table.tableName());
    }
    assertEquals(checked.account(ContractTable.UNITS).kept(), checked.units().size());
  }

  @Example
  void aTableWithoutRowsHasZeros() {
    assertEquals(new Accounting.Line(0, 0, 0, 0), new Accounting().of(ContractTable.URINE_OUTPUTS));
  }

  @Example
  void accountsAddUp() {
    Accounting accounting = new Accounting();
    accounting.add(ContractTable.RESULTS, new Accounting.Line(5, 3, 1, 1));
    accounting.add(ContractTable.RESULTS, new Accounting.Line(2, 0, 0, 2));

    assertEquals(new Accounting.Line(7, 3, 1, 3), accounting.of(ContractTable.RESULTS));
    assertEquals(1, accounting.lines().size());
  }

  @Example
  void anAccountThatLosesARowDoesNotBalance() {
    assertEquals(false, new Accounting.Line(5, 3, 1, 0).balances());
    assertEquals(false, new Accounting.Line(5, 3, 1, 2).balances());
  }
}
