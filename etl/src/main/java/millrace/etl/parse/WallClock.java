package millrace.etl.parse;

import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.zone.ZoneOffsetTransition;
import java.time.zone.ZoneRules;
import java.util.List;

/**
 * Local clock readings of one zone as instants: at the autumn overlap the earlier instant, in the
 * spring gap forward by the gap (extract contract, common rules). Remembers the last stretch
 * without a clock change, so that most readings need no look-up. Not for several threads.
 */
public final class WallClock {
  /** What a reading met. */
  public enum Meeting {
    /** A reading with one instant. */
    PLAIN,
    /** A reading that the clock showed twice. */
    OVERLAP,
    /** A reading that the clock never showed. */
    GAP
  }

  private final ZoneRules rules;
  private long plainFrom = 1;
  private long plainTo;
  private long plainOffset;
  private Meeting meeting = Meeting.PLAIN;

  /** A clock of that zone. */
  public WallClock(ZoneId zone) {
    rules = zone.getRules();
  }

  /**
   * The instant of a local reading.
   *
   * @param localSecond seconds from 1970-01-01T00:00 of the local calendar
   * @return epoch seconds
   */
  public long toEpochSecond(long localSecond) {
    if (localSecond < plainFrom || localSecond >= plainTo) {
      return lookUp(localSecond);
    }
    meeting = Meeting.PLAIN;
    return localSecond - plainOffset;
  }

  /** What the last reading met. */
  public Meeting meeting() {
    return meeting;
  }

  private long lookUp(long localSecond) {
    LocalDateTime local = LocalDateTime.ofEpochSecond(localSecond, 0, ZoneOffset.UTC);
    List<ZoneOffset> offsets = rules.getValidOffsets(local);
    if (offsets.size() == 1) {
      remember(local.toInstant(offsets.get(0)), offsets.get(0));
      meeting = Meeting.PLAIN;
      return localSecond - offsets.get(0).getTotalSeconds();
    }
    ZoneOffsetTransition change = rules.getTransition(local);
    meeting = change.isGap() ? Meeting.GAP : Meeting.OVERLAP;
    // Before a gap the old offset moves the reading forward by the gap; in an overlap it gives the
    // earlier instant.
    return localSecond - change.getOffsetBefore().getTotalSeconds();
  }

  private void remember(Instant instant, ZoneOffset offset) {
    ZoneOffsetTransition before = rules.previousTransition(instant.plusSeconds(1));
    ZoneOffsetTransition after = rules.nextTransition(instant);
    plainOffset = offset.getTotalSeconds();
    plainFrom = before == null ? Long.MIN_VALUE : Math.max(localBefore(before), localAfter(before));
    plainTo = after == null ? Long.MAX_VALUE : Math.min(localBefore(after), localAfter(after));
  }

  private static long localBefore(ZoneOffsetTransition change) {
    return change.toEpochSecond() + change.getOffsetBefore().getTotalSeconds();
  }

  private static long localAfter(ZoneOffsetTransition change) {
    return change.toEpochSecond() + change.getOffsetAfter().getTotalSeconds();
  }
}
