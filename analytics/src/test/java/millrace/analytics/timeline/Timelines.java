package millrace.analytics.timeline;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import millrace.analytics.policy.LinePolicy;
import millrace.etl.check.CheckedPatient;
import millrace.etl.record.Admission;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.CreatinineResult;
import millrace.etl.record.KidneyReplacement;
import millrace.etl.record.Patient;
import millrace.etl.record.Seconds;
import millrace.etl.record.Sex;
import millrace.etl.record.SourceLine;
import millrace.etl.record.UnitStay;

/** Timelines of invented patients, built as a run builds them. */
public final class Timelines {
  private static final Patient PATIENT =
      new Patient("p", Sex.FEMALE, LocalDate.of(1960, 1, 1), Seconds.ABSENT, new SourceLine(0, 2));

  private Timelines() {}

  /** A timeline of admissions, stays and pressures; the arrival window is 20 s. */
  public static PatientTimeline of(
      List<Admission> admissions,
      List<UnitStay> stays,
      List<BloodPressure> pressures,
      long coversTo) {
    return new TimelineBuilder(new LinePolicy(10, 20), coversTo)
        .build(
            new CheckedPatient(
                Optional.of(PATIENT),
                admissions,
                stays,
                List.of(),
                List.of(),
                pressures,
                List.of(),
                List.of(),
                List.of(),
                List.of()));
  }

  /** A timeline of admissions, results and replacements; the washout is 10 s. */
  public static PatientTimeline of(
      List<Admission> admissions,
      List<CreatinineResult> results,
      List<KidneyReplacement> replacements) {
    return new TimelineBuilder(new LinePolicy(10, 20), Long.MAX_VALUE)
        .build(
            new CheckedPatient(
                Optional.of(PATIENT),
                admissions,
                List.of(),
                results,
                List.of(),
                List.of(),
                replacements,
                List.of(),
                List.of(),
                List.of()));
  }

  /** Admissions one after another: pairs of the gap before and the length. */
  public static List<Admission> admissions(long base, List<Integer> gapsAndLengths) {
    List<Admission> admissions = new ArrayList<>();
    long now = base;
    for (int i = 0; i + 1 < gapsAndLengths.size(); i += 2) {
      long from = now + gapsAndLengths.get(i);
      now = from + gapsAndLengths.get(i + 1);
      admissions.add(new Admission("a" + i, from, now, Optional.empty(), new SourceLine(1, i + 2)));
    }
    return admissions;
  }
}
