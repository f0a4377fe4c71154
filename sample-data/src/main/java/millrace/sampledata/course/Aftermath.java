package millrace.sampledata.course;

import millrace.sampledata.person.Admission;
import millrace.sampledata.scenario.Chance;

/** What an injury changes: the stay grows, blood is drawn soon, harmful drugs are often stopped. */
final class Aftermath {
  private static final long HOUR = 3600;
  private static final long DAY = 24 * HOUR;

  private final LabRounds rounds;
  private final ReplacementPlan replacements;

  Aftermath(LabRounds rounds, ReplacementPlan replacements) {
    this.rounds = rounds;
    this.replacements = replacements;
  }

  /** Changes the plan of a visit; returns the admission as it comes out. */
  Admission suffer(Chance chance, Injury injury, Visit visit) {
    Admission planned = visit.planned();
    Admission admission = planned.extendedTo(lastDay(chance, injury, visit));
    visit.pressures().chart(planned.dischargedAt(), admission.dischargedAt(), false);
    rounds.rounds(admission, planned.dischargedAt(), admission.dischargedAt(), visit.draws());
    long soon = injury.injuredAt() + chance.between(20, 150) * 60;
    if (chance.happens(0.9) && injury.origin().equals(Injury.HOSPITAL)) {
      visit.draws().add(soon / 60 * 60);
      visit.draws().sort(null);
    }
    if (chance.happens(0.5)) {
      long stop = injury.injuredAt() + DAY;
      visit
          .doses()
          .removeIf(dose -> dose.startedAt() > stop && dose.drug().drugClass().rateRatio() > 1);
    }
    return admission;
  }

  private long lastDay(Chance chance, Injury injury, Visit visit) {
    long next = visit.nextAdmittedAt();
    long latest = next == Long.MAX_VALUE ? next : next - DAY;
    long wanted = Math.max(injury.injuredAt() + 30 * HOUR, visit.planned().admittedAt());
    if (injury.origin().equals(Injury.HOSPITAL) && chance.happens(0.6)) {
      wanted = injury.injuredAt() + chance.between(2 * 1440, 7 * 1440) * 60;
    }
    if (replacements.needed(injury)) {
      long over = replacements.acute(injury, visit.planned(), Math.min(latest, wanted + 6 * DAY));
      wanted = Math.max(wanted, over + 3 * DAY);
    }
    return Math.min(latest, wanted / 60 * 60);
  }
}
