package millrace.etl.check;

import millrace.etl.contract.ContractTable;
import millrace.etl.record.BodyHeight;

/** Rows of {@code body_measures}; heights become canonical rows. */
final class BodyMeasureRows implements RowKind<BodyHeight> {
  private static final long MICROS = 1_000_000;
  private static final long HIGHEST_CENTIMETRES = 300;
  private static final ContractTable TABLE = ContractTable.BODY_MEASURES;
  private static final int MEASURED_AT = TABLE.column("measured_at");
  private static final int HEIGHT = TABLE.column("height_cm");

  private final SharedRules rules;

  BodyMeasureRows(CheckContext context, Findings findings) {
    this.rules = new SharedRules(TABLE, context, findings);
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    Broken orphan = rules.orphanPatient(person);
    return orphan != null ? orphan : rules.timed(row.seconds[MEASURED_AT], person, "measured_at");
  }

  @Override
  public BodyHeight keep(ParsedRow row, Person person) {
    if (!row.has(HEIGHT)) {
      return null;
    }
    try {
      long micros = row.numbers[HEIGHT].timesRounded(MICROS);
      // A height that no person has would only make the arithmetic of an eGFR overflow.
      return micros > 0 && micros <= HIGHEST_CENTIMETRES * MICROS
          ? new BodyHeight(row.seconds[MEASURED_AT], micros)
          : null;
    } catch (ArithmeticException e) {
      return null;
    }
  }
}
