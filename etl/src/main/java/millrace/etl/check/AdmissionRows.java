package millrace.etl.check;

import java.util.Optional;
import millrace.etl.contract.ContractTable;
import millrace.etl.record.Admission;
import millrace.etl.record.DischargeStatus;

/** Rows of {@code admissions}. */
final class AdmissionRows implements RowKind<Admission> {
  private static final ContractTable TABLE = ContractTable.ADMISSIONS;
  private static final int ADMISSION_ID = TABLE.column("admission_id");
  private static final int ADMITTED_AT = TABLE.column("admitted_at");
  private static final int DISCHARGED_AT = TABLE.column("discharged_at");
  private static final int DISCHARGE_STATUS = TABLE.column("discharge_status");

  private final CheckContext context;
  private final SharedRules rules;

  AdmissionRows(CheckContext context, Findings findings) {
    this.context = context;
    this.rules = new SharedRules(TABLE, context, findings);
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    Broken orphan = rules.orphanPatient(person);
    if (orphan != null) {
      return orphan;
    }
    if (context.repeatedAdmissions().contains(row.source)) {
      return new Broken(Rule.REPEATED_KEY, "admission_id");
    }
    return brokenAfterKey(row, person);
  }

  /** The rules that come after repeated-key. */
  Broken brokenAfterKey(ParsedRow row, Person person) {
    return SharedRules.first(
        rules.reversed(row.seconds[ADMITTED_AT], row.seconds[DISCHARGED_AT], "discharged_at"),
        rules.timed(row.seconds[ADMITTED_AT], person, "admitted_at"));
  }

  @Override
  public Admission keep(ParsedRow row, Person person) {
    return new Admission(
        row.text(ADMISSION_ID),
        row.seconds[ADMITTED_AT],
        rules.cut(row.seconds[DISCHARGED_AT]),
        Optional.ofNullable(row.word(DISCHARGE_STATUS, DischargeStatus.values(), null)),
        row.source);
  }

  static String id(ParsedRow row) {
    return row.text(ADMISSION_ID);
  }
}
