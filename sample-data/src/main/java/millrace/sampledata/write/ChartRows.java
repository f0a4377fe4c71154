package millrace.sampledata.write;

import java.nio.charset.StandardCharsets;
import millrace.sampledata.course.Chart;
import millrace.sampledata.course.Dose;
import millrace.sampledata.course.LabResult;
import millrace.sampledata.course.Reading;
import millrace.sampledata.course.Replacement;
import millrace.sampledata.scenario.Drug;

/** The large tables of one patient. */
final class ChartRows {
  private static final byte[][] DRUG_NAMES = drugNames();

  private final Buffers buffers;

  ChartRows(Buffers buffers) {
    this.buffers = buffers;
  }

  void write(Chart chart) {
    byte[] patientId = chart.person().id().getBytes(StandardCharsets.US_ASCII);
    chart.results().forEach(result -> result(patientId, result));
    chart.doses().forEach(dose -> dose(patientId, dose));
    chart.readings().forEach(reading -> reading(patientId, reading));
    chart.replacements().forEach(replacement -> replacement(patientId, replacement));
  }

  private void result(byte[] patientId, LabResult result) {
    RowBuffer row = buffers.of(ExtractTable.RESULTS).begin(result.collectedAt());
    row.plain(patientId).plain(result.admissionId());
    switch (result.analyte()) {
      case CREATININE -> row.plain(result.analyser().code()).plain(result.analyser().codeSystem());
      case POTASSIUM -> row.plain("2823-3").empty();
      case UREA -> row.plain("3094-0").empty();
      case BICARBONATE -> row.plain("1963-8").empty();
    }
    row.minute(result.collectedAt()).minute(result.resultedAt());
    switch (result.analyte()) {
      case CREATININE -> {
        if (result.analyser().mgDl()) {
          row.decimal(result.value(), 2);
        } else {
          row.number(result.value());
        }
        row.plain(result.analyser().unit());
      }
      case POTASSIUM -> row.decimal(result.value(), 1).plain("mmol/L");
      case UREA -> row.number(result.value()).plain("mg/dL");
      case BICARBONATE -> row.number(result.value()).plain("mmol/L");
    }
    row.plain(status(result)).plain(result.setting()).end();
  }

  /**
   * Most say final, some leave it to the default, a few were corrected before the extract was
   * drawn.
   */
  private static String status(LabResult result) {
    long minute = result.collectedAt() / 60;
    return minute % 199 == 0 ? "corrected" : minute % 17 == 0 ? "" : "final";
  }

  private static String action(Dose dose) {
    return dose.action().equals("given") && dose.startedAt() / 60 % 19 == 0 ? "" : dose.action();
  }

  private void dose(byte[] patientId, Dose dose) {
    Drug drug = dose.drug();
    boolean local = dose.pump() || !drug.localCode().isEmpty() && !drug.mapped();
    RowBuffer row = buffers.of(ExtractTable.ADMINISTRATIONS).begin(dose.startedAt());
    row.plain(patientId).plain(dose.admissionId());
    row.plain(local ? drug.localCode() : drug.atc()).plain(local ? "local" : "atc");
    row.plain(DRUG_NAMES[drug.ordinal()]).plain(drug.route());
    row.minute(dose.startedAt()).minute(dose.endedAt());
    row.plain(drug.dose()).plain(drug.doseUnit());
    row.plain(action(dose)).plain(dose.ordered() ? "ordered" : "administered").end();
  }

  private void reading(byte[] patientId, Reading reading) {
    RowBuffer row = buffers.of(ExtractTable.BLOOD_PRESSURES).begin(reading.at());
    row.plain(patientId).plain(reading.admissionId()).second(reading.at());
    row.numberOrEmpty(reading.systolic()).numberOrEmpty(reading.diastolic());
    row.numberOrEmpty(reading.mean()).plain(reading.method()).end();
  }

  private void replacement(byte[] patientId, Replacement replacement) {
    RowBuffer row = buffers.of(ExtractTable.KIDNEY_REPLACEMENTS).begin(replacement.startedAt());
    row.plain(patientId).plain(replacement.admissionId());
    row.minute(replacement.startedAt()).minute(replacement.endedAt());
    row.plain(replacement.modality()).plain(replacement.purpose()).end();
  }

  private static byte[][] drugNames() {
    Drug[] drugs = Drug.values();
    byte[][] names = new byte[drugs.length][];
    for (Drug drug : drugs) {
      String title = drug.title();
      names[drug.ordinal()] =
          (title.contains(",") ? '"' + title + '"' : title).getBytes(StandardCharsets.UTF_8);
    }
    return names;
  }
}
