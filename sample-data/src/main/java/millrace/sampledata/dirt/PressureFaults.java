package millrace.sampledata.dirt;

import java.util.List;
import millrace.sampledata.course.Chart;
import millrace.sampledata.course.Reading;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.write.Buffers;
import millrace.sampledata.write.ExtractTable;

/** Faults of blood pressures. No row that a reader keeps changes what counts as low. */
final class PressureFaults {
  private PressureFaults() {}

  static List<Fault> all() {
    return List.of(
        (chart, chance, buffers) -> one(chart, chance, buffers, "measured_at", ""),
        (chart, chance, buffers) -> one(chart, chance, buffers, "systolic", "12O"),
        (chart, chance, buffers) -> one(chart, chance, buffers, "method", "doppler"),
        (chart, chance, buffers) ->
            one(chart, chance, buffers, "patient_id", Moment.of(chart, chance).strangePatient()),
        PressureFaults::noFieldLeft,
        PressureFaults::oneFieldLeft,
        PressureFaults::secondValue,
        (chart, chance, buffers) -> buffers.of(ExtractTable.BLOOD_PRESSURES).repeatLast(""));
  }

  private static void one(
      Chart chart, Chance chance, Buffers buffers, String column, String value) {
    Moment moment = Moment.of(chart, chance);
    reading(moment)
        .set("systolic", "124")
        .set("diastolic", "76")
        .set(column, value)
        .write(buffers, moment.at());
  }

  /** A line being flushed: every field out of its bounds. */
  private static void noFieldLeft(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    reading(moment)
        .set("systolic", "312")
        .set("diastolic", "4")
        .set("mean", "298")
        .write(buffers, moment.at());
  }

  private static void oneFieldLeft(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    reading(moment).set("systolic", "320").set("diastolic", "70").write(buffers, moment.at());
  }

  /**
   * Two values of one instant and method: the planted one is the higher, so that the charted one
   * stands.
   */
  private static void secondValue(Chart chart, Chance chance, Buffers buffers) {
    if (chart.readings().isEmpty()) {
      noFieldLeft(chart, chance, buffers);
      return;
    }
    Reading charted = chart.readings().get(chance.below(chart.readings().size()));
    buffers.of(ExtractTable.BLOOD_PRESSURES).begin(charted.at());
    buffers
        .of(ExtractTable.BLOOD_PRESSURES)
        .plain(chart.person().id())
        .plain(charted.admissionId())
        .second(charted.at())
        .number(charted.systolic() + 8)
        .number(charted.diastolic() == 0 ? charted.systolic() - 30 : charted.diastolic() + 6)
        .numberOrEmpty(charted.mean() == 0 ? 0 : charted.mean() + 7)
        .plain(charted.method())
        .end();
  }

  private static Draft reading(Moment moment) {
    return new Draft(ExtractTable.BLOOD_PRESSURES)
        .set("patient_id", moment.patientId())
        .set("admission_id", moment.admission().id())
        .set("measured_at", moment.text())
        .set("method", "cuff");
  }
}
