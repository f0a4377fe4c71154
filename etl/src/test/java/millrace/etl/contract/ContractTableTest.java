package millrace.etl.contract;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import millrace.etl.record.Word;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class ContractTableTest {
  /** Extract contract, tables: columns in order, {@code *} for required. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          patients            | true  | patient_id* sex* birth_date* died_at
          admissions          | true  | admission_id* patient_id* admitted_at* discharged_at discharge_status
          unit_stays          | true  | admission_id* unit_id* entered_at* left_at
          units               | true  | unit_id* name* kind* site
          results             | true  | patient_id* admission_id analyte* code_system collected_at* resulted_at value* unit* status setting
          administrations     | true  | patient_id* admission_id drug* code_system drug_name route* started_at* ended_at dose dose_unit action basis
          blood_pressures     | true  | patient_id* admission_id measured_at* systolic diastolic mean method
          kidney_replacements | false | patient_id* admission_id started_at* ended_at modality purpose
          conditions          | false | patient_id* admission_id code* code_system* recorded_at
          urine_outputs       | false | patient_id* admission_id started_at ended_at* volume_ml*
          body_measures       | false | patient_id* measured_at* weight_kg height_cm
          code_map            | false | table* local_code* code_system* code* name
          """)
  void hasTheColumnsOfTheContract(String name, boolean required, String columns) {
    ContractTable table = ContractTable.named(name).orElseThrow();

    assertEquals(name, table.tableName());
    assertEquals(required, table.required());
    assertEquals(
        columns,
        table.columns().stream()
            .map(c -> c.name() + (c.required() ? "*" : ""))
            .collect(Collectors.joining(" ")));
  }

  /** Extract contract, tables: the words of the coded columns. */
  @ParameterizedTest
  @CsvSource({
    "patients, sex, female male other unknown",
    "admissions, discharge_status, home transfer died other",
    "units, kind, critical-care step-down medical surgical oncology obstetric paediatric emergency"
        + " other",
    "results, code_system, loinc local",
    "results, status, final corrected preliminary cancelled",
    "results, setting, inpatient outpatient emergency unknown",
    "administrations, code_system, atc rxnorm local",
    "administrations, route, iv im sc po pr inhaled topical ophthalmic otic nasal intravitreal"
        + " intrathecal irrigation lock other unknown",
    "administrations, action, given held refused stopped entered-in-error",
    "administrations, basis, administered ordered",
    "blood_pressures, method, arterial-line cuff unknown",
    "kidney_replacements, modality, intermittent continuous peritoneal unknown",
    "kidney_replacements, purpose, acute maintenance unknown",
    "conditions, code_system, icd10 icd9",
    "code_map, table, results administrations conditions"
  })
  void hasTheWordsOfTheContract(String table, String column, String words) {
    ContractTable found = ContractTable.named(table).orElseThrow();

    assertEquals(
        List.of(words.split(" ")),
        found.columns().get(found.column(column)).words().stream().map(Word::word).toList());
  }

  @Test
  void onlyThoseColumnsAreCoded() {
    long coded =
        Arrays.stream(ContractTable.values())
            .flatMap(t -> t.columns().stream())
            .filter(c -> c.kind() == ColumnKind.WORD)
            .count();

    assertEquals(15, coded);
  }

  @ParameterizedTest
  @EnumSource(ContractTable.class)
  void aColumnIsFoundAtItsPosition(ContractTable table) {
    for (int i = 0; i < table.columns().size(); i++) {
      assertEquals(i, table.column(table.columns().get(i).name()));
    }
    assertThrows(IllegalArgumentException.class, () -> table.column("colour"));
  }

  @Test
  void anUnknownNameIsNoTable() {
    assertEquals(Optional.empty(), ContractTable.named("Patients"));
    assertEquals(Optional.empty(), ContractTable.named("allergies"));
  }
}
