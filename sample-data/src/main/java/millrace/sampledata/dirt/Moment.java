package millrace.sampledata.dirt;

import millrace.sampledata.course.Chart;
import millrace.sampledata.person.Admission;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.write.TimeText;

/**
 * An instant within an admission, for a row that would be clean but for its fault.
 *
 * @param patientId patient
 * @param admission the admission
 * @param at seconds since the epoch
 */
record Moment(String patientId, Admission admission, long at) {

  /** Draws an instant of a patient's time in hospital, before the end of coverage. */
  static Moment of(Chart chart, Chance chance) {
    Admission admission = chart.admissions().get(chance.below(chart.admissions().size()));
    long minutes = (Math.min(admission.dischargedAt(), Calendar.TO) - admission.admittedAt()) / 60;
    long at = admission.admittedAt() + chance.below((int) minutes) * 60L;
    return new Moment(chart.person().id(), admission, at);
  }

  /** The instant as the extract prints it. */
  String text() {
    return TimeText.minute(at);
  }

  /** A time some seconds later, as the extract prints it. */
  String text(long secondsLater) {
    return TimeText.minute(at + secondsLater);
  }

  /** An identifier that no clean row has. */
  String strangeAdmission() {
    return "B" + admission.id().substring(1);
  }

  /** An identifier that no clean row has. */
  String strangePatient() {
    return "Q" + patientId.substring(1);
  }
}
