package millrace.etl.contract;

import static millrace.etl.contract.Column.of;
import static millrace.etl.contract.Column.text;
import static millrace.etl.contract.Column.words;
import static millrace.etl.contract.ColumnKind.BIRTH_DATE;
import static millrace.etl.contract.ColumnKind.MEASURED_NUMBER;
import static millrace.etl.contract.ColumnKind.NUMBER;
import static millrace.etl.contract.ColumnKind.TIME;
import static millrace.etl.contract.ColumnKind.TIME_OR_END_OF_DAY;
import static millrace.etl.contract.ColumnKind.TIME_OR_NOON;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import millrace.etl.record.ConditionCodeSystem;
import millrace.etl.record.DischargeStatus;
import millrace.etl.record.DoseAction;
import millrace.etl.record.DoseBasis;
import millrace.etl.record.Modality;
import millrace.etl.record.PressureMethod;
import millrace.etl.record.ReplacementPurpose;
import millrace.etl.record.ResultSetting;
import millrace.etl.record.ResultStatus;
import millrace.etl.record.Route;
import millrace.etl.record.Sex;
import millrace.etl.record.UnitKind;

/** The tables of the extract contract and their columns, in the contract's order. */
public enum ContractTable {
  /** One row per patient. */
  PATIENTS(
      true,
      text("patient_id").starred(),
      words("sex", Sex.values()).starred(),
      of("birth_date", BIRTH_DATE).starred(),
      of("died_at", TIME_OR_END_OF_DAY)),
  /** One row per admission. */
  ADMISSIONS(
      true,
      text("admission_id").starred(),
      text("patient_id").starred(),
      of("admitted_at", TIME).starred(),
      of("discharged_at", TIME),
      words("discharge_status", DischargeStatus.values())),
  /** One row per stay in a unit. */
  UNIT_STAYS(
      true,
      text("admission_id").starred(),
      text("unit_id").starred(),
      of("entered_at", TIME).starred(),
      of("left_at", TIME)),
  /** One row per unit. */
  UNITS(
      true,
      text("unit_id").starred(),
      text("name").starred(),
      words("kind", UnitKind.values()).starred(),
      text("site")),
  /** Laboratory results. */
  RESULTS(
      true,
      text("patient_id").starred(),
      text("admission_id"),
      text("analyte").starred(),
      words("code_system", LaboratoryCodeSystem.values()),
      of("collected_at", TIME).starred(),
      of("resulted_at", TIME),
      of("value", MEASURED_NUMBER).starred(),
      text("unit").starred(),
      words("status", ResultStatus.values()),
      words("setting", ResultSetting.values())),
  /** Doses given or ordered. */
  ADMINISTRATIONS(
      true,
      text("patient_id").starred(),
      text("admission_id"),
      text("drug").starred(),
      words("code_system", DrugCodeSystem.values()),
      text("drug_name"),
      words("route", Route.values()).starred(),
      of("started_at", TIME_OR_NOON).starred(),
      of("ended_at", TIME),
      text("dose"),
      text("dose_unit"),
      words("action", DoseAction.values()),
      words("basis", DoseBasis.values())),
  /** Blood pressures in mmHg. */
  BLOOD_PRESSURES(
      true,
      text("patient_id").starred(),
      text("admission_id"),
      of("measured_at", TIME).starred(),
      of("systolic", NUMBER),
      of("diastolic", NUMBER),
      of("mean", NUMBER),
      words("method", PressureMethod.values())),
  /** Dialysis and filtration. */
  KIDNEY_REPLACEMENTS(
      false,
      text("patient_id").starred(),
      text("admission_id"),
      of("started_at", TIME_OR_NOON).starred(),
      of("ended_at", TIME),
      words("modality", Modality.values()),
      words("purpose", ReplacementPurpose.values())),
  /** Coded conditions. */
  CONDITIONS(
      false,
      text("patient_id").starred(),
      text("admission_id"),
      text("code").starred(),
      words("code_system", ConditionCodeSystem.values()).starred(),
      of("recorded_at", TIME_OR_NOON)),
  /** Urine volumes: kept and counted, not used by any criterion. */
  URINE_OUTPUTS(
      false,
      text("patient_id").starred(),
      text("admission_id"),
      of("started_at", TIME),
      of("ended_at", TIME).starred(),
      of("volume_ml", NUMBER).starred()),
  /** Weights and heights. */
  BODY_MEASURES(
      false,
      text("patient_id").starred(),
      of("measured_at", TIME).starred(),
      of("weight_kg", NUMBER),
      of("height_cm", NUMBER)),
  /** Local codes and what they stand for. */
  CODE_MAP(
      false,
      words("table", MappedTable.values()).starred(),
      text("local_code").starred(),
      text("code_system").starred(),
      text("code").starred(),
      text("name"));

  private final boolean required;
  private final List<Column> columns;

  ContractTable(boolean required, Column... columns) {
    this.required = required;
    this.columns = List.of(columns);
  }

  /** The resource's name in the descriptor. */
  public String tableName() {
    return name().toLowerCase(java.util.Locale.ROOT);
  }

  /** Whether an extract must have it. */
  public boolean required() {
    return required;
  }

  /** Its columns, in the contract's order. */
  public List<Column> columns() {
    return columns;
  }

  /**
   * Position of a column in {@link #columns()}.
   *
   * @throws IllegalArgumentException if the table has no such column
   */
  public int column(String name) {
    for (int i = 0; i < columns.size(); i++) {
      if (columns.get(i).name().equals(name)) {
        return i;
      }
    }
    throw new IllegalArgumentException("table " + tableName() + " has no column " + name);
  }

  /** The table of that resource name, or empty. */
  public static Optional<ContractTable> named(String name) {
    return Arrays.stream(values()).filter(t -> t.tableName().equals(name)).findFirst();
  }
}
