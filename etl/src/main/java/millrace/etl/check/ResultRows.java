package millrace.etl.check;

import java.util.Optional;
import millrace.etl.contract.ContractTable;
import millrace.etl.contract.LaboratoryCodeSystem;
import millrace.etl.normalise.CodeMap;
import millrace.etl.normalise.CreatinineCodes;
import millrace.etl.normalise.CreatinineUnit;
import millrace.etl.parse.DecimalText;
import millrace.etl.record.CreatinineResult;
import millrace.etl.record.ResultSetting;
import millrace.etl.record.ResultStatus;

/**
 * Rows of {@code results}; creatinine becomes a canonical row, other analytes are kept and counted.
 */
final class ResultRows implements RowKind<CreatinineResult> {
  /** 0.1 mg/dL. */
  private static final long LOWEST_NANOMOLES = 8_840;

  /** 40 mg/dL. */
  private static final long HIGHEST_NANOMOLES = 3_536_000;

  private static final ContractTable TABLE = ContractTable.RESULTS;
  private static final int ADMISSION_ID = TABLE.column("admission_id");
  private static final int ANALYTE = TABLE.column("analyte");
  private static final int CODE_SYSTEM = TABLE.column("code_system");
  private static final int COLLECTED_AT = TABLE.column("collected_at");
  private static final int RESULTED_AT = TABLE.column("resulted_at");
  private static final int VALUE = TABLE.column("value");
  private static final int UNIT = TABLE.column("unit");
  private static final int STATUS = TABLE.column("status");
  private static final int SETTING = TABLE.column("setting");

  private final CodeMap codes;
  private final SharedRules rules;
  private final Findings findings;
  private final TextCache texts = new TextCache();
  private boolean creatinine;
  private long nanomolesPerLitre;
  private String admissionId = "";

  ResultRows(CheckContext context, Findings findings) {
    this.codes = context.codes();
    this.rules = new SharedRules(TABLE, context, findings);
    this.findings = findings;
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    admissionId = texts.text(row.fields, ADMISSION_ID);
    Broken rule = rules.orphan(row, person, ADMISSION_ID, admissionId);
    if (rule == null) {
      rule = rules.timed(row.seconds[COLLECTED_AT], person, "collected_at");
    }
    if (rule != null) {
      return rule;
    }
    creatinine = isCreatinine(row);
    if (creatinine) {
      rule = convert(row);
    }
    if (rule != null) {
      return rule;
    }
    ResultStatus status = row.word(STATUS, ResultStatus.values(), ResultStatus.FINAL);
    boolean standing = status == ResultStatus.FINAL || status == ResultStatus.CORRECTED;
    return standing ? null : new Broken(Rule.NOT_FINAL, "status");
  }

  @Override
  public CreatinineResult keep(ParsedRow row, Person person) {
    if (!creatinine) {
      countUnused(row);
      return null;
    }
    return new CreatinineResult(
        row.seconds[COLLECTED_AT],
        row.seconds[RESULTED_AT],
        nanomolesPerLitre,
        row.word(SETTING, ResultSetting.values(), ResultSetting.UNKNOWN),
        admissionId,
        row.source);
  }

  private boolean isLocal(ParsedRow row) {
    return row.word(CODE_SYSTEM, LaboratoryCodeSystem.values(), LaboratoryCodeSystem.LOINC)
        == LaboratoryCodeSystem.LOCAL;
  }

  private boolean isCreatinine(ParsedRow row) {
    String code = texts.text(row.fields, ANALYTE);
    return isLocal(row)
        ? codes.loinc(code).filter(CreatinineCodes::contains).isPresent()
        : CreatinineCodes.contains(code);
  }

  private void countUnused(ParsedRow row) {
    String code = texts.text(row.fields, ANALYTE);
    boolean unmapped = isLocal(row) && codes.loinc(code).isEmpty();
    findings.count(unmapped ? FindingKind.UNMAPPED_CODE : FindingKind.UNUSED_ANALYTE, TABLE, code);
  }

  private Broken convert(ParsedRow row) {
    Optional<CreatinineUnit> unit = CreatinineUnit.of(texts.text(row.fields, UNIT));
    if (unit.isEmpty()) {
      return new Broken(Rule.UNIT_OF_MEASURE, "unit");
    }
    DecimalText value = row.numbers[VALUE];
    try {
      nanomolesPerLitre = value.timesRounded(unit.get().nanomolesPerLitre());
    } catch (ArithmeticException e) {
      return new Broken(Rule.IMPLAUSIBLE, "value");
    }
    boolean plausible =
        nanomolesPerLitre >= LOWEST_NANOMOLES && nanomolesPerLitre <= HIGHEST_NANOMOLES;
    return plausible ? null : new Broken(Rule.IMPLAUSIBLE, "value");
  }
}
