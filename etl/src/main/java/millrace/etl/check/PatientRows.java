package millrace.etl.check;

import java.util.HashSet;
import java.util.Set;
import millrace.etl.contract.ContractTable;
import millrace.etl.record.Patient;
import millrace.etl.record.Sex;

/** Rows of {@code patients}: the first kept row of an id stands. */
final class PatientRows implements RowKind<Patient> {
  private static final int PATIENT_ID = ContractTable.PATIENTS.column("patient_id");
  private static final int SEX = ContractTable.PATIENTS.column("sex");
  private static final int DIED_AT = ContractTable.PATIENTS.column("died_at");

  private final Set<String> kept = new HashSet<>();

  void startGroup() {
    kept.clear();
  }

  @Override
  public Broken broken(ParsedRow row, Person person) {
    return kept.contains(row.text(PATIENT_ID)) ? new Broken(Rule.REPEATED_KEY, "patient_id") : null;
  }

  @Override
  public Patient keep(ParsedRow row, Person person) {
    String id = row.text(PATIENT_ID);
    kept.add(id);
    return new Patient(
        id,
        row.word(SEX, Sex.values(), Sex.UNKNOWN),
        row.birthDate,
        row.seconds[DIED_AT],
        row.source);
  }
}
