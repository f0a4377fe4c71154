package millrace.sampledata.course;

import java.util.List;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Kidneys;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.scenario.UnitKind;

/**
 * Plans kidney replacements: maintenance sessions around an admission, acute ones after a severe
 * injury.
 */
final class ReplacementPlan {
  private static final long HOUR = 3600;
  private static final long DAY = 24 * HOUR;
  private static final int SESSION_DAYS = 7;

  private final Chance chance;
  private final List<Replacement> replacements;

  ReplacementPlan(Chance chance, List<Replacement> replacements) {
    this.chance = chance;
    this.replacements = replacements;
  }

  /** Sessions from a week before the admission to its discharge. */
  void maintenance(Kidneys kidneys, Admission admission, long earliest) {
    boolean peritoneal = kidneys == Kidneys.MAINTENANCE_PERITONEAL;
    long end = Math.min(admission.dischargedAt(), Calendar.TO);
    long day = Math.max(earliest, Calendar.startOfDay(admission.admittedAt(), -SESSION_DAYS));
    int step = 0;
    for (int ahead = 0;
        Calendar.startOfDay(day, ahead) < end;
        ahead += peritoneal ? 1 : 2 + (step % 3) / 2) {
      step++;
      long at =
          Calendar.startOfDay(day, ahead)
              + (peritoneal ? 21 : 8) * HOUR
              + chance.between(0, 90) * 60;
      if (at >= end || at < earliest) {
        continue;
      }
      long endedAt = Math.min(end, at + (peritoneal ? 9 * HOUR : 4 * HOUR - chance.below(40) * 60));
      boolean noEnd = chance.happens(0.1) && !peritoneal;
      String admissionId = admission.holds(at) ? admission.id() : "";
      String modality = peritoneal ? "peritoneal" : "intermittent";
      replacements.add(
          new Replacement(at, noEnd ? 0 : endedAt, modality, "maintenance", admissionId));
    }
  }

  /** Whether an injury comes to replacement. */
  boolean needed(Injury injury) {
    return injury.stage() == 3 && chance.happens(0.3);
  }

  /**
   * Plans acute replacement.
   *
   * @param latest instant by which it must be over
   * @return the instant at which it is over
   */
  long acute(Injury injury, Admission admission, long latest) {
    long at =
        Math.max(injury.injuredAt(), admission.admittedAt())
            + chance.between(12 * 60, 40 * 60) * 60;
    String purpose = chance.happens(0.1) ? "unknown" : "acute";
    if (admission.unitAt(at).kind() == UnitKind.CRITICAL_CARE) {
      long endedAt = Math.min(latest, at + chance.between(30 * 60, 110 * 60) * 60);
      add(at, endedAt, "continuous", purpose, admission);
      return Math.max(at, endedAt);
    }
    int sessions = 1 + chance.below(3);
    long over = at;
    for (int session = 0; session < sessions && at < latest; session++) {
      over = Math.min(latest, at + 3 * HOUR + chance.below(60) * 60);
      add(
          at,
          chance.happens(0.12) ? 0 : over,
          chance.happens(0.05) ? "unknown" : "intermittent",
          purpose,
          admission);
      at += 2 * DAY;
    }
    return over;
  }

  private void add(long at, long endedAt, String modality, String purpose, Admission admission) {
    if (at < Calendar.TO && (endedAt == 0 || endedAt >= at)) {
      replacements.add(new Replacement(at, endedAt, modality, purpose, admission.id()));
    }
  }
}
