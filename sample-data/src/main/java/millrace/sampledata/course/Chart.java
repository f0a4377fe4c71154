package millrace.sampledata.course;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Person;

/** All that is written about one patient. */
public final class Chart {
  private final Person person;
  private final List<Admission> admissions = new ArrayList<>();
  private final List<Reading> readings = new ArrayList<>();
  private final List<Dose> doses = new ArrayList<>();
  private final List<LabResult> results = new ArrayList<>();
  private final List<Replacement> replacements = new ArrayList<>();
  private final List<InjuryNote> injuries = new ArrayList<>();
  private OptionalLong diedAt = OptionalLong.empty();

  Chart(Person person) {
    this.person = person;
  }

  /**
   * The patient.
   *
   * @return the patient as planned
   */
  public Person person() {
    return person;
  }

  /**
   * Admissions as they came out: an injury makes a stay longer.
   *
   * @return admissions in order of time
   */
  public List<Admission> admissions() {
    return admissions;
  }

  /**
   * Blood pressures.
   *
   * @return readings of all admissions
   */
  public List<Reading> readings() {
    return readings;
  }

  /**
   * Doses.
   *
   * @return doses of all admissions
   */
  public List<Dose> doses() {
    return doses;
  }

  /**
   * Laboratory results.
   *
   * @return results, inside and outside hospital
   */
  public List<LabResult> results() {
    return results;
  }

  /**
   * Kidney replacements.
   *
   * @return replacements, inside and outside hospital
   */
  public List<Replacement> replacements() {
    return replacements;
  }

  /**
   * Injuries planted.
   *
   * @return injuries in order of time
   */
  public List<InjuryNote> injuries() {
    return injuries;
  }

  /**
   * Death within the time covered.
   *
   * @return seconds since the epoch, empty for those who live
   */
  public OptionalLong diedAt() {
    return diedAt;
  }

  void dies(OptionalLong at) {
    diedAt = at;
  }
}
