package millrace.etl.check;

import millrace.etl.contract.ContractTable;
import millrace.etl.record.Seconds;

/** Rows of {@code urine_outputs}: checked and counted; no criterion uses them. */
final class UrineRows implements RowKind<Void> {
  private static final ContractTable TABLE = ContractTable.URINE_OUTPUTS;
  private static final int ADMISSION_ID = TABLE.column("admission_id");
  private static final int STARTED_AT = TABLE.column("started_at");
  private static final int ENDED_AT = TABLE.column("ended_at");

  private final SharedRules rules;

  UrineRows(CheckContext context, Findings findings) {
    this.rules = new SharedRules(TABLE, context, findings);
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    Broken rule = rules.orphan(row, person, ADMISSION_ID, row.text(ADMISSION_ID));
    if (rule == null) {
      rule = rules.reversed(row.seconds[STARTED_AT], row.seconds[ENDED_AT], "ended_at");
    }
    boolean started = Seconds.given(row.seconds[STARTED_AT]);
    return rule != null
        ? rule
        : rules.timed(
            started ? row.seconds[STARTED_AT] : row.seconds[ENDED_AT],
            person,
            started ? "started_at" : "ended_at");
  }

  @Override
  public Void keep(ParsedRow row, Person person) {
    return null;
  }
}
