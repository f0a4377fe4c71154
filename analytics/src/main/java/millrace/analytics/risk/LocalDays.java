package millrace.analytics.risk;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;

/** Local calendar days of a zone; remembers the last one. Not for several threads. */
public final class LocalDays {
  private final ZoneId zone;
  private long from = 1;
  private long to;
  private long epochDay;

  /** Days of that zone. */
  public LocalDays(ZoneId zone) {
    this.zone = zone;
  }

  /** The local day of an instant, in days from 1970-01-01. */
  public long dayOf(long epochSecond) {
    if (epochSecond < from || epochSecond >= to) {
      LocalDate day = Instant.ofEpochSecond(epochSecond).atZone(zone).toLocalDate();
      epochDay = day.toEpochDay();
      from = day.atStartOfDay(zone).toEpochSecond();
      to = day.plusDays(1).atStartOfDay(zone).toEpochSecond();
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
}
