package millrace.sampledata.scenario;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.Arrays;

/**
 * The time the extract covers, and the wall clock of the invented town as tables, so that millions
 * of times are printed without a general conversion.
 */
public final class Calendar {
  /** Zone of every wall-clock time. */
  public static final ZoneId ZONE = ZoneId.of("Europe/Dublin");

  /** First day covered. */
  public static final LocalDate COVERS_FROM = LocalDate.of(2029, 4, 1);

  /** First day no longer covered. */
  public static final LocalDate COVERS_TO = LocalDate.of(2031, 4, 1);

  /** Months covered. */
  public static final int MONTHS = 24;

  /** Start of coverage, seconds since the epoch. */
  public static final long FROM = startOf(COVERS_FROM);

  /** End of coverage, seconds since the epoch. */
  public static final long TO = startOf(COVERS_TO);

  private static final LocalDate FIRST_DAY = LocalDate.of(2020, 1, 1);
  private static final int DAYS = 5114;
  private static final long[] DAY_STARTS = dayStarts();
  private static final long[] MONTH_STARTS = monthStarts();
  private static final long[] CHANGES;
  private static final long[] OFFSETS;

  static {
    var transitions =
        Arrays.stream(DAY_STARTS)
            .filter(start -> offsetBySlowWay(start) != offsetBySlowWay(start + 86_400))
            .mapToObj(start -> ZONE.getRules().nextTransition(Instant.ofEpochSecond(start)))
            .toList();
    CHANGES = transitions.stream().mapToLong(change -> change.toEpochSecond()).toArray();
    OFFSETS = new long[CHANGES.length + 1];
    OFFSETS[0] = offsetBySlowWay(DAY_STARTS[0]);
    for (int index = 0; index < CHANGES.length; index++) {
      OFFSETS[index + 1] = transitions.get(index).getOffsetAfter().getTotalSeconds();
    }
  }

  private Calendar() {}

  /**
   * Start of a local day.
   *
   * @param day the day
   * @return seconds since the epoch
   */
  public static long startOf(LocalDate day) {
    return day.atStartOfDay(ZONE).toEpochSecond();
  }

  /**
   * Wall-clock seconds of an instant: its seconds since the epoch plus the offset then in force.
   *
   * @param seconds instant between 2020 and 2033, seconds since the epoch
   * @return wall-clock seconds
   */
  public static long wallSeconds(long seconds) {
    int index = Arrays.binarySearch(CHANGES, seconds);
    return seconds + OFFSETS[index >= 0 ? index + 1 : -index - 1];
  }

  /**
   * Start of the local day that holds an instant, a number of days later.
   *
   * @param seconds instant between 2020 and 2033, seconds since the epoch
   * @param daysLater days to go on
   * @return seconds since the epoch
   */
  public static long startOfDay(long seconds, int daysLater) {
    return DAY_STARTS[dayIndex(seconds) + daysLater];
  }

  /**
   * Local date of an instant.
   *
   * @param seconds seconds since the epoch
   * @return the date
   */
  public static LocalDate dateOf(long seconds) {
    return Instant.ofEpochSecond(seconds).atZone(ZONE).toLocalDate();
  }

  /**
   * Number of the covered month that holds an instant.
   *
   * @param seconds seconds since the epoch
   * @return 0 for the first month; -1 before coverage, {@link #MONTHS} after it
   */
  public static int monthOf(long seconds) {
    int index = Arrays.binarySearch(MONTH_STARTS, seconds);
    return index >= 0 ? index : -index - 2;
  }

  /**
   * Start of a covered month.
   *
   * @param month its number, 0 for the first, {@link #MONTHS} for the end
   * @return seconds since the epoch
   */
  public static long startOfMonth(int month) {
    return MONTH_STARTS[month];
  }

  private static int dayIndex(long seconds) {
    return (int) (Math.floorDiv(wallSeconds(seconds), 86_400L) - FIRST_DAY.toEpochDay());
  }

  private static long[] dayStarts() {
    long[] starts = new long[DAYS];
    for (int index = 0; index < DAYS; index++) {
      starts[index] = startOf(FIRST_DAY.plusDays(index));
    }
    return starts;
  }

  private static long[] monthStarts() {
    long[] starts = new long[MONTHS + 1];
    for (int month = 0; month <= MONTHS; month++) {
      starts[month] = startOf(COVERS_FROM.plusMonths(month));
    }
    return starts;
  }

  private static long offsetBySlowWay(long seconds) {
    return ZONE.getRules().getOffset(Instant.ofEpochSecond(seconds)).getTotalSeconds();
  }
}
