package millrace.analytics.criteria;

import millrace.analytics.policy.CriteriaPolicy;

/**
 * The results before an instant, in the two windows of the criteria, none earlier than the closing
 * of the previous episode (methods 4, W). Not for several threads.
 */
public final class Window {
  private final CriteriaPolicy policy;
  private final SlidingMinimum rise;
  private final SlidingMinimum ratio;
  private long floor = Long.MIN_VALUE;

  /** Windows over that many results. */
  public Window(CriteriaPolicy policy, int results) {
    this.policy = policy;
    this.rise = new SlidingMinimum(results);
    this.ratio = new SlidingMinimum(results);
  }

  /** Nothing before this instant counts any more; the closing result itself counts. */
  public void closeAt(long instant) {
    floor = instant;
  }

  /** Lowest of the 48 h before {@code t}, or {@link SlidingMinimum#NONE}. */
  public long lowestForRise(long t) {
    return rise.lowestFrom(Math.max(t - policy.riseWindowSeconds(), floor));
  }

  /** Lowest of the 7 d before {@code t}, or {@link SlidingMinimum#NONE}. */
  public long lowestForRatio(long t) {
    return ratio.lowestFrom(Math.max(t - policy.ratioWindowSeconds(), floor));
  }

  /** Adds a result after it was judged. */
  public void add(long t, long value) {
    rise.add(t, value);
    ratio.add(t, value);
  }
}
