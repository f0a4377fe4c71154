package millrace.analytics.risk;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.zone.ZoneRules;

/**
 * Local calendar days of a zone. Remembers the last day, and the offset of the stretch around it,
 * so that most days need no look-up of the zone's rules. Not for several threads.
 */
public final class LocalDays {
  private static final long DAY_SECONDS = 86_400;

  private final ZoneId zone;
  private final ZoneRules rules;
  private long from = 1;
  private long to;
  private long epochDay;

  /** Days of that zone. */
  public LocalDays(ZoneId zone) {
    this.zone = zone;
    this.rules = zone.getRules();
  }

  /** The local day of an instant, in days from 1970-01-01. */
  public long dayOf(long epochSecond) {
    if (epochSecond >= to && epochSecond < to + DAY_SECONDS / 2 && from < to) {
      // The next day, as when days are walked one by one.
      next();
    } else if (epochSecond < from || epochSecond >= to) {
      ZoneOffset offset = rules.getOffset(Instant.ofEpochSecond(epochSecond));
      place(Math.floorDiv(epochSecond + offset.getTotalSeconds(), DAY_SECONDS));
    }
    return epochDay;
  }

  /** The first instant after the local day of an instant. */
  public long endOfDay(long epochSecond) {
    dayOf(epochSecond);
    return to;
  }

  /** Noon by the clock of a local day. */
  public long noonOf(long day) {
    return LocalDate.ofEpochDay(day).atTime(12, 0).atZone(zone).toEpochSecond();
  }

  private void next() {
    from = to;
    epochDay++;
    to = startOf(epochDay + 1);
  }

  private void place(long day) {
    epochDay = day;
    from = startOf(day);
    to = startOf(day + 1);
  }

  private long startOf(long day) {
    return LocalDate.ofEpochDay(day).atStartOfDay(zone).toEpochSecond();
  }
}
