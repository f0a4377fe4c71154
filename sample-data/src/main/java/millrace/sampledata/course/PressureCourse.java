package millrace.sampledata.course;

import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Person;
import millrace.sampledata.person.Population;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.scenario.UnitKind;

/**
 * Charts the blood pressures of one admission, with spells of low pressure that come often in prone
 * patients.
 */
final class PressureCourse {
  private static final double PRONE_HOURS_BETWEEN_SPELLS = 30;
  private static final double OTHER_HOURS_BETWEEN_SPELLS = 900;
  private static final String LINE = "arterial-line";
  private static final String CUFF = "cuff";

  private final Chance chance;
  private final Admission admission;
  private final double meanHoursBetweenSpells;
  private final double usualMean;
  private final boolean line;
  private final List<Reading> readings = new ArrayList<>();
  private final List<Reading> companions = new ArrayList<>();

  PressureCourse(Chance chance, Person person, Admission admission) {
    this.chance = chance;
    this.admission = admission;
    this.meanHoursBetweenSpells =
        person.pressureProne() ? PRONE_HOURS_BETWEEN_SPELLS : OTHER_HOURS_BETWEEN_SPELLS;
    this.usualMean = person.population() == Population.CHILD ? 78 : chance.within(80, 102);
    this.line = chance.happens(0.65);
  }

  /** Readings that decide spells, in order of time. */
  List<Reading> readings() {
    return readings;
  }

  /** Cuff readings beside a line, at most 4 minutes after it: a careful reader sets them aside. */
  List<Reading> companions() {
    return companions;
  }

  /** Charts a stretch of the admission, with spells or without. */
  void chart(long from, long to, boolean withSpells) {
    long end = Math.min(to, Calendar.TO);
    long at = from + chance.between(2, 40) * 60;
    long spellAt = withSpells ? nextSpell(from) : Long.MAX_VALUE;
    long spellEnd = spellAt;
    while (at < end) {
      UnitKind kind = admission.unitAt(at).kind();
      if (at >= spellAt && at >= spellEnd) {
        spellEnd =
            at
                + (kind == UnitKind.CRITICAL_CARE
                        ? chance.between(25, 200)
                        : chance.between(50, 170))
                    * 60;
      }
      boolean low = at >= spellAt && at < spellEnd;
      chart(at, kind, low);
      if (low) {
        at +=
            (kind == UnitKind.CRITICAL_CARE ? chance.between(12, 19) : chance.between(35, 60)) * 60;
        if (at >= spellEnd) {
          spellAt = nextSpell(at);
          spellEnd = spellAt;
        }
      } else {
        long next =
            at
                + chance.between(kind.shortestReadingMinutes(), kind.longestReadingMinutes() + 1)
                    * 60;
        at = spellAt > at && spellAt < next ? spellAt : next;
      }
    }
  }

  private long nextSpell(long after) {
    return after + (long) (chance.exponential(meanHoursBetweenSpells) * 60) * 60 + 60;
  }

  private void chart(long at, UnitKind kind, boolean low) {
    double mean = low ? chance.within(47, 63) : Math.max(68, usualMean + 6 * chance.bell());
    int pulse = 34 + chance.below(24);
    int diastolic = (int) Math.floor(mean - pulse / 3.0 + 0.5);
    int systolic = diastolic + pulse;
    if (kind == UnitKind.CRITICAL_CARE && line) {
      readings.add(new Reading(at, systolic, diastolic, (int) (mean + 0.5), LINE, admission.id()));
      if (chance.happens(0.08)) {
        companions.add(
            new Reading(
                at + chance.between(1, 5) * 60,
                systolic + 9,
                diastolic + 4,
                0,
                CUFF,
                admission.id()));
      }
      return;
    }
    boolean systolicOnly = !low && systolic >= 95 && chance.happens(0.006);
    int charted = systolicOnly || chance.happens(0.7) ? 0 : (int) (mean + 0.5);
    String method = chance.happens(0.02) ? "unknown" : CUFF;
    readings.add(
        new Reading(at, systolic, systolicOnly ? 0 : diastolic, charted, method, admission.id()));
  }
}
