package millrace.sampledata.dirt;

import java.time.Instant;
import java.util.List;
import millrace.sampledata.course.Analyte;
import millrace.sampledata.course.Chart;
import millrace.sampledata.course.LabResult;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.write.Buffers;
import millrace.sampledata.write.ExtractTable;
import millrace.sampledata.write.TimeText;

/**
 * Faults of laboratory results. Rows that a reader keeps are of potassium, or repeat a creatinine
 * that stands.
 */
final class ResultFaults {
  private static final long DAY = 86_400;
  private static final String CREATININE = "2160-0";

  private ResultFaults() {}

  static List<Fault> all() {
    return List.of(
        (chart, chance, buffers) -> one(chart, chance, buffers, "value", ""),
        (chart, chance, buffers) -> one(chart, chance, buffers, "value", "haemolysed"),
        (chart, chance, buffers) -> one(chart, chance, buffers, "collected_at", "2030-02-31T25:10"),
        (chart, chance, buffers) -> one(chart, chance, buffers, "setting", "daycase"),
        (chart, chance, buffers) ->
            one(chart, chance, buffers, "patient_id", Moment.of(chart, chance).strangePatient()),
        (chart, chance, buffers) -> one(chart, chance, buffers, "unit", "U/L"),
        (chart, chance, buffers) -> one(chart, chance, buffers, "value", "88"),
        (chart, chance, buffers) -> one(chart, chance, buffers, "value", "0.02"),
        (chart, chance, buffers) -> one(chart, chance, buffers, "status", "cancelled"),
        (chart, chance, buffers) -> one(chart, chance, buffers, "status", "preliminary"),
        ResultFaults::beforeBirth,
        ResultFaults::afterDeath,
        ResultFaults::afterCoverage,
        ResultFaults::belowLimit,
        ResultFaults::withOffset,
        ResultFaults::inSpringGap,
        ResultFaults::inAutumnOverlap,
        ResultFaults::mistaken,
        ResultFaults::misfiled,
        ResultFaults::unmapped,
        (chart, chance, buffers) -> buffers.of(ExtractTable.RESULTS).repeatLast(""));
  }

  private static void one(
      Chart chart, Chance chance, Buffers buffers, String column, String value) {
    Moment moment = Moment.of(chart, chance);
    creatinine(moment).set(column, value).write(buffers, moment.at());
  }

  private static void beforeBirth(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    String early = chart.person().bornOn().minusYears(3) + "T08:00";
    creatinine(moment)
        .set("collected_at", early)
        .set("resulted_at", "")
        .write(buffers, moment.at());
  }

  private static void afterDeath(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    if (chart.diedAt().isEmpty() || chart.diedAt().getAsLong() > Calendar.TO - 5 * DAY) {
      beforeBirth(chart, chance, buffers);
      return;
    }
    long late = chart.diedAt().getAsLong() + 3 * DAY;
    String text = TimeText.minute(late);
    creatinine(moment)
        .set("admission_id", "")
        .set("collected_at", text)
        .set("resulted_at", "")
        .write(buffers, late);
  }

  private static void afterCoverage(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    long late = Calendar.TO + chance.between(60, 2000) * 60;
    String text = TimeText.minute(late);
    creatinine(moment)
        .set("admission_id", "")
        .set("collected_at", text)
        .set("resulted_at", "")
        .write(buffers, late);
  }

  private static void belowLimit(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    potassium(moment).set("value", "<2.0").write(buffers, moment.at());
  }

  private static void withOffset(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    String utc = Instant.ofEpochSecond(moment.at()).toString();
    potassium(moment).set("collected_at", utc).set("resulted_at", "").write(buffers, moment.at());
  }

  /** An analyser whose clock was not put forward. */
  private static void inSpringGap(Chart chart, Chance chance, Buffers buffers) {
    clockChange(chart, chance, buffers, "2030-03-31T01:");
  }

  private static void inAutumnOverlap(Chart chart, Chance chance, Buffers buffers) {
    clockChange(chart, chance, buffers, "2029-10-28T01:");
  }

  private static void clockChange(Chart chart, Chance chance, Buffers buffers, String hour) {
    Moment moment = Moment.of(chart, chance);
    String text = hour + (10 + chance.below(50));
    long near = Instant.parse(text + ":00Z").getEpochSecond();
    if (chart.diedAt().isPresent()) {
      near = moment.at();
      text = moment.text();
    }
    potassium(moment)
        .set("admission_id", "")
        .set("collected_at", text)
        .set("resulted_at", "")
        .write(buffers, near);
  }

  /**
   * A first report that a later one of the same specimen replaced; in the extract both are final.
   */
  private static void mistaken(Chart chart, Chance chance, Buffers buffers) {
    for (LabResult result : chart.results()) {
      if (result.analyte() == Analyte.CREATININE && result.analyser().mgDl()) {
        String collected = TimeText.minute(result.collectedAt());
        String reported = TimeText.minute(result.resultedAt() - 600);
        new Draft(ExtractTable.RESULTS)
            .set("patient_id", chart.person().id())
            .set("admission_id", result.admissionId())
            .set("analyte", CREATININE)
            .set("collected_at", collected)
            .set("resulted_at", reported)
            .set("value", String.valueOf(2 + chance.below(3)))
            .set("unit", "mg/dL")
            .set("setting", result.setting())
            .write(buffers, result.collectedAt());
        return;
      }
    }
    one(chart, chance, buffers, "value", "clotted");
  }

  /** A potassium filed under another admission of the patient, or under none of the right time. */
  private static void misfiled(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    String other = chart.admissions().get(chart.admissions().size() - 1).id();
    potassium(moment).set("admission_id", other).write(buffers, moment.at());
  }

  private static void unmapped(Chart chart, Chance chance, Buffers buffers) {
    Moment moment = Moment.of(chart, chance);
    potassium(moment)
        .set("analyte", chance.happens(0.7) ? "BIO-ALB" : "BIO-CK")
        .set("code_system", "local")
        .set("value", String.valueOf(25 + chance.below(20)))
        .set("unit", "g/L")
        .write(buffers, moment.at());
  }

  private static Draft creatinine(Moment moment) {
    return potassium(moment).set("analyte", CREATININE).set("value", "0.97").set("unit", "mg/dL");
  }

  private static Draft potassium(Moment moment) {
    return new Draft(ExtractTable.RESULTS)
        .set("patient_id", moment.patientId())
        .set("admission_id", moment.admission().id())
        .set("analyte", "2823-3")
        .set("collected_at", moment.text())
        .set("resulted_at", moment.text(2700))
        .set("value", "4.0")
        .set("unit", "mmol/L")
        .set("status", "final")
        .set("setting", "inpatient");
  }
}
