package millrace.etl.check;

import static millrace.etl.record.BloodPressure.NANOS;
import static millrace.etl.record.BloodPressure.NONE;

import millrace.etl.contract.ContractTable;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.PressureMethod;

/**
 * Rows of {@code blood_pressures}: each field out of its bounds is emptied, and a row without a
 * field is broken.
 */
final class PressureRows implements RowKind<BloodPressure> {
  private static final long SYSTOLIC_LOWEST = 30 * NANOS;
  private static final long SYSTOLIC_HIGHEST = 300 * NANOS;
  private static final long DIASTOLIC_LOWEST = 10 * NANOS;
  private static final long DIASTOLIC_HIGHEST = 225 * NANOS;
  private static final long LEAST_DIFFERENCE = 5 * NANOS;
  private static final long MEAN_LOWEST = 20 * NANOS;
  private static final long MEAN_HIGHEST = 250 * NANOS;

  private static final ContractTable TABLE = ContractTable.BLOOD_PRESSURES;
  private static final int ADMISSION_ID = TABLE.column("admission_id");
  private static final int MEASURED_AT = TABLE.column("measured_at");
  private static final int SYSTOLIC = TABLE.column("systolic");
  private static final int DIASTOLIC = TABLE.column("diastolic");
  private static final int MEAN = TABLE.column("mean");
  private static final int METHOD = TABLE.column("method");

  private final SharedRules rules;
  private final Findings findings;
  private final TextCache texts = new TextCache();
  private String admissionId = "";
  private long systolic;
  private long diastolic;
  private long mean;

  PressureRows(CheckContext context, Findings findings) {
    this.rules = new SharedRules(TABLE, context, findings);
    this.findings = findings;
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    admissionId = texts.text(row.fields, ADMISSION_ID);
    Broken rule = rules.orphan(row, person, ADMISSION_ID, admissionId);
    if (rule == null) {
      rule = rules.timed(row.seconds[MEASURED_AT], person, "measured_at");
    }
    return rule != null ? rule : implausible(row);
  }

  @Override
  public BloodPressure keep(ParsedRow row, Person person) {
    countEmptied(row, SYSTOLIC, systolic);
    countEmptied(row, DIASTOLIC, diastolic);
    countEmptied(row, MEAN, mean);
    return new BloodPressure(
        row.seconds[MEASURED_AT],
        systolic,
        diastolic,
        mean,
        row.word(METHOD, PressureMethod.values(), PressureMethod.UNKNOWN),
        admissionId,
        row.source);
  }

  private Broken implausible(ParsedRow row) {
    systolic = within(row, SYSTOLIC, SYSTOLIC_LOWEST, SYSTOLIC_HIGHEST);
    diastolic = within(row, DIASTOLIC, DIASTOLIC_LOWEST, DIASTOLIC_HIGHEST);
    if (systolic != NONE && diastolic != NONE && diastolic > systolic - LEAST_DIFFERENCE) {
      diastolic = NONE;
    }
    mean = within(row, MEAN, MEAN_LOWEST, MEAN_HIGHEST);
    if (systolic != NONE || diastolic != NONE || mean != NONE) {
      return null;
    }
    int column =
        row.has(SYSTOLIC)
            ? SYSTOLIC
            : row.has(DIASTOLIC) ? DIASTOLIC : row.has(MEAN) ? MEAN : SYSTOLIC;
    return new Broken(Rule.IMPLAUSIBLE, TABLE.columns().get(column).name());
  }

  private void countEmptied(ParsedRow row, int column, long value) {
    if (row.has(column) && value == NONE) {
      findings.count(FindingKind.EMPTIED_PRESSURE, TABLE, TABLE.columns().get(column).name());
    }
  }

  private static long within(ParsedRow row, int column, long lowest, long highest) {
    if (!row.has(column)) {
      return NONE;
    }
    try {
      long value = row.numbers[column].timesRounded(NANOS);
      return value < lowest || value > highest ? NONE : value;
    } catch (ArithmeticException e) {
      return NONE;
    }
  }
}
