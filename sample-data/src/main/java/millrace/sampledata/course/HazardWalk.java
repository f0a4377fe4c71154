package millrace.sampledata.course;

import java.util.List;
import java.util.OptionalLong;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Stay;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.CareUnit;
import millrace.sampledata.scenario.Planted;

/**
 * Walks an admission's time at risk in stretches of constant hazard and decides when, if ever, it
 * is injured: at the instant at which the integral of the hazard passes an exponential threshold.
 * Exact to the second, whatever the windows.
 */
final class HazardWalk {
  private final Admission admission;
  private final Exposures exposures;
  private final List<Spell> spells;
  private final RiskTally tally;

  HazardWalk(Admission admission, Exposures exposures, List<Spell> spells, RiskTally tally) {
    this.admission = admission;
    this.exposures = exposures;
    this.spells = spells;
    this.tally = tally;
  }

  /**
   * Walks from one instant to another.
   *
   * @param threshold integral at which the injury happens
   * @return the instant of the injury, if it happens
   */
  OptionalLong walk(long from, long to, double threshold) {
    if (to <= from) {
      return OptionalLong.empty();
    }
    long[] instants = boundaries(from, to).sorted();
    double rest = threshold;
    for (int index = 0; index + 1 < instants.length; index++) {
      long start = instants[index];
      long seconds = instants[index + 1] - start;
      if (seconds == 0) {
        continue;
      }
      Stretch stretch = stretchAt(start);
      double hazard =
          Planted.hazardPerSecond(
              stretch.unit(), stretch.exposures(), stretch.recentLowPressure(), start);
      double expected = hazard * seconds;
      if (expected < rest) {
        rest -= expected;
        tally.addTime(stretch, seconds, expected);
      } else {
        long untilInjury = (long) (rest / hazard);
        tally.addTime(stretch, untilInjury, hazard * untilInjury);
        tally.addInjury(stretch);
        return OptionalLong.of(start + untilInjury);
      }
    }
    return OptionalLong.empty();
  }

  /** Where the patient is at an instant, and under what. */
  Stretch stretchAt(long at) {
    CareUnit unit = admission.unitAt(at);
    return new Stretch(unit, Calendar.monthOf(at), exposures.maskAt(at), recentLowPressure(at));
  }

  private Boundaries boundaries(long from, long to) {
    Boundaries boundaries = new Boundaries(from, to);
    exposures.boundaries(boundaries);
    for (Spell spell : spells) {
      boundaries.add(spell.startAt());
      boundaries.add(spell.endAt() + Planted.PRESSURE_WINDOW_SECONDS);
    }
    for (Stay stay : admission.stays()) {
      boundaries.add(stay.enteredAt());
      boundaries.add(stay.leftAt());
    }
    boundaries.add(Planted.risingFromSeconds());
    int lastMonth = Math.min(Calendar.MONTHS, Calendar.monthOf(to));
    for (int month = Math.max(0, Calendar.monthOf(from)); month <= lastMonth; month++) {
      boundaries.add(Calendar.startOfMonth(month));
    }
    return boundaries;
  }

  private boolean recentLowPressure(long at) {
    for (Spell spell : spells) {
      if (spell.startAt() <= at && at < spell.endAt() + Planted.PRESSURE_WINDOW_SECONDS) {
        return true;
      }
    }
    return false;
  }
}
