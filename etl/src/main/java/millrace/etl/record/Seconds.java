package millrace.etl.record;

/**
 * Instants as epoch seconds UTC (methods 1), kept primitive because an extract has many millions of
 * them.
 */
public final class Seconds {
  /** The value of a time that the extract does not give. */
  public static final long ABSENT = Long.MIN_VALUE;

  /** Seconds of one minute. */
  public static final long MINUTE = 60;

  /** Seconds of one hour. */
  public static final long HOUR = 3_600;

  /** Seconds of one day of 86,400 seconds. */
  public static final long DAY = 86_400;

  private Seconds() {}

  /** Whether the time is given. */
  public static boolean given(long epochSecond) {
    return epochSecond != ABSENT;
  }
}
