package millrace.etl.check;

import java.util.Map;
import millrace.etl.contract.ContractTable;
import millrace.etl.record.Unit;
import millrace.etl.record.UnitStay;

/** Rows of {@code unit_stays}, which reach their patient through the admission. */
final class StayRows implements RowKind<UnitStay> {
  private static final ContractTable TABLE = ContractTable.UNIT_STAYS;
  private static final int ADMISSION_ID = TABLE.column("admission_id");
  private static final int UNIT_ID = TABLE.column("unit_id");
  private static final int ENTERED_AT = TABLE.column("entered_at");
  private static final int LEFT_AT = TABLE.column("left_at");

  private final Map<String, Unit> units;
  private final SharedRules rules;
  private final TextCache texts = new TextCache();

  StayRows(CheckContext context, Findings findings) {
    this.units = context.units();
    this.rules = new SharedRules(TABLE, context, findings);
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    if (!person.admissions().contains(row.text(ADMISSION_ID))) {
      return new Broken(Rule.ORPHAN, "admission_id");
    }
    if (!units.containsKey(texts.text(row.fields, UNIT_ID))) {
      return new Broken(Rule.ORPHAN, "unit_id");
    }
    return SharedRules.first(
        rules.reversed(row.seconds[ENTERED_AT], row.seconds[LEFT_AT], "left_at"),
        rules.timed(row.seconds[ENTERED_AT], person, "entered_at"));
  }

  @Override
  public UnitStay keep(ParsedRow row, Person person) {
    return new UnitStay(
        row.text(ADMISSION_ID),
        texts.text(row.fields, UNIT_ID),
        row.seconds[ENTERED_AT],
        rules.cut(row.seconds[LEFT_AT]),
        row.source);
  }
}
