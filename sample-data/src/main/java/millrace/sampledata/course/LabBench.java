package millrace.sampledata.course;

import java.util.List;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Person;
import millrace.sampledata.scenario.Chance;

/** Measures blood: creatinine with a little noise, and what is usually ordered with it. */
final class LabBench {
  private static final double MICROMOLES_PER_MG_DL = 88.4;

  private final Chance chance;
  private final Person person;
  private final CreatinineCourse course;
  private final List<LabResult> results;

  LabBench(Chance chance, Person person, CreatinineCourse course, List<LabResult> results) {
    this.chance = chance;
    this.person = person;
    this.course = course;
    this.results = results;
  }

  /** Measures a draw of an admission; before it, the emergency department has sent it. */
  void inside(Admission admission, long at) {
    String setting = at < admission.admittedAt() ? "emergency" : "inpatient";
    String admissionId = chance.happens(0.03) ? "" : admission.id();
    measure(at, course.factorAt(at), Analyser.of(admission.unitAt(at)), setting, admissionId);
  }

  /** Measures a draw outside hospital, at the given factor of the usual value. */
  void outside(long at, double factor) {
    String setting = chance.happens(0.9) ? "outpatient" : chance.happens(0.5) ? "unknown" : "";
    measure(at, factor, Analyser.OUTPATIENT_LABORATORY, setting, "");
  }

  private void measure(
      long at, double factor, Analyser analyser, String setting, String admissionId) {
    double noise = person.baselineMgDl() > 1.8 ? 0.014 : 0.021;
    double mgDl = Math.max(0.12, person.baselineMgDl() * factor * (1 + noise * chance.bell()));
    if (person.kidneys().onMaintenance()) {
      mgDl *= chance.within(0.72, 1.05);
    }
    long resultedAt = at + chance.between(25, 110) * 60;
    int value = round(analyser.mgDl() ? mgDl * 100 : mgDl * MICROMOLES_PER_MG_DL);
    results.add(
        new LabResult(at, resultedAt, Analyte.CREATININE, analyser, value, setting, admissionId));
    double excess = Math.min(3, factor - 1);
    if (chance.happens(0.9)) {
      int tenths = Math.max(27, round(10 * (4.1 + 0.35 * chance.bell() + 0.45 * excess)));
      results.add(
          new LabResult(at, resultedAt, Analyte.POTASSIUM, analyser, tenths, setting, admissionId));
    }
    if (chance.happens(0.65)) {
      int urea =
          Math.max(
              4, round((14 + 3.5 * chance.bell()) * (0.6 + 0.4 * person.baselineMgDl()) * factor));
      results.add(
          new LabResult(at, resultedAt, Analyte.UREA, analyser, urea, setting, admissionId));
    }
    if (chance.happens(0.32)) {
      int bicarbonate = Math.max(8, round(24.5 + 2 * chance.bell() - 1.8 * excess));
      results.add(
          new LabResult(
              at, resultedAt, Analyte.BICARBONATE, analyser, bicarbonate, setting, admissionId));
    }
  }

  private static int round(double value) {
    return (int) Math.floor(value + 0.5);
  }
}
