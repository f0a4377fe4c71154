package millrace.etl.record;

/**
 * A blood pressure with at least one usable field, in billionths of a mmHg.
 *
 * @param measuredAt reading
 * @param systolicNanoMmHg systolic, or {@link #NONE}
 * @param diastolicNanoMmHg diastolic, or {@link #NONE}
 * @param meanNanoMmHg recorded mean, or {@link #NONE}
 * @param method how it was taken
 * @param admissionId admission as the extract writes it; empty when not given. Information only:
 *     membership is by time
 * @param source where the row stands
 */
public record BloodPressure(
    long measuredAt,
    long systolicNanoMmHg,
    long diastolicNanoMmHg,
    long meanNanoMmHg,
    PressureMethod method,
    String admissionId,
    SourceLine source) {
  /** The value of a pressure that is not given or was implausible. */
  public static final long NONE = Long.MIN_VALUE;

  /** Billionths of one mmHg. */
  public static final long NANOS = 1_000_000_000L;

  /**
   * Whether the reading has a mean arterial pressure: recorded, or diastolic and systolic (methods
   * 8).
   */
  public boolean hasMap() {
    return meanNanoMmHg != NONE || (systolicNanoMmHg != NONE && diastolicNanoMmHg != NONE);
  }

  /**
   * Three times the mean arterial pressure in billionths of a mmHg, so that diastolic + (systolic -
   * diastolic) / 3 stays exact.
   *
   * @throws IllegalStateException if the reading has none
   */
  public long mapThirdsNanoMmHg() {
    if (meanNanoMmHg != NONE) {
      return 3 * meanNanoMmHg;
    }
    if (!hasMap()) {
      throw new IllegalStateException("the reading has no mean arterial pressure");
    }
    return 2 * diastolicNanoMmHg + systolicNanoMmHg;
  }
}
