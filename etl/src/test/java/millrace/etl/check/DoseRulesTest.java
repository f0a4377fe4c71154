package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import millrace.etl.record.Administration;
import millrace.etl.record.DoseBasis;
import millrace.etl.record.Route;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Extract contract, row rules: not-given; and what becomes of a dose. */
class DoseRulesTest {
  private static Checked dose(String... changes) {
    return RowsInMemory.ofOnePatient()
        .add(
            ContractTable.CODE_MAP,
            "table=administrations",
            "local_code=GENT",
            "code_system=atc",
            "code=J01GB03")
        .add(
            ContractTable.CODE_MAP,
            "table=administrations",
            "local_code=VANC",
            "code_system=rxnorm",
            "code=11124")
        .add(ContractTable.ADMINISTRATIONS, changes)
        .check();
  }

  @ParameterizedTest
  @CsvSource({
    "given, ''",
    "'', ''",
    "held, 2 not-given action",
    "refused, 2 not-given action",
    "stopped, 2 not-given action",
    "entered-in-error, 2 not-given action"
  })
  void aDoseNotGivenIsSetApart(String action, String rule) {
    Checked checked = dose("action=" + action);

    assertEquals(
        rule.isEmpty() ? List.of() : List.of(rule), checked.broken(ContractTable.ADMINISTRATIONS));
    assertEquals(rule.isEmpty() ? 1 : 0, checked.all(CheckedPatient::administrations).size());
  }

  @Test
  void anOrderIsKeptAndCounted() {
    Checked checked = dose("basis=ordered");

    assertEquals(DoseBasis.ORDERED, checked.only(CheckedPatient::administrations).basis());
    assertEquals(List.of("ordered-only 1"), checked.findings(ContractTable.ADMINISTRATIONS));
  }

  @ParameterizedTest
  @CsvSource({
    "J01GB03, '',     J01GB03, ''",
    "J01GB03, atc,    J01GB03, ''",
    "GENT,    local,  J01GB03, ''",
    "GENT,    atc,    GENT,    ''",
    "gent,    local,  '',      unmapped-code gent 1",
    "VANC,    local,  '',      unmapped-code VANC 1",
    "11124,   rxnorm, '',      unmapped-code 11124 1"
  })
  void theDrugIsBroughtToAtc(String drug, String system, String atc, String finding) {
    Checked checked = dose("drug=" + drug, "code_system=" + system);

    assertEquals(atc, checked.only(CheckedPatient::administrations).atc());
    assertEquals(drug, checked.only(CheckedPatient::administrations).drug());
    assertEquals(
        finding.isEmpty() ? List.of() : List.of(finding),
        checked.findings(ContractTable.ADMINISTRATIONS));
  }

  @ParameterizedTest
  @CsvSource({"240, mg, 240 mg", "240, '', 240", "'', mg, ''", "1 to 2, tablets, 1 to 2 tablets"})
  void theDoseIsTextWithItsUnit(String dose, String unit, String text) {
    assertEquals(
        text,
        dose("dose=" + dose, "dose_unit=" + unit).only(CheckedPatient::administrations).dose());
  }

  @Test
  void aDoseKeepsWhatItSays() {
    Administration dose =
        dose("route=intravitreal", "drug_name=Gentamicin, inj.")
            .only(CheckedPatient::administrations);

    assertEquals(Route.INTRAVITREAL, dose.route());
    assertEquals("Gentamicin, inj.", dose.drugName());
    assertEquals(DoseBasis.ADMINISTERED, dose.basis());
    assertEquals("A1", dose.admissionId());
  }

  @Test
  void unmappedCodesAreCountedByCode() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.ADMINISTRATIONS, "drug=X", "code_system=local", "dose=1")
            .add(ContractTable.ADMINISTRATIONS, "drug=X", "code_system=local", "dose=2")
            .add(ContractTable.ADMINISTRATIONS, "drug=Y", "code_system=local")
            .add(ContractTable.ADMINISTRATIONS, "drug=Z", "code_system=local", "action=held")
            .check();

    assertEquals(
        List.of("unmapped-code X 2", "unmapped-code Y 1"),
        checked.findings(ContractTable.ADMINISTRATIONS));
  }
}
