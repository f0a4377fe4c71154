package millrace.sampledata.person;

import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.scenario.CareUnit;
import millrace.sampledata.scenario.Chance;

/** Plans the stays of an admission. */
final class PathPlanner {
  private static final long HOUR = 3600;
  private static final long DAY = 24 * HOUR;
  private static final CareUnit[] MEDICAL = {CareUnit.MED_1, CareUnit.MED_2, CareUnit.MED_3};

  private final Chance chance;
  private final List<Stay> stays = new ArrayList<>();
  private long at;
  private long end;

  PathPlanner(Chance chance) {
    this.chance = chance;
  }

  /** The stays of an admission, in order of entry. */
  List<Stay> plan(Profile profile, long admittedAt, long dischargedAt) {
    stays.clear();
    at = admittedAt;
    end = dischargedAt;
    switch (profile) {
      case MEDICAL -> medical();
      case SURGICAL -> surgical();
      case CRITICAL -> critical();
      case CANCER -> last(CareUnit.ONC);
      case MATERNITY -> last(CareUnit.OBS);
      case CHILD -> child();
      case SHORT -> emergencyOnly();
    }
    return stays;
  }

  private void medical() {
    if (chance.happens(0.7)) {
      emergencyFirst();
    }
    CareUnit ward = MEDICAL[chance.below(MEDICAL.length)];
    if (chance.happens(0.07) && end - at > 5 * DAY) {
      go(ward, DAY + hours(30));
      go(CareUnit.ICU, DAY + hours(40));
      go(CareUnit.HDU, 12 * HOUR + hours(24));
    }
    if (end - at > 12 * DAY && chance.happens(0.5)) {
      go(ward, (end - at) * 6 / 10);
      last(CareUnit.REHAB);
    } else {
      last(ward);
    }
  }

  private void surgical() {
    CareUnit ward = chance.happens(0.55) ? CareUnit.SURG_1 : CareUnit.SURG_2;
    boolean intensive = chance.happens(0.1) && end - at > 4 * DAY;
    long theatreAt = at + 4 * HOUR + hours(26);
    long theatreEnd = theatreAt + 2 * HOUR + hours(3);
    if (intensive) {
      stays.add(new Stay(ward, at, theatreAt));
      stays.add(new Stay(CareUnit.THEATRE, theatreAt, theatreEnd));
      at = theatreEnd;
      go(CareUnit.CSU, 18 * HOUR + hours(36));
      go(CareUnit.HDU, 12 * HOUR + hours(20));
      last(ward);
    } else {
      last(ward);
      if (theatreEnd < end - HOUR && chance.happens(0.75)) {
        stays.add(new Stay(CareUnit.THEATRE, theatreAt, theatreEnd));
      }
    }
  }

  private void critical() {
    boolean cardiac = chance.happens(0.4);
    if (!cardiac) {
      emergencyFirst();
    }
    long length = end - at;
    go(cardiac ? CareUnit.CSU : CareUnit.ICU, length * (30 + chance.below(25)) / 100);
    go(CareUnit.HDU, length * (12 + chance.below(8)) / 100);
    last(cardiac ? CareUnit.SURG_1 : MEDICAL[chance.below(MEDICAL.length)]);
  }

  private void child() {
    if (chance.happens(0.5)) {
      emergencyFirst();
    }
    if (chance.happens(0.05) && end - at > 2 * DAY) {
      go(CareUnit.ICU, DAY + hours(20));
    }
    last(CareUnit.PAED);
  }

  private void emergencyOnly() {
    stays.add(new Stay(CareUnit.ED, at - HOUR - hours(4), end));
  }

  private void emergencyFirst() {
    long leftAt = at + HOUR + hours(5);
    stays.add(new Stay(CareUnit.ED, at - HOUR - hours(5), leftAt));
    at = leftAt;
  }

  private void go(CareUnit unit, long seconds) {
    long leftAt = Math.min(end - HOUR, at + seconds / 60 * 60);
    if (leftAt > at) {
      stays.add(new Stay(unit, at, leftAt));
      at = leftAt;
    }
  }

  private void last(CareUnit unit) {
    stays.add(new Stay(unit, at, end));
  }

  private long hours(int bound) {
    return chance.below(bound * 60) * 60L;
  }
}
