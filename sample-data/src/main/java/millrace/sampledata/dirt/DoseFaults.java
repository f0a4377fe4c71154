package millrace.sampledata.dirt;

import java.util.List;
import millrace.sampledata.course.Chart;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.write.Buffers;
import millrace.sampledata.write.ExtractTable;
import millrace.sampledata.write.TimeText;

/** Faults of administrations. Rows that a reader keeps are of drugs that no watchlist names. */
final class DoseFaults {
  private DoseFaults() {}

  static List<Fault> all() {
    return List.of(
        (chart, chance, buffers) -> one(chart, chance, buffers, "route", ""),
        (chart, chance, buffers) -> one(chart, chance, buffers, "route", "iv drip"),
        (chart, chance, buffers) -> one(chart, chance, buffers, "started_at", "yesterday"),
        (chart, chance, buffers) ->
            one(
                chart,
                chance,
                buffers,
                "admission_id",
                Moment.of(chart, chance).strangeAdmission()),
        (chart, chance, buffers) -> one(chart, chance, buffers, "action", "refused"),
        (chart, chance, buffers) -> one(chart, chance, buffers, "dose", "1 g\n(half at 22:00)"),
        DoseFaults::reversed,
        DoseFaults::afterCoverage,
        DoseFaults::bareDate,
        DoseFaults::byIngredient,
        DoseFaults::unmapped,
        (chart, chance, buffers) -> buffers.of(ExtractTable.ADMINISTRATIONS).repeatLast("  "));
  }

  private static void one(
      Chart chart, Chance chance, Buffers buffers, String column, String value) {
    Moment moment = Moment.of(chart, chance);
    paracetamol(moment).set(column, value).write(buffers, moment.at());
  }

  private static void reversed(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    paracetamol(moment).set("ended_at", moment.text(-5400)).write(buffers, moment.at());
  }

  private static void afterCoverage(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    long late = Calendar.TO + chance.between(0, 900) * 60;
    paracetamol(moment)
        .set("admission_id", "")
        .set("started_at", TimeText.minute(late))
        .write(buffers, late);
  }

  private static void bareDate(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    paracetamol(moment)
        .set("started_at", moment.text().substring(0, 10))
        .write(buffers, moment.at());
  }

  private static void byIngredient(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    paracetamol(moment).set("drug", "161").set("code_system", "rxnorm").write(buffers, moment.at());
  }

  private static void unmapped(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    paracetamol(moment)
        .set("drug", chance.happens(0.6) ? "LOC-9002" : "LOC-9003")
        .set("code_system", "local")
        .set("drug_name", "Mouth care, \"pink\" swabs")
        .set("route", "topical")
        .write(buffers, moment.at());
  }

  private static Draft paracetamol(Moment moment) {
    return new Draft(ExtractTable.ADMINISTRATIONS)
        .set("patient_id", moment.patientId())
        .set("admission_id", moment.admission().id())
        .set("drug", "N02BE01")
        .set("drug_name", "Paracetamol")
        .set("route", "po")
        .set("started_at", moment.text())
        .set("dose", "1")
        .set("dose_unit", "g");
  }
}
