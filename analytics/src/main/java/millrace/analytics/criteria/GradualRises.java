package millrace.analytics.criteria;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalLong;
import millrace.analytics.timeline.Membership;

/**
 * Collects the gradual rises of a patient as the results go by (methods 4, GRADUAL). Not for
 * several threads.
 */
public final class GradualRises {
  private final OptionalLong[] baselines;
  private final long[] lowestBefore;
  private final boolean[] found;
  private final List<GradualRise> rises = new ArrayList<>();

  /** Over the admissions with those baselines. */
  public GradualRises(OptionalLong[] baselines) {
    this.baselines = baselines;
    this.lowestBefore = new long[baselines.length];
    this.found = new boolean[baselines.length];
    Arrays.fill(lowestBefore, SlidingMinimum.NONE);
  }

  /** A result at which no episode is open, no evidence holds and none closes. */
  public void quiet(int admission, long t, long value) {
    if (admission == Membership.NONE || found[admission]) {
      return;
    }
    long reference = baselines[admission].orElse(lowestBefore[admission]);
    if (reference != SlidingMinimum.NONE && Ratios.atLeastOneAndAHalf(value, reference)) {
      found[admission] = true;
      rises.add(new GradualRise(admission, t, reference, value));
    }
  }

  /** Any result, after it was judged. */
  public void passed(int admission, long value) {
    if (admission != Membership.NONE) {
      lowestBefore[admission] = Math.min(lowestBefore[admission], value);
    }
  }

  /** The rises found, in order. */
  public List<GradualRise> rises() {
    return rises;
  }
}
