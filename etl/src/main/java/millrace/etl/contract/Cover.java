package millrace.etl.contract;

import java.io.Serializable;
import java.time.LocalDate;
import java.time.ZoneId;

/**
 * What an extract claims to cover.
 *
 * @param zone zone of every wall-clock time in the extract
 * @param fromDate first local date covered
 * @param toDate local date after the last one covered
 */
public record Cover(ZoneId zone, LocalDate fromDate, LocalDate toDate) implements Serializable {
  /** First instant covered, in epoch seconds. */
  public long from() {
    return fromDate.atStartOfDay(zone).toEpochSecond();
  }

  /** First instant after the cover, in epoch seconds; open stays are cut here. */
  public long to() {
    return toDate.atStartOfDay(zone).toEpochSecond();
  }
}
