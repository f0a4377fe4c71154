package millrace.analytics.risk;

/**
 * A cell of time at risk (methods 6 to 8).
 *
 * @param epochDay local day, in days from 1970-01-01
 * @param unit number of the unit
 * @param attribution how the unit was chosen
 * @param subject number of the subject whose exposed time this is, or {@link #ALL} for the whole
 * @param recentHypotension stratum
 * @param burden 0 to 3
 */
public record RiskCell(
    long epochDay,
    int unit,
    Attribution attribution,
    int subject,
    boolean recentHypotension,
    int burden) {
  /** The subject of cells that hold the whole time at risk. */
  public static final int ALL = -1;

  private static final int DAY_SHIFT = 32;
  private static final int UNIT_SHIFT = 18;
  private static final int SUBJECT_SHIFT = 4;
  private static final int SUBJECT_BITS = (1 << (UNIT_SHIFT - SUBJECT_SHIFT)) - 1;
  private static final int UNIT_BITS = (1 << (DAY_SHIFT - UNIT_SHIFT)) - 1;

  /** The cell in 64 bits. */
  public long packed() {
    return epochDay << DAY_SHIFT
        | (long) unit << UNIT_SHIFT
        | (long) (subject + 1) << SUBJECT_SHIFT
        | (long) attribution.ordinal() << 3
        | (recentHypotension ? 4 : 0)
        | burden;
  }

  /** The cell of 64 bits. */
  public static RiskCell of(long packed) {
    return new RiskCell(
        packed >> DAY_SHIFT,
        (int) (packed >> UNIT_SHIFT) & UNIT_BITS,
        Attribution.values()[(int) (packed >> 3) & 1],
        ((int) (packed >> SUBJECT_SHIFT) & SUBJECT_BITS) - 1,
        (packed & 4) != 0,
        (int) packed & 3);
  }

  /** The cell of another subject. */
  static long withSubject(long packed, int subject) {
    return (packed & ~((long) SUBJECT_BITS << SUBJECT_SHIFT))
        | (long) (subject + 1) << SUBJECT_SHIFT;
  }
}
