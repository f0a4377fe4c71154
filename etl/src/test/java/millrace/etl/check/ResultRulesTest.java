package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import millrace.etl.record.CreatinineResult;
import millrace.etl.record.ResultSetting;
import millrace.etl.record.Seconds;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Extract contract, row rules: unit-of-measure, implausible, not-final; and what becomes of a
 * value.
 */
class ResultRulesTest {
  private static Checked result(String... changes) {
    return RowsInMemory.ofOnePatient()
        .add(ContractTable.CODE_MAP, "local_code=CREA", "code=2160-0")
        .add(ContractTable.CODE_MAP, "local_code=UCREA", "code=2161-8")
        .add(ContractTable.RESULTS, changes)
        .check();
  }

  private static List<String> broken(String... changes) {
    return result(changes).broken(ContractTable.RESULTS);
  }

  private static List<Long> nanomoles(Checked checked) {
    return checked.all(CheckedPatient::results).stream()
        .map(CreatinineResult::nanomolesPerLitre)
        .toList();
  }

  /** Factors: methods 1. 88 umol/L, 1.3 mg/dL and 124 umol/L: domain reference 10, V7. */
  @ParameterizedTest
  @CsvSource({
    "1.3,     mg/dL,        114920",
    "0.3,     MG/DL,        26520",
    "4.0,     mg/dl,        353600",
    "88,      umol/L,       88000",
    "124,     \u00B5mol/L,  124000",
    "89,      \u03BCmol/L,  89000",
    "26.5,    UMOL/L,       26500",
    "13,      mg/L,         114920",
    "0.115,   mmol/L,       115000",
    "88.0004, umol/L,       88000",
    "88.0005, umol/L,       88001",
    "1.005,   mg/dL,        88842",
    "1e2,     umol/L,       100000"
  })
  void creatinineIsExactNanomoles(String value, String unit, long nanomoles) {
    assertEquals(List.of(nanomoles), nanomoles(result("value=" + value, "unit=" + unit)));
  }

  @ParameterizedTest
  @ValueSource(strings = {"g/L", "mg", "mol/L", "mg/100mL", "ug/dL", "mL/min", "1"})
  void aUnitThatCannotBeConvertedIsRefused(String unit) {
    assertEquals(List.of("2 unit-of-measure unit"), broken("unit=" + unit));
  }

  /** Bounds: 0.1 and 40 mg/dL. 115 labelled mg/dL: domain reference 10, V7d. */
  @ParameterizedTest
  @CsvSource({
    "0.1,      mg/dL,  true",
    "0.09,     mg/dL,  false",
    "40,       mg/dL,  true",
    "40.00,    mg/dL,  true",
    "40.01,    mg/dL,  false",
    "115,      mg/dL,  false",
    "0,        mg/dL,  false",
    "-1.0,     mg/dL,  false",
    "8.84,     umol/L, true",
    "8.83,     umol/L, false",
    "3536,     umol/L, true",
    "3536.01,  umol/L, false",
    "1,        mg/L,   true",
    "0.99,     mg/L,   false",
    "400,      mg/L,   true",
    "400.1,    mg/L,   false",
    "0.00884,  mmol/L, true",
    "3.536,    mmol/L, true",
    "3.537,    mmol/L, false",
    "1e30,     mg/dL,  false",
    "12345678901234567890, umol/L, false"
  })
  void creatinineOutOfItsBoundsIsImplausible(String value, String unit, boolean kept) {
    assertEquals(
        kept ? List.of() : List.of("2 implausible value"),
        broken("value=" + value, "unit=" + unit));
  }

  @ParameterizedTest
  @CsvSource({
    "final, ''",
    "corrected, ''",
    "'', ''",
    "preliminary, 2 not-final status",
    "cancelled, 2 not-final status"
  })
  void onlyFinalAndCorrectedResultsStand(String status, String rule) {
    List<String> expected = rule.isEmpty() ? List.of() : List.of(rule);

    assertEquals(expected, broken("status=" + status));
    assertEquals(expected, broken("status=" + status, "analyte=2823-3", "unit=mmol/L"));
  }

  /** Domain reference 10, V8: 1.0 final and 1.4 preliminary at one instant. */
  @Test
  void aPreliminaryValueGivesWayToTheFinalOne() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(ContractTable.RESULTS, "value=1.0", "status=final")
            .add(ContractTable.RESULTS, "value=1.4", "status=preliminary")
            .check();

    assertEquals(List.of(88_400L), nanomoles(checked));
    assertEquals(List.of("3 not-final status"), checked.broken(ContractTable.RESULTS));
  }

  /** Extract contract: a value written {@code <x} or {@code >x} is read as x and counted. */
  @ParameterizedTest
  @CsvSource({"<0.2, 17680", "> 20, 1768000", "<  1.0, 88400", ">40, 3536000"})
  void aBoundedValueIsReadAsItsBoundAndCounted(String value, long nanomoles) {
    Checked checked = result("value=" + value);

    assertEquals(List.of(nanomoles), nanomoles(checked));
    assertEquals(List.of("bounded-value value 1"), checked.findings(ContractTable.RESULTS));
  }

  @Test
  void aBoundedValueIsHeldAgainstTheBoundsToo() {
    assertEquals(List.of("2 implausible value"), broken("value=<0.05"));
  }

  @ParameterizedTest
  @CsvSource({
    "2160-0,  '',    1, ''",
    "2160-0,  loinc, 1, ''",
    "38483-4, '',    1, ''",
    "14682-9, '',    1, ''",
    "77140-2, '',    1, ''",
    "21232-4, '',    1, ''",
    "59826-8, '',    1, ''",
    "CREA,    local, 1, ''",
    "2161-8,  '',    0, unused-analyte 2161-8 1",
    "2823-3,  '',    0, unused-analyte 2823-3 1",
    "CREA,    loinc, 0, unused-analyte CREA 1",
    "UCREA,   local, 0, unused-analyte UCREA 1",
    "crea,    local, 0, unmapped-code crea 1",
    "2160-0,  local, 0, unmapped-code 2160-0 1"
  })
  void theCodeTellsCreatinine(String analyte, String system, int results, String finding) {
    Checked checked = result("analyte=" + analyte, "code_system=" + system);

    assertEquals(results, checked.all(CheckedPatient::results).size());
    assertEquals(1, checked.account(ContractTable.RESULTS).kept());
    assertEquals(
        finding.isEmpty() ? List.of() : List.of(finding), checked.findings(ContractTable.RESULTS));
  }

  @Test
  void anotherAnalyteIsHeldAgainstNoUnitAndNoBound() {
    Checked checked = result("analyte=2161-8", "value=9000", "unit=furlong");

    assertEquals(List.of(), checked.broken(ContractTable.RESULTS));
    assertEquals(1, checked.account(ContractTable.RESULTS).kept());
  }

  @Test
  void aResultKeepsWhatItSays() {
    CreatinineResult result =
        result(
                "collected_at=2031-03-02T06:00:30",
                "resulted_at=2031-03-02T07:00",
                "setting=emergency")
            .only(CheckedPatient::results);

    assertEquals(1_930_197_630L, result.collectedAt());
    assertEquals(1_930_201_200L, result.resultedAt());
    assertEquals(ResultSetting.EMERGENCY, result.setting());
    assertEquals("A1", result.admissionId());
    assertEquals(2, result.source().line());
  }

  @Test
  void whatIsNotSaidIsUnknownOrAbsent() {
    CreatinineResult result = result("admission_id=").only(CheckedPatient::results);

    assertEquals(Seconds.ABSENT, result.resultedAt());
    assertEquals(ResultSetting.UNKNOWN, result.setting());
    assertEquals("", result.admissionId());
  }
}
