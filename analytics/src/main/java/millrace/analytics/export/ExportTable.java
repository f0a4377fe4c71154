package millrace.analytics.export;

import static millrace.analytics.export.ExportColumn.of;
import static millrace.analytics.export.ExportColumn.plain;
import static millrace.analytics.export.Format.DAYS;
import static millrace.analytics.export.Format.FOUR_DECIMALS;
import static millrace.analytics.export.Format.MILLIGRAMS_PER_DECILITRE;
import static millrace.analytics.export.Format.SIX_DIGITS;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import millrace.analytics.mart.MartTable;

/**
 * The tables that can be exported, with their columns in order and the number of leading columns
 * that order the rows.
 */
public enum ExportTable {
  /** Admissions. */
  ADMISSIONS(
      MartTable.ADMISSIONS,
      1,
      plain("admission_id"),
      plain("patient_id"),
      plain("class"),
      of("baseline_mg_dl", "baseline_nanomoles_per_litre", MILLIGRAMS_PER_DECILITRE),
      plain("results"),
      of("at_risk_days", "at_risk_seconds", DAYS)),
  /** Episodes. */
  EPISODES(
      MartTable.EPISODES,
      3,
      plain("patient_id"),
      plain("admission_id"),
      plain("onset_at"),
      plain("origin"),
      plain("evidence"),
      of("reference_mg_dl", "reference_nanomoles_per_litre", MILLIGRAMS_PER_DECILITRE),
      of("onset_mg_dl", "onset_nanomoles_per_litre", MILLIGRAMS_PER_DECILITRE),
      of("peak_mg_dl", "peak_nanomoles_per_litre", MILLIGRAMS_PER_DECILITRE),
      plain("peak_at"),
      plain("stage"),
      plain("closed_at"),
      plain("course"),
      plain("prolonged"),
      plain("outcome"),
      plain("unit_at_onset"),
      plain("unit_day_before"),
      plain("linked_agents"),
      plain("burden"),
      plain("combinations"),
      of("minutes_low", "minutes_low", FOUR_DECIMALS),
      of("lowest_map", "lowest_map", FOUR_DECIMALS),
      of("area_under_floor", "area_under_floor", FOUR_DECIMALS),
      of("observed_hours", "observed_hours", FOUR_DECIMALS),
      plain("spells"),
      plain("vasopressor"),
      plain("recent_hypotension")),
  /** Gradual rises. */
  GRADUAL_RISES(
      MartTable.GRADUAL_RISES,
      3,
      plain("patient_id"),
      plain("admission_id"),
      plain("first_at"),
      of("reference_mg_dl", "reference_nanomoles_per_litre", MILLIGRAMS_PER_DECILITRE),
      of("value_mg_dl", "value_nanomoles_per_litre", MILLIGRAMS_PER_DECILITRE)),
  /** Unit rates. */
  UNIT_RATES(
      MartTable.UNIT_RATES,
      3,
      plain("month"),
      plain("unit_id"),
      plain("attribution"),
      of("at_risk_days", "at_risk_seconds", DAYS),
      plain("episodes"),
      plain("stage2plus"),
      of("rate", "rate", SIX_DIGITS),
      of("lower", "lower", SIX_DIGITS),
      of("upper", "upper", SIX_DIGITS)),
  /** Drug rates. */
  DRUG_RATES(
      MartTable.DRUG_RATES,
      2,
      plain("level"),
      plain("subject"),
      of("exposed_days", "exposed_seconds", DAYS),
      plain("exposed_episodes"),
      of("unexposed_days", "unexposed_seconds", DAYS),
      plain("unexposed_episodes"),
      of("rate_ratio", "rate_ratio", SIX_DIGITS),
      of("lower", "lower", SIX_DIGITS),
      of("upper", "upper", SIX_DIGITS),
      of("p_mid", "p_mid", SIX_DIGITS),
      of("mh_ratio", "mh_ratio", SIX_DIGITS),
      of("mh_lower", "mh_lower", SIX_DIGITS),
      of("mh_upper", "mh_upper", SIX_DIGITS),
      of("q", "q", SIX_DIGITS)),
  /** Links of agents to onsets. */
  LINKS(
      MartTable.LINKS,
      3,
      plain("patient_id"),
      plain("onset_at"),
      plain("agent"),
      plain("class"),
      plain("mechanism"),
      plain("first_dose_at"),
      plain("last_dose_at"),
      plain("dose_days"),
      plain("doses")),
  /** Admissions by cohort class. */
  FLOW(MartTable.FLOW, 0, plain("class"), plain("admissions")),
  /** Rows that broke a rule. */
  QUARANTINE(
      MartTable.QUARANTINE,
      3,
      plain("table"),
      plain("file"),
      plain("line"),
      plain("rule"),
      plain("column"),
      plain("raw"));

  private final MartTable table;
  private final int ordering;
  private final List<ExportColumn> columns;

  ExportTable(MartTable table, int ordering, ExportColumn... columns) {
    this.table = table;
    this.ordering = ordering;
    this.columns = List.of(columns);
  }

  /** The published table. */
  public MartTable table() {
    return table;
  }

  /** How many of the first columns order the rows; 0 keeps the published order. */
  public int ordering() {
    return ordering;
  }

  /** Its columns, in order. */
  public List<ExportColumn> columns() {
    return columns;
  }

  /** Names of all tables that can be exported, joined. */
  public static String names() {
    return String.join(" ", Arrays.stream(values()).map(t -> t.table.tableName()).toList());
  }

  /** The export of that table name, or empty. */
  public static Optional<ExportTable> named(String name) {
    return Arrays.stream(values()).filter(t -> t.table.tableName().equals(name)).findFirst();
  }
}
