package millrace.etl.check;

import java.util.HashSet;
import java.util.Set;
import millrace.etl.contract.ContractTable;
import millrace.etl.record.Patient;
import millrace.etl.record.Sex;

/**
 * Rows of {@code patients}: later rows with an id already seen are broken, whether or not the first
 * one was kept.
 */
final class PatientRows implements RowKind<Patient> {
  private static final int PATIENT_ID = ContractTable.PATIENTS.column("patient_id");
  private static final int SEX = ContractTable.PATIENTS.column("sex");
  private static final int DIED_AT = ContractTable.PATIENTS.column("died_at");

  private final Set<String> seen = new HashSet<>();

  void startGroup() {
    seen.clear();
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    return seen.contains(row.text(PATIENT_ID)) ? new Broken(Rule.REPEATED_KEY, "patient_id") : null;
  }

  @Override
  public Patient keep(ParsedRow row, Person person) {
    String id = row.text(PATIENT_ID);
    seen.add(id);
    return new Patient(
        id,
        row.word(SEX, Sex.values(), Sex.UNKNOWN),
        row.birthDate,
        row.seconds[DIED_AT],
        row.source);
  }

  @Override
  public void sawBroken(ParsedRow row) {
    seen.add(row.text(PATIENT_ID));
  }
}
