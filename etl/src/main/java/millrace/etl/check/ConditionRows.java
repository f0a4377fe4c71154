package millrace.etl.check;

import java.util.Locale;
import millrace.etl.contract.ContractTable;
import millrace.etl.record.Condition;
import millrace.etl.record.ConditionCodeSystem;

/** Rows of {@code conditions}. */
final class ConditionRows implements RowKind<Condition> {
  private static final ContractTable TABLE = ContractTable.CONDITIONS;
  private static final int ADMISSION_ID = TABLE.column("admission_id");
  private static final int CODE = TABLE.column("code");
  private static final int CODE_SYSTEM = TABLE.column("code_system");
  private static final int RECORDED_AT = TABLE.column("recorded_at");

  private final SharedRules rules;

  ConditionRows(CheckContext context, Findings findings) {
    this.rules = new SharedRules(TABLE, context, findings);
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    return SharedRules.first(
        rules.orphan(row, person, ADMISSION_ID, row.text(ADMISSION_ID)),
        person.known() ? rules.timed(row.seconds[RECORDED_AT], person, "recorded_at") : null);
  }

  @Override
  public Condition keep(ParsedRow row, Person person) {
    return new Condition(
        row.text(ADMISSION_ID),
        row.text(CODE).replace(".", "").replace(" ", "").toUpperCase(Locale.ROOT),
        row.word(CODE_SYSTEM, ConditionCodeSystem.values(), ConditionCodeSystem.ICD10),
        row.seconds[RECORDED_AT]);
  }
}
