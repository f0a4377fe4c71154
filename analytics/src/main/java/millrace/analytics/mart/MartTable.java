package millrace.analytics.mart;

import java.util.Arrays;
import java.util.Optional;

/**
 * The tables of a published run. Each is a folder {@code runs/<run-id>/<name>} of Parquet files
 * whose columns are the components of {@link #rowType()}, in order, named in snake case.
 */
public enum MartTable {
  /** Every kept admission with its cohort class. */
  ADMISSIONS("admissions", AdmissionRow.class),
  /** Every episode of acute kidney injury. */
  EPISODES("episodes", EpisodeRow.class),
  /** Rises too slow for the seven-day window. */
  GRADUAL_RISES("gradual_rises", GradualRiseRow.class),
  /** Incidence by month, unit and attribution. */
  UNIT_RATES("unit_rates", UnitRateRow.class),
  /** Exposed and unexposed incidence by agent, class, burden and combination. */
  DRUG_RATES("drug_rates", DrugRateRow.class),
  /** Agents exposing at an onset, with their doses. */
  LINKS("links", LinkRow.class),
  /** Admissions by cohort class. */
  FLOW("flow", FlowRow.class),
  /** Rows that broke a rule of the extract contract. */
  QUARANTINE("quarantine", QuarantineRow.class),
  /** Oddities that were kept, counted by kind. */
  FINDINGS("findings", FindingRow.class),
  /** Units of the hospital. */
  UNITS("units", UnitRow.class),
  /** Drug class and recent hypotension, together and apart. */
  CLASS_PRESSURE("class_pressure", ClassPressureRow.class),
  /** Unit incidence with and without recent hypotension. */
  UNIT_PRESSURE("unit_pressure", UnitPressureRow.class),
  /** How often creatinine is measured while a drug exposes. */
  MONITORING("monitoring", MonitoringRow.class),
  /** Creatinine results and occupied time by month and unit. */
  TESTING("testing", TestingRow.class),
  /** Time at risk and counted episodes by day and stratum. */
  RISK_CUBE("risk_cube", RiskCubeRow.class),
  /** Creatinine results of the patients with an episode or a gradual rise. */
  RESULTS("results", ResultLine.class),
  /** Doses of the same patients. */
  DOSES("doses", DoseLine.class),
  /** Blood pressures of the same patients. */
  PRESSURES("pressures", PressureLine.class),
  /** Unit stays of the same patients. */
  STAYS("stays", StayLine.class),
  /** Kidney replacements of the same patients. */
  REPLACEMENTS("replacements", ReplacementLine.class);

  private final String tableName;
  private final Class<? extends Record> rowType;

  MartTable(String tableName, Class<? extends Record> rowType) {
    this.tableName = tableName;
    this.rowType = rowType;
  }

  /** The table's name: its folder in a run, and its name for an export. */
  public String tableName() {
    return tableName;
  }

  /** The record of one row. */
  public Class<? extends Record> rowType() {
    return rowType;
  }

  /** The table of that name, or empty. */
  public static Optional<MartTable> named(String name) {
    return Arrays.stream(values()).filter(t -> t.tableName.equals(name)).findFirst();
  }
}
