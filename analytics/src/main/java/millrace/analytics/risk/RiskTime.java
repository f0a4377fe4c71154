package millrace.analytics.risk;

import java.util.OptionalInt;

/**
 * The time at risk of an eligible admission.
 *
 * @param admission number of the admission
 * @param from start, clipped to the cover
 * @param to end, clipped to the cover; not before from
 * @param countedEpisode index of the episode that ended it and counts in rates, or empty
 */
public record RiskTime(int admission, long from, long to, OptionalInt countedEpisode) {
  /** Length in seconds. */
  public long seconds() {
    return to - from;
  }
}
