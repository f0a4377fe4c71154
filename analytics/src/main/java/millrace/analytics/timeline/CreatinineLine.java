package millrace.analytics.timeline;

import java.util.Arrays;
import millrace.etl.record.ResultSetting;

/**
 * A patient's unmasked creatinine results in order, one per instant (methods 2).
 *
 * @param at collection, ascending
 * @param nanomolesPerLitre value
 * @param admission number of the admission it belongs to, or {@link Membership#NONE}
 * @param setting where the specimen was taken
 */
public record CreatinineLine(
    long[] at, long[] nanomolesPerLitre, int[] admission, ResultSetting[] setting) {
  /** Number of results. */
  public int size() {
    return at.length;
  }

  /** Index of the first result at or after the instant. */
  public int firstFrom(long instant) {
    int found = Arrays.binarySearch(at, instant);
    return found >= 0 ? found : -found - 1;
  }

  /** Lowest value in {@code [from, to)}, or Long.MAX_VALUE. */
  public long lowest(long from, long to) {
    long lowest = Long.MAX_VALUE;
    for (int i = firstFrom(from); i < at.length && at[i] < to; i++) {
      lowest = Math.min(lowest, nanomolesPerLitre[i]);
    }
    return lowest;
  }
}
