package millrace.analytics.criteria;

import java.util.EnumSet;
import java.util.OptionalLong;
import java.util.Set;
import millrace.analytics.policy.CriteriaPolicy;
import millrace.analytics.timeline.CreatinineLine;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.PatientTimeline;

/** Judges one result after another of a patient (methods 4). Not for several threads. */
public final class EvidenceFinder {
  private final CriteriaPolicy policy;
  private final CreatinineLine line;
  private final Membership membership;
  private final OptionalLong[] baselines;
  private final int[] firstResult;

  /**
   * A finder for one patient.
   *
   * @param baselines baseline of each admission, by its number
   */
  public EvidenceFinder(CriteriaPolicy policy, PatientTimeline timeline, OptionalLong[] baselines) {
    this.policy = policy;
    this.line = timeline.line();
    this.membership = timeline.membership();
    this.baselines = baselines;
    this.firstResult = new int[baselines.length];
    for (int i = line.size() - 1; i >= 0; i--) {
      if (line.admission()[i] != Membership.NONE) {
        firstResult[line.admission()[i]] = i;
      }
    }
  }

  /** Every kind that holds at a result, and the reference an onset there would have. */
  public record Judgement(Set<Evidence> evidence, OptionalLong reference) {}

  /** Judges a result by its index; the window holds the results before it. */
  public Judgement judge(int result, Window window) {
    long t = line.at()[result];
    long value = line.nanomolesPerLitre()[result];
    int admission = line.admission()[result];
    Set<Evidence> evidence = EnumSet.noneOf(Evidence.class);
    long lowest48 = window.lowestForRise(t);
    if (lowest48 != SlidingMinimum.NONE && value - lowest48 >= policy.riseNanomolesPerLitre()) {
      evidence.add(Evidence.RISE_48H);
    }
    long lowest7 = window.lowestForRatio(t);
    if (lowest7 != SlidingMinimum.NONE && Ratios.atLeastOneAndAHalf(value, lowest7)) {
      evidence.add(Evidence.RATIO_7D);
    }
    OptionalLong baseline = baselineInReach(t, admission);
    if (baseline.isPresent() && Ratios.atLeastOneAndAHalf(value, baseline.getAsLong())) {
      evidence.add(Evidence.RATIO_BASELINE);
    }
    long reference = Math.min(lowest7, baseline.orElse(SlidingMinimum.NONE));
    long later = lowestLater(result);
    if (later != SlidingMinimum.NONE && Ratios.atLeastOneAndAHalf(value, later)) {
      evidence.add(Evidence.FALL_7D);
      reference = Math.min(reference, later);
    }
    return new Judgement(evidence, given(reference));
  }

  /**
   * The reference of an onset by a replacement at {@code t}, before looking past its washout; empty
   * for none.
   */
  public OptionalLong referenceAt(long t, int admission, Window window) {
    return given(
        Math.min(
            window.lowestForRatio(t), baselineInReach(t, admission).orElse(SlidingMinimum.NONE)));
  }

  /** The baseline of the admission that {@code t} belongs to, while it is in reach. */
  private OptionalLong baselineInReach(long t, int admission) {
    return admission != Membership.NONE
            && t < membership.stretches().get(admission).from() + policy.baselineReachSeconds()
        ? baselines[admission]
        : OptionalLong.empty();
  }

  /**
   * For the first result of an admission without a baseline: the lowest of the same admission that
   * follows within 7 d.
   */
  private long lowestLater(int result) {
    int admission = line.admission()[result];
    if (admission == Membership.NONE
        || firstResult[admission] != result
        || baselines[admission].isPresent()) {
      return SlidingMinimum.NONE;
    }
    long t = line.at()[result];
    if (t >= membership.stretches().get(admission).from() + policy.fallArrivalSeconds()) {
      return SlidingMinimum.NONE;
    }
    long lowest = SlidingMinimum.NONE;
    for (int i = result + 1;
        i < line.size() && line.at()[i] <= t + policy.fallWindowSeconds();
        i++) {
      if (line.admission()[i] == admission) {
        lowest = Math.min(lowest, line.nanomolesPerLitre()[i]);
      }
    }
    return lowest;
  }

  private static OptionalLong given(long value) {
    return value == SlidingMinimum.NONE ? OptionalLong.empty() : OptionalLong.of(value);
  }
}
