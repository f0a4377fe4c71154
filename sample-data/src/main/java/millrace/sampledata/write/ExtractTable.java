package millrace.sampledata.write;

import java.util.List;

/**
 * The tables of the extract with their columns, in the order in which this hospital writes them.
 */
public enum ExtractTable {
  PATIENTS("patients", false, "patient_id", "sex", "birth_date", "died_at"),
  ADMISSIONS(
      "admissions",
      false,
      "admission_id",
      "patient_id",
      "admitted_at",
      "discharged_at",
      "discharge_status"),
  UNIT_STAYS("unit_stays", false, "admission_id", "unit_id", "entered_at", "left_at"),
  UNITS("units", true, "unit_id", "name", "kind", "site"),
  RESULTS(
      "results",
      false,
      "patient_id",
      "admission_id",
      "analyte",
      "code_system",
      "collected_at",
      "resulted_at",
      "value",
      "unit",
      "status",
      "setting"),
  ADMINISTRATIONS(
      "administrations",
      false,
      "patient_id",
      "admission_id",
      "drug",
      "code_system",
      "drug_name",
      "route",
      "started_at",
      "ended_at",
      "dose",
      "dose_unit",
      "action",
      "basis"),
  BLOOD_PRESSURES(
      "blood_pressures",
      false,
      "patient_id",
      "admission_id",
      "measured_at",
      "systolic",
      "diastolic",
      "mean",
      "method"),
  KIDNEY_REPLACEMENTS(
      "kidney_replacements",
      false,
      "patient_id",
      "admission_id",
      "started_at",
      "ended_at",
      "modality",
      "purpose"),
  /** With a column more than the contract knows, in an order of its own. */
  CONDITIONS(
      "conditions",
      false,
      "code",
      "code_system",
      "patient_id",
      "admission_id",
      "recorded_at",
      "description"),
  URINE_OUTPUTS(
      "urine_outputs", false, "patient_id", "admission_id", "started_at", "ended_at", "volume_ml"),
  BODY_MEASURES("body_measures", false, "patient_id", "measured_at", "weight_kg", "height_cm"),
  CODE_MAP("code_map", true, "table", "local_code", "code_system", "code", "name");

  private final String word;
  private final boolean single;
  private final List<String> columns;

  ExtractTable(String word, boolean single, String... columns) {
    this.word = word;
    this.single = single;
    this.columns = List.of(columns);
  }

  /**
   * Name of the table.
   *
   * @return the name
   */
  public String word() {
    return word;
  }

  /**
   * Whether the table is one file, however many parts the others have.
   *
   * @return true for units and the code map
   */
  public boolean single() {
    return single;
  }

  /**
   * Header.
   *
   * @return names of the columns
   */
  public List<String> columns() {
    return columns;
  }
}
