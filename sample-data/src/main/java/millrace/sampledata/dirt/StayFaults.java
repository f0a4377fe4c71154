package millrace.sampledata.dirt;

import java.util.List;
import millrace.sampledata.course.Chart;
import millrace.sampledata.person.Admission;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.write.Buffers;
import millrace.sampledata.write.ExtractTable;
import millrace.sampledata.write.TimeText;

/** Faults of patients, admissions and stays: extra rows to which no other row refers. */
final class StayFaults {
  private StayFaults() {}

  static List<Fault> all() {
    return List.of(
        (chart, chance, buffers) -> patient(chart, buffers, "sex", ""),
        (chart, chance, buffers) -> patient(chart, buffers, "sex", "W"),
        (chart, chance, buffers) -> patient(chart, buffers, "birth_date", "1950-13-40"),
        (chart, chance, buffers) -> patient(chart, buffers, "birth_date", "1893-05-02"),
        StayFaults::secondPatient,
        (chart, chance, buffers) -> admission(chart, chance, buffers, "admitted_at", "unknown"),
        (chart, chance, buffers) -> admission(chart, chance, buffers, "discharge_status", "left"),
        (chart, chance, buffers) ->
            admission(
                chart, chance, buffers, "patient_id", Moment.of(chart, chance).strangePatient()),
        (chart, chance, buffers) ->
            admission(chart, chance, buffers, "discharged_at", "2024-01-01T00:00"),
        StayFaults::secondAdmission,
        StayFaults::plannedAdmission,
        StayFaults::overlappingAdmission,
        (chart, chance, buffers) -> stay(chart, chance, buffers, "unit_id", "WARD-9"),
        (chart, chance, buffers) -> stay(chart, chance, buffers, "left_at", "2024-01-01T00:00"),
        (chart, chance, buffers) -> stay(chart, chance, buffers, "entered_at", ""));
  }

  private static void patient(Chart chart, Buffers buffers, String column, String value) {
    new Draft(ExtractTable.PATIENTS)
        .set("patient_id", "Q" + chart.person().id().substring(1))
        .set("sex", "female")
        .set("birth_date", "1961-07-09")
        .set(column, value)
        .write(buffers, 0);
  }

  /** The same patient registered again with another date of birth. */
  private static void secondPatient(Chart chart, Chance chance, Buffers buffers) {
    new Draft(ExtractTable.PATIENTS)
        .set("patient_id", chart.person().id())
        .set("sex", "unknown")
        .set("birth_date", chart.person().bornOn().minusDays(1 + chance.below(300)).toString())
        .write(buffers, 0);
  }

  private static void admission(
      Chart chart, Chance chance, Buffers buffers, String column, String value) {
    Moment moment = Moment.of(chart, chance);
    draft(moment).set(column, value).write(buffers, moment.at());
  }

  private static void secondAdmission(Chart chart, Chance chance, Buffers buffers) {
    Admission admission = Moment.of(chart, chance).admission();
    new Draft(ExtractTable.ADMISSIONS)
        .set("admission_id", admission.id())
        .set("patient_id", chart.person().id())
        .set("admitted_at", TimeText.minute(admission.admittedAt() + 3600))
        .write(buffers, admission.admittedAt());
  }

  /** An admission that was only planned when the extract was drawn. */
  private static void plannedAdmission(Chart chart, Chance chance, Buffers buffers) {
    long late = Calendar.TO + chance.between(300, 9000) * 60;
    draft(Moment.of(chart, chance))
        .set("admitted_at", TimeText.minute(late))
        .set("discharged_at", "")
        .set("discharge_status", "")
        .write(buffers, late);
  }

  /**
   * An admission within another; only of patients who are in no rate, since it takes over what
   * happens in its time.
   */
  private static void overlappingAdmission(Chart chart, Chance chance, Buffers buffers) {
    if (chart.person().inRates()) {
      plannedAdmission(chart, chance, buffers);
      return;
    }
    Moment moment = Moment.of(chart, chance);
    draft(moment).write(buffers, moment.at());
  }

  private static Draft draft(Moment moment) {
    return new Draft(ExtractTable.ADMISSIONS)
        .set("admission_id", moment.strangeAdmission())
        .set("patient_id", moment.patientId())
        .set("admitted_at", moment.text())
        .set("discharged_at", moment.text(3600))
        .set("discharge_status", "home");
  }

  private static void stay(
      Chart chart, Chance chance, Buffers buffers, String column, String value) {
    Moment moment = Moment.of(chart, chance);
    new Draft(ExtractTable.UNIT_STAYS)
        .set("admission_id", moment.admission().id())
        .set("unit_id", "M1")
        .set("entered_at", moment.text())
        .set("left_at", moment.text(3600))
        .set(column, value)
        .write(buffers, moment.at());
  }
}
