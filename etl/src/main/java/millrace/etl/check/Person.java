package millrace.etl.check;

import java.util.Set;
import millrace.etl.record.Patient;
import millrace.etl.record.Seconds;

/**
 * What the rules of a row need to know of its patient.
 *
 * @param known whether the patient is in the extract
 * @param bornAt first instant of the birth date
 * @param lastAt last instant that is not outside life
 * @param admissions ids of the patient's kept admissions
 */
record Person(boolean known, long bornAt, long lastAt, Set<String> admissions) {
  static final Person UNKNOWN = new Person(false, Long.MIN_VALUE, Long.MAX_VALUE, Set.of());

  static Person of(Patient patient, java.time.ZoneId zone) {
    return new Person(
        true,
        patient.birthDate().atStartOfDay(zone).toEpochSecond(),
        Seconds.given(patient.diedAt()) ? patient.diedAt() + Seconds.DAY : Long.MAX_VALUE,
        Set.of());
  }

  Person with(Set<String> ownAdmissions) {
    return new Person(known, bornAt, lastAt, ownAdmissions);
  }
}
