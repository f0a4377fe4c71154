package millrace.etl.check;

import millrace.etl.contract.ContractTable;
import millrace.etl.record.KidneyReplacement;
import millrace.etl.record.Modality;
import millrace.etl.record.ReplacementPurpose;

/** Rows of {@code kidney_replacements}. */
final class ReplacementRows implements RowKind<KidneyReplacement> {
  private static final ContractTable TABLE = ContractTable.KIDNEY_REPLACEMENTS;
  private static final int ADMISSION_ID = TABLE.column("admission_id");
  private static final int STARTED_AT = TABLE.column("started_at");
  private static final int ENDED_AT = TABLE.column("ended_at");
  private static final int MODALITY = TABLE.column("modality");
  private static final int PURPOSE = TABLE.column("purpose");

  private final SharedRules rules;

  ReplacementRows(CheckContext context, Findings findings) {
    this.rules = new SharedRules(TABLE, context, findings);
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    Broken rule = rules.orphan(row, person, ADMISSION_ID, row.text(ADMISSION_ID));
    if (rule == null) {
      rule = rules.reversed(row.seconds[STARTED_AT], row.seconds[ENDED_AT], "ended_at");
    }
    return rule != null ? rule : rules.timed(row.seconds[STARTED_AT], person, "started_at");
  }

  @Override
  public KidneyReplacement keep(ParsedRow row, Person person) {
    return new KidneyReplacement(
        row.seconds[STARTED_AT],
        rules.cut(row.seconds[ENDED_AT]),
        row.word(MODALITY, Modality.values(), Modality.UNKNOWN),
        row.word(PURPOSE, ReplacementPurpose.values(), ReplacementPurpose.UNKNOWN),
        row.source);
  }
}
