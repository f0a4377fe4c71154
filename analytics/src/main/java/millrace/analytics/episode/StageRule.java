package millrace.analytics.episode;

import java.time.Instant;
import java.time.ZoneId;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.OptionalLong;
import millrace.analytics.criteria.Ratios;
import millrace.analytics.policy.Policy;
import millrace.analytics.timeline.PatientTimeline;
import millrace.etl.record.BodyHeight;

/**
 * The stage of a result against a reference (methods 5; KDIGO 2012 table 2; bedside Schwartz 2009,
 * JASN 20:629).
 */
public final class StageRule {
  private static final int ADULT_YEARS = 18;

  /** 0.413 times 1,000, times the nmol/L of one mg/dL. */
  private static final long SCHWARTZ = 413L * 88_400;

  /** Thousandths of the Schwartz factor times millionths of a centimetre. */
  private static final long SCALE = 1_000L * 1_000_000;

  private final Policy policy;
  private final PatientTimeline timeline;
  private final ZoneId zone;

  /** The rule for one patient. */
  public StageRule(Policy policy, PatientTimeline timeline, ZoneId zone) {
    this.policy = policy;
    this.timeline = timeline;
    this.zone = zone;
  }

  /** The stage, 1 to 3, of a value at an instant. */
  public int stage(long value, long at, OptionalLong reference) {
    boolean ceiling = value >= policy.criteria().ceilingNanomolesPerLitre();
    boolean three = reference.isPresent() && Ratios.atLeastThree(value, reference.getAsLong());
    if (ceiling || three || lowRate(value, at, reference)) {
      return 3;
    }
    return reference.isPresent() && Ratios.atLeastTwo(value, reference.getAsLong()) ? 2 : 1;
  }

  /** Under 18: an eGFR below the floor that was not below it at the reference already. */
  private boolean lowRate(long value, long at, OptionalLong reference) {
    if (timeline.heights().isEmpty() || !isChild(at)) {
      return false;
    }
    long height = nearestHeight(at);
    return height > 0
        && below(height, value)
        && !(reference.isPresent() && below(height, reference.getAsLong()));
  }

  private boolean isChild(long at) {
    return ChronoUnit.YEARS.between(
            timeline.patient().birthDate(), Instant.ofEpochSecond(at).atZone(zone).toLocalDate())
        < ADULT_YEARS;
  }

  private boolean below(long microCentimetres, long nanomolesPerLitre) {
    return SCHWARTZ * microCentimetres < policy.episode().egfrFloor() * nanomolesPerLitre * SCALE;
  }

  /**
   * The nearest height in millionths of a centimetre, the earlier on a tie; 0 when none is in
   * reach.
   */
  private long nearestHeight(long at) {
    long nearest = 0;
    long distance = policy.episode().heightReachSeconds() + 1;
    List<BodyHeight> heights = timeline.heights();
    for (BodyHeight height : heights) {
      long away = Math.abs(height.measuredAt() - at);
      if (away < distance) {
        distance = away;
        nearest = height.microCentimetres();
      }
    }
    return nearest;
  }
}
