package millrace.sampledata.course;

import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Person;
import millrace.sampledata.person.Profile;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.scenario.UnitKind;

/** Plans when blood is drawn during one admission, before anybody knows of an injury. */
final class LabRounds {
  private static final long HOUR = 3600;

  private final Chance chance;
  private final Person person;

  LabRounds(Chance chance, Person person) {
    this.chance = chance;
    this.person = person;
  }

  /**
   * Routine draws, in order: one on arrival, then rounds at six in the morning (and evening in
   * critical care).
   */
  List<Long> routine(Admission admission) {
    List<Long> draws = new ArrayList<>();
    double seldom =
        switch (admission.profile()) {
          case MATERNITY -> 0.5;
          case CHILD -> 0.35;
          case SHORT -> 0.4;
          default -> 0.05;
        };
    boolean rarely = chance.happens(seldom) && !person.kidneys().onMaintenance();
    if (rarely && chance.happens(0.5)) {
      return draws;
    }
    boolean emergency = admission.stays().get(0).enteredAt() < admission.admittedAt();
    long firstAt =
        admission.admittedAt()
            + (emergency ? chance.between(-150, 20) : chance.between(20, 300)) * 60;
    draws.add(firstAt);
    if (!rarely) {
      rounds(admission, firstAt + 4 * HOUR, admission.dischargedAt(), draws);
    }
    return draws;
  }

  /** Adds the rounds of a stretch of an admission. */
  void rounds(Admission admission, long from, long to, List<Long> draws) {
    long end = Math.min(to, Calendar.TO);
    for (int day = 0; Calendar.startOfDay(from, day) < end; day++) {
      long midnight = Calendar.startOfDay(from, day);
      draw(admission, midnight + 6 * HOUR + chance.between(-60, 60) * 60, from, end, 1, draws);
      long evening = midnight + 18 * HOUR + chance.between(-60, 60) * 60;
      boolean intensive = admission.unitAt(evening).kind() == UnitKind.CRITICAL_CARE;
      draw(admission, evening, from, end, intensive ? 0.95 : 0.03, draws);
    }
  }

  private void draw(
      Admission admission, long at, long from, long end, double share, List<Long> draws) {
    if (at >= from && at < end && chance.happens(share * probability(admission, at))) {
      draws.add(at);
    }
  }

  private double probability(Admission admission, long at) {
    if (admission.profile() == Profile.MATERNITY) {
      return 0.45;
    }
    return switch (admission.unitAt(at).kind()) {
      case CRITICAL_CARE -> 0.98;
      case STEP_DOWN -> 0.95;
      case MEDICAL -> 0.84;
      case SURGICAL -> 0.78;
      case ONCOLOGY -> 0.88;
      case OBSTETRIC -> 0.45;
      case PAEDIATRIC -> 0.6;
      case EMERGENCY -> 0.8;
      case OTHER -> 0.42;
    };
  }
}
