package millrace.analytics.patient;

import java.time.LocalDate;
import java.util.TreeSet;
import millrace.analytics.cohort.CohortClass;
import millrace.analytics.exposure.Exposure;
import millrace.analytics.exposure.Subjects;
import millrace.analytics.risk.LocalDays;
import millrace.analytics.timeline.CreatinineLine;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.Stretch;

/**
 * How much creatinine is looked for: results and occupied time by month and unit (methods 6), and
 * exposed days with a result within 24 h of noon (methods 7).
 */
final class ActivityTally {
  private static final long NEAR_NOON_SECONDS = 86_400;
  private static final int MONTH_LENGTH = 7;

  private final RunContext context;
  private final LocalDays days;
  private final Tally tally;
  private final long coversFrom;
  private final long coversTo;

  ActivityTally(RunContext context, LocalDays days, Tally tally) {
    this.context = context;
    this.days = days;
    this.tally = tally;
    this.coversFrom = context.cover().from();
    this.coversTo = context.cover().to();
  }

  /** Occupied time and results of all admissions, by month and unit. */
  void testing(PatientTimeline timeline) {
    TreeSet<Long> cuts = new TreeSet<>();
    for (long change : timeline.occupancy().changes()) {
      cuts.add(change);
    }
    for (Stretch stretch : timeline.membership().stretches()) {
      for (long day = days.endOfDay(stretch.from()); day < stretch.to(); day = days.endOfDay(day)) {
        if (LocalDate.ofEpochDay(days.dayOf(day)).getDayOfMonth() == 1) {
          cuts.add(day);
        }
      }
    }
    Long from = null;
    for (long to : cuts) {
      if (from != null && timeline.membership().holder(from) != Membership.NONE) {
        long clippedFrom = Math.max(from, coversFrom);
        long seconds = Math.min(to, coversTo) - clippedFrom;
        if (seconds > 0) {
          add(timeline, clippedFrom, "seconds", seconds);
        }
      }
      from = to;
    }
    for (long at : timeline.line().at()) {
      if (at >= coversFrom && timeline.membership().holder(at) != Membership.NONE) {
        add(timeline, at, "results", 1);
      }
    }
  }

  /** Exposed and monitored days of an eligible admission, for each agent and class. */
  void monitoring(PatientTimeline timeline, int admission, CohortClass cohort, Exposure exposure) {
    if (cohort != CohortClass.ELIGIBLE || exposure.sets().isEmpty()) {
      return;
    }
    Stretch stretch = timeline.membership().stretches().get(admission);
    long start = Math.max(stretch.from(), coversFrom);
    long end = Math.min(stretch.to(), coversTo);
    for (long from = start; from < end; ) {
      long to = Math.min(days.endOfDay(from), end);
      long dayStart = from;
      boolean monitored = hasResultNear(timeline.line(), days.noonOf(days.dayOf(from)));
      exposure
          .sets()
          .forEach(
              (number, set) -> {
                Subjects.Level level = context.subjects().all().get(number).level();
                if (level != Subjects.Level.COMBINATION && set.overlapSeconds(dayStart, to) > 0) {
                  String subject = Integer.toString(number);
                  tally.add(Tally.Group.MONITORING, subject, "exposed", "", 1);
                  tally.add(Tally.Group.MONITORING, subject, "monitored", "", monitored ? 1 : 0);
                }
              });
      from = to;
    }
  }

  private void add(PatientTimeline timeline, long instant, String what, long more) {
    String month = LocalDate.ofEpochDay(days.dayOf(instant)).toString().substring(0, MONTH_LENGTH);
    tally.add(Tally.Group.TESTING, month, timeline.occupancy().unitAt(instant), what, more);
  }

  private static boolean hasResultNear(CreatinineLine line, long noon) {
    int first = line.firstFrom(noon - NEAR_NOON_SECONDS);
    return first < line.size() && line.at()[first] <= noon + NEAR_NOON_SECONDS;
  }
}
