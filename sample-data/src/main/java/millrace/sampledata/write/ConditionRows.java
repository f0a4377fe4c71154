package millrace.sampledata.write;

import millrace.sampledata.course.Chart;
import millrace.sampledata.course.InjuryNote;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Kidneys;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;

/** Diagnoses of one patient, with a description in free text that the contract does not know. */
final class ConditionRows {
  private static final String[][] COMMON = {
    {"I10", "Essential (primary) hypertension"},
    {"E11.9", "Type 2 diabetes mellitus, without complications"},
    {"J18.9", "Pneumonia, organism unspecified"},
    {"N39.0", "Urinary tract infection,\nsite not specified"},
    {"I50.9", "Heart failure, \"unspecified\""},
    {"A41.9", "Sepsis"},
    {"K80.2", "Gallstones"},
    {"S72.0", "Fracture of neck of femur, closed"}
  };

  private final RowBuffer rows;
  private final Chance chance;

  ConditionRows(RowBuffer rows, Chance chance) {
    this.rows = rows;
    this.chance = chance;
  }

  void write(Chart chart) {
    String patientId = chart.person().id();
    kidneys(chart);
    for (Admission admission : chart.admissions()) {
      int codes = chance.below(3);
      for (int code = 0; code < codes; code++) {
        String[] condition = COMMON[chance.below(COMMON.length)];
        row(patientId, admission, condition[0], "icd10", condition[1]);
      }
    }
    for (InjuryNote note : chart.injuries()) {
      if (chance.happens(0.35)) {
        chart.admissions().stream()
            .filter(admission -> admission.id().equals(note.admissionId()))
            .forEach(
                admission ->
                    row(
                        patientId,
                        admission,
                        "N17.9",
                        "icd10",
                        "Acute kidney failure, unspecified"));
      }
    }
  }

  private void kidneys(Chart chart) {
    String patientId = chart.person().id();
    Admission first = chart.admissions().get(0);
    Kidneys kidneys = chart.person().kidneys();
    if (kidneys.onMaintenance()) {
      row(patientId, first, "N18.6", "icd10", "End stage renal disease");
      if (chance.happens(0.3)) {
        row(patientId, first, "V45.11", "icd9", "Renal dialysis status");
      } else if (chance.happens(0.6)) {
        row(patientId, first, "Z99.2", "icd10", "Dependence on renal dialysis");
      }
    } else if (kidneys == Kidneys.TRANSPLANT) {
      row(patientId, first, "Z94.0", "icd10", "Kidney transplant status");
    } else if (kidneys == Kidneys.REDUCED && chance.happens(0.7)) {
      row(patientId, first, "N18.3", "icd10", "Chronic kidney disease, stage 3");
    }
  }

  private void row(
      String patientId, Admission admission, String code, String system, String description) {
    long at = admission.admittedAt() + chance.between(60, 1440) * 60;
    if (at >= Calendar.TO) {
      at = admission.admittedAt();
    }
    rows.begin(at).plain(code).plain(system).plain(patientId).plain(admission.id());
    if (chance.happens(0.3)) {
      rows.date(at);
    } else {
      rows.minute(at);
    }
    rows.text(description).end();
  }
}
