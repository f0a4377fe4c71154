package millrace.sampledata.dirt;

import java.util.List;
import millrace.sampledata.course.Chart;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.write.Buffers;
import millrace.sampledata.write.ExtractTable;

/** Faults of the optional tables. */
final class OtherFaults {
  private OtherFaults() {}

  static List<Fault> all() {
    return List.of(
        (chart, chance, buffers) -> condition(chart, chance, buffers, "code_system", "icd11"),
        (chart, chance, buffers) ->
            condition(
                chart, chance, buffers, "patient_id", Moment.of(chart, chance).strangePatient()),
        (chart, chance, buffers) -> buffers.of(ExtractTable.CONDITIONS).repeatLast(""),
        (chart, chance, buffers) -> replacement(chart, chance, buffers, "modality", "CVVHDF"),
        (chart, chance, buffers) ->
            replacement(chart, chance, buffers, "ended_at", "2024-01-01T00:00"),
        OtherFaults::bareSession,
        (chart, chance, buffers) -> measure(chart, chance, buffers, "weight_kg", "72 kg"),
        (chart, chance, buffers) -> measure(chart, chance, buffers, "measured_at", ""),
        (chart, chance, buffers) -> urine(chart, chance, buffers, "volume_ml", "x2"),
        (chart, chance, buffers) -> urine(chart, chance, buffers, "ended_at", "2024-01-01T00:00"));
  }

  private static void condition(
      Chart chart, Chance chance, Buffers buffers, String column, String value) {
    Moment moment = Moment.of(chart, chance);
    new Draft(ExtractTable.CONDITIONS)
        .set("patient_id", moment.patientId())
        .set("admission_id", moment.admission().id())
        .set("code", "I10")
        .set("code_system", "icd10")
        .set("recorded_at", moment.text())
        .set("description", "copied from a letter:\n\"hypertension, treated\"")
        .set(column, value)
        .write(buffers, moment.at());
  }

  private static void replacement(
      Chart chart, Chance chance, Buffers buffers, String column, String value) {
    Moment moment = Moment.of(chart, chance);
    new Draft(ExtractTable.KIDNEY_REPLACEMENTS)
        .set("patient_id", moment.patientId())
        .set("admission_id", moment.admission().id())
        .set("started_at", moment.text())
        .set("ended_at", moment.text(3 * 3600))
        .set("modality", "continuous")
        .set("purpose", "acute")
        .set(column, value)
        .write(buffers, moment.at());
  }

  /** A session known by its day only, for those who have sessions anyway. */
  private static void bareSession(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    String day = moment.text().substring(0, 10);
    if (chart.person().kidneys().onMaintenance()) {
      new Draft(ExtractTable.KIDNEY_REPLACEMENTS)
          .set("patient_id", moment.patientId())
          .set("started_at", day)
          .set("modality", "intermittent")
          .set("purpose", "maintenance")
          .write(buffers, moment.at());
    } else {
      condition(chart, chance, buffers, "recorded_at", day);
    }
  }

  private static void measure(
      Chart chart, Chance chance, Buffers buffers, String column, String value) {
    Moment moment = Moment.of(chart, chance);
    new Draft(ExtractTable.BODY_MEASURES)
        .set("patient_id", moment.patientId())
        .set("measured_at", moment.text())
        .set("weight_kg", "72")
        .set(column, value)
        .write(buffers, moment.at());
  }

  private static void urine(
      Chart chart, Chance chance, Buffers buffers, String column, String value) {
    Moment moment = Moment.of(chart, chance);
    new Draft(ExtractTable.URINE_OUTPUTS)
        .set("patient_id", moment.patientId())
        .set("admission_id", moment.admission().id())
        .set("started_at", moment.text())
        .set("ended_at", moment.text(3600))
        .set("volume_ml", "60")
        .set(column, value)
        .write(buffers, moment.at());
  }
}
