package millrace.analytics.baseline;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.temporal.ChronoUnit;
import java.util.Arrays;
import java.util.OptionalLong;
import millrace.analytics.policy.BaselinePolicy;
import millrace.analytics.timeline.CreatinineLine;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.Stretch;
import millrace.etl.record.ResultSetting;

/** Finds the baseline of each admission by the policy's method (methods 3). */
public final class BaselineFinder {
  private static final double TARGET_RATE = 75;
  private static final int ADULT_YEARS = 18;

  private final BaselinePolicy policy;
  private final ZoneId zone;

  /** A finder. */
  public BaselineFinder(BaselinePolicy policy, ZoneId zone) {
    this.policy = policy;
    this.zone = zone;
  }

  /** The baseline in nmol/L of an admission, by its number, or empty. */
  public OptionalLong find(PatientTimeline timeline, int admission) {
    CreatinineLine line = timeline.line();
    Stretch stretch = timeline.membership().stretches().get(admission);
    return switch (policy.method()) {
      case OUTPATIENT_MEDIAN -> median(outpatient(line, stretch.from()));
      case ROLLING_ONLY -> OptionalLong.empty();
      case FIRST_VALUE -> first(line, admission);
      case LOWEST_FIRST_WEEK ->
          lowest(line, admission, stretch.from() + policy.lowestValueReachSeconds());
      case BACK_CALCULATED_75 -> {
        OptionalLong median = median(outpatient(line, stretch.from()));
        yield median.isPresent() ? median : backCalculated(timeline, stretch.from());
      }
      case LATEST_OUTPATIENT -> {
        long[] values = outpatient(line, stretch.from());
        yield values.length == 0
            ? OptionalLong.empty()
            : OptionalLong.of(values[values.length - 1]);
      }
    };
  }

  /**
   * Outpatient results of the window before admission, in order; both ends of the window included.
   */
  private long[] outpatient(CreatinineLine line, long admittedAt) {
    long[] values = new long[line.size()];
    int count = 0;
    long until = admittedAt - policy.untilSeconds();
    for (int i = line.firstFrom(admittedAt - policy.fromSeconds());
        i < line.size() && line.at()[i] <= until;
        i++) {
      ResultSetting setting = line.setting()[i];
      if (line.admission()[i] == Membership.NONE
          && setting != ResultSetting.INPATIENT
          && setting != ResultSetting.EMERGENCY) {
        values[count++] = line.nanomolesPerLitre()[i];
      }
    }
    return Arrays.copyOf(values, count);
  }

  private static OptionalLong median(long[] values) {
    if (values.length == 0) {
      return OptionalLong.empty();
    }
    long[] sorted = values.clone();
    Arrays.sort(sorted);
    int middle = sorted.length / 2;
    return OptionalLong.of(
        sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle] + 1) / 2);
  }

  private static OptionalLong first(CreatinineLine line, int admission) {
    for (int i = 0; i < line.size(); i++) {
      if (line.admission()[i] == admission) {
        return OptionalLong.of(line.nanomolesPerLitre()[i]);
      }
    }
    return OptionalLong.empty();
  }

  private static OptionalLong lowest(CreatinineLine line, int admission, long before) {
    long lowest = Long.MAX_VALUE;
    for (int i = 0; i < line.size() && line.at()[i] < before; i++) {
      if (line.admission()[i] == admission) {
        lowest = Math.min(lowest, line.nanomolesPerLitre()[i]);
      }
    }
    return lowest == Long.MAX_VALUE ? OptionalLong.empty() : OptionalLong.of(lowest);
  }

  private OptionalLong backCalculated(PatientTimeline timeline, long admittedAt) {
    LocalDate admitted = Instant.ofEpochSecond(admittedAt).atZone(zone).toLocalDate();
    int age = (int) ChronoUnit.YEARS.between(timeline.patient().birthDate(), admitted);
    return age < ADULT_YEARS
        ? OptionalLong.empty()
        : OptionalLong.of(CkdEpi2021.creatinine(TARGET_RATE, age, timeline.patient().sex()));
  }
}
