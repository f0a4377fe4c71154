package millrace.sampledata.truth;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.course.Chart;
import millrace.sampledata.course.Injury;
import millrace.sampledata.course.InjuryNote;
import millrace.sampledata.course.Stretch;
import millrace.sampledata.scenario.DrugClass;
import millrace.sampledata.scenario.Planted;

/**
 * The lines of {@code truth_injuries.csv}: every planted injury, in order of patients; times are
 * UTC.
 */
public final class InjuryRows {
  /** Header line. */
  public static final String HEADER =
      "patient_id,admission_id,injured_at,unit,exposures,origin,stage,counted,first_result_at\n";

  private static final String LOW_PRESSURE = "low pressure";

  private InjuryRows() {}

  /**
   * Adds the injuries of a patient.
   *
   * @param chart the patient
   * @param lines where to
   */
  public static void add(Chart chart, StringBuilder lines) {
    for (InjuryNote note : chart.injuries()) {
      Injury injury = note.injury();
      lines.append(chart.person().id()).append(',').append(note.admissionId()).append(',');
      lines.append(Instant.ofEpochSecond(injury.injuredAt())).append(',');
      lines
          .append(injury.where().unit().id())
          .append(',')
          .append(exposures(injury.where()))
          .append(',');
      lines
          .append(injury.origin())
          .append(',')
          .append(injury.stage())
          .append(',')
          .append(note.counted())
          .append(',');
      lines
          .append(note.firstResultAt() == 0 ? "" : Instant.ofEpochSecond(note.firstResultAt()))
          .append('\n');
    }
  }

  private static String exposures(Stretch where) {
    List<String> words = new ArrayList<>();
    for (DrugClass drugClass : DrugClass.values()) {
      if ((where.exposures() & Planted.bit(drugClass)) != 0) {
        words.add(drugClass.word());
      }
    }
    if (where.recentLowPressure()) {
      words.add(LOW_PRESSURE);
    }
    return String.join(";", words);
  }
}
