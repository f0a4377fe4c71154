package millrace.etl.check;

import millrace.etl.contract.ContractTable;
import millrace.etl.contract.DrugCodeSystem;
import millrace.etl.normalise.CodeMap;
import millrace.etl.record.Administration;
import millrace.etl.record.DoseAction;
import millrace.etl.record.DoseBasis;
import millrace.etl.record.Route;

/** Rows of {@code administrations}. */
final class AdministrationRows implements RowKind<Administration> {
  private static final ContractTable TABLE = ContractTable.ADMINISTRATIONS;
  private static final int ADMISSION_ID = TABLE.column("admission_id");
  private static final int DRUG = TABLE.column("drug");
  private static final int CODE_SYSTEM = TABLE.column("code_system");
  private static final int DRUG_NAME = TABLE.column("drug_name");
  private static final int ROUTE = TABLE.column("route");
  private static final int STARTED_AT = TABLE.column("started_at");
  private static final int ENDED_AT = TABLE.column("ended_at");
  private static final int DOSE = TABLE.column("dose");
  private static final int DOSE_UNIT = TABLE.column("dose_unit");
  private static final int ACTION = TABLE.column("action");
  private static final int BASIS = TABLE.column("basis");

  private final CodeMap codes;
  private final SharedRules rules;
  private final Findings findings;
  private final TextCache texts = new TextCache();
  private String admissionId = "";

  AdministrationRows(CheckContext context, Findings findings) {
    this.codes = context.codes();
    this.rules = new SharedRules(TABLE, context, findings);
    this.findings = findings;
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    admissionId = texts.text(row.fields, ADMISSION_ID);
    Broken rule = rules.orphan(row, person, ADMISSION_ID, admissionId);
    if (rule == null) {
      rule = rules.reversed(row.seconds[STARTED_AT], row.seconds[ENDED_AT], "ended_at");
    }
    if (rule == null) {
      rule = rules.timed(row.seconds[STARTED_AT], person, "started_at");
    }
    boolean given = row.word(ACTION, DoseAction.values(), DoseAction.GIVEN) == DoseAction.GIVEN;
    return rule != null || given ? rule : new Broken(Rule.NOT_GIVEN, "action");
  }

  @Override
  public Administration keep(ParsedRow row, Person person) {
    DoseBasis basis = row.word(BASIS, DoseBasis.values(), DoseBasis.ADMINISTERED);
    if (basis == DoseBasis.ORDERED) {
      findings.count(FindingKind.ORDERED_ONLY, TABLE, "");
    }
    String drug = texts.text(row.fields, DRUG);
    String unit = texts.text(row.fields, DOSE_UNIT);
    String dose = texts.text(row.fields, DOSE);
    return new Administration(
        drug,
        atc(row, drug),
        texts.text(row.fields, DRUG_NAME),
        row.word(ROUTE, Route.values(), Route.UNKNOWN),
        row.seconds[STARTED_AT],
        rules.cut(row.seconds[ENDED_AT]),
        unit.isEmpty() || dose.isEmpty() ? dose : dose + " " + unit,
        basis,
        admissionId,
        row.source);
  }

  private String atc(ParsedRow row, String drug) {
    DrugCodeSystem system = row.word(CODE_SYSTEM, DrugCodeSystem.values(), DrugCodeSystem.ATC);
    if (system == DrugCodeSystem.ATC) {
      return drug;
    }
    String atc = system == DrugCodeSystem.LOCAL ? codes.atc(drug).orElse("") : "";
    if (atc.isEmpty()) {
      findings.count(FindingKind.UNMAPPED_CODE, TABLE, drug);
    }
    return atc;
  }
}
