package millrace.etl.check;

import millrace.etl.contract.ContractTable;
import millrace.etl.normalise.KeySet;
import millrace.etl.record.Seconds;

/** The rules that several tables share: orphan, reversed, outside-life, outside-cover. */
final class SharedRules {
  private final ContractTable table;
  private final KeySet admissions;
  private final long coversTo;
  private final Findings findings;

  SharedRules(ContractTable table, CheckContext context, Findings findings) {
    this.table = table;
    this.admissions = context.admissions();
    this.coversTo = context.cover().to();
    this.findings = findings;
  }

  Broken orphanPatient(Person person) {
    return person.known() ? null : new Broken(Rule.ORPHAN, "patient_id");
  }

  /** The patient, then the admission if one is named; another patient's admission is a finding. */
  Broken orphan(ParsedRow row, Person person, int admissionColumn, String admissionId) {
    if (!person.known()) {
      return orphanPatient(person);
    }
    if (row.has(admissionColumn) && !person.admissions().contains(admissionId)) {
      if (!admissions.contains(admissionId)) {
        return new Broken(Rule.ORPHAN, "admission_id");
      }
      findings.count(FindingKind.OTHER_ADMISSION, table, "of another patient");
    }
    return null;
  }

  Broken reversed(long start, long end, String endColumn) {
    return Seconds.given(start) && Seconds.given(end) && end < start
        ? new Broken(Rule.REVERSED, endColumn)
        : null;
  }

  /** Outside life, then outside cover, by the row's first time. */
  Broken timed(long first, Person person, String column) {
    if (!Seconds.given(first)) {
      return null;
    }
    if (first < person.bornAt() || first > person.lastAt()) {
      return new Broken(Rule.OUTSIDE_LIFE, column);
    }
    return first >= coversTo ? new Broken(Rule.OUTSIDE_COVER, column) : null;
  }

  /** An end after the cover is cut to it. */
  long cut(long end) {
    return Seconds.given(end) ? Math.min(end, coversTo) : Seconds.ABSENT;
  }

  static Broken first(Broken one, Broken other) {
    return one != null ? one : other;
  }
}
