package millrace.etl.parse;

/**
 * Reads {@code YYYY-MM-DDTHH:MM[:SS[.fff]]}, with a blank for the T, with or without an offset or
 * Z, and bare dates, at fixed positions. Fractions of a second are cut. Not for several threads.
 */
public final class TimeText {
  /** What a text was read as. */
  public enum Outcome {
    /** A time. */
    TIME,
    /** A date without a time of day. */
    BARE_DATE,
    /** Neither. */
    UNREADABLE
  }

  private static final int[] DAYS_BEFORE_MONTH = {
    0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334
  };
  private static final int DATE_LENGTH = 10;
  private static final int SHORTEST_TIME = 16;

  private final WallClock clock;
  private long epochSecond;
  private long epochDay;
  private WallClock.Meeting meeting = WallClock.Meeting.PLAIN;

  /** Reads wall-clock times by that clock. */
  public TimeText(WallClock clock) {
    this.clock = clock;
  }

  /**
   * Reads bytes {@code [from, to)}; the answer is then in {@link #epochSecond()} or {@link
   * #epochDay()}.
   */
  public Outcome read(byte[] b, int from, int to) {
    meeting = WallClock.Meeting.PLAIN;
    int length = to - from;
    if (length < DATE_LENGTH || !readDate(b, from)) {
      return Outcome.UNREADABLE;
    }
    if (length == DATE_LENGTH) {
      return Outcome.BARE_DATE;
    }
    if (length < SHORTEST_TIME
        || (b[from + 10] != 'T' && b[from + 10] != ' ')
        || b[from + 13] != ':') {
      return Outcome.UNREADABLE;
    }
    int hour = two(b, from + 11);
    int minute = two(b, from + 14);
    int second = 0;
    int at = from + SHORTEST_TIME;
    if (at < to && b[at] == ':') {
      if (at + 3 > to) {
        return Outcome.UNREADABLE;
      }
      second = two(b, at + 1);
      at = afterFraction(b, at + 3, to);
    }
    if (at < 0 || hour < 0 || hour > 23 || minute < 0 || minute > 59 || second < 0 || second > 59) {
      return Outcome.UNREADABLE;
    }
    return place(b, at, to, epochDay * 86_400 + hour * 3_600L + minute * 60L + second);
  }

  /** The time read, in epoch seconds. */
  public long epochSecond() {
    return epochSecond;
  }

  /** The date read, in days from 1970-01-01. */
  public long epochDay() {
    return epochDay;
  }

  /** Whether the time read stands at a change of the clock. */
  public WallClock.Meeting meeting() {
    return meeting;
  }

  private Outcome place(byte[] b, int at, int to, long localSecond) {
    if (at == to) {
      epochSecond = clock.toEpochSecond(localSecond);
      meeting = clock.meeting();
      return Outcome.TIME;
    }
    long offset = offset(b, at, to);
    if (offset == Long.MIN_VALUE) {
      return Outcome.UNREADABLE;
    }
    epochSecond = localSecond - offset;
    return Outcome.TIME;
  }

  private static int afterFraction(byte[] b, int at, int to) {
    if (at >= to || b[at] != '.') {
      return at;
    }
    int i = at + 1;
    while (i < to && b[i] >= '0' && b[i] <= '9') {
      i++;
    }
    return i == at + 1 ? -1 : i;
  }

  /**
   * Seconds of {@code Z}, {@code +HH}, {@code +HH:MM} or {@code +HHMM}; Long.MIN_VALUE for anything
   * else.
   */
  private static long offset(byte[] b, int at, int to) {
    if (b[at] == 'Z' && at + 1 == to) {
      return 0;
    }
    if (b[at] != '+' && b[at] != '-') {
      return Long.MIN_VALUE;
    }
    int length = to - at;
    int hours = length >= 3 ? two(b, at + 1) : -1;
    int minutes = -1;
    if (length == 3) {
      minutes = 0;
    } else if (length == 6 && b[at + 3] == ':') {
      minutes = two(b, at + 4);
    } else if (length == 5) {
      minutes = two(b, at + 3);
    }
    if (hours < 0 || hours > 18 || minutes < 0 || minutes > 59) {
      return Long.MIN_VALUE;
    }
    long seconds = hours * 3_600L + minutes * 60L;
    return b[at] == '-' ? -seconds : seconds;
  }

  private boolean readDate(byte[] b, int from) {
    int high = two(b, from);
    int low = two(b, from + 2);
    int month = two(b, from + 5);
    int day = two(b, from + 8);
    if (high < 0
        || low < 0
        || b[from + 4] != '-'
        || b[from + 7] != '-'
        || month < 1
        || month > 12
        || day < 1) {
      return false;
    }
    int year = high * 100 + low;
    boolean leap = (year % 4 == 0 && year % 100 != 0) || year % 400 == 0;
    int length =
        month == 2
            ? (leap ? 29 : 28)
            : (month == 4 || month == 6 || month == 9 || month == 11 ? 30 : 31);
    if (day > length) {
      return false;
    }
    long years = year - 1L;
    long daysBeforeYear =
        years * 365
            + Math.floorDiv(years, 4)
            - Math.floorDiv(years, 100)
            + Math.floorDiv(years, 400);
    // 719162 days lie between 0001-01-01 and 1970-01-01.
    epochDay =
        daysBeforeYear
            + DAYS_BEFORE_MONTH[month - 1]
            + (leap && month > 2 ? 1 : 0)
            + day
            - 1
            - 719_162;
    return true;
  }

  private static int two(byte[] b, int at) {
    int tens = b[at] - '0';
    int ones = b[at + 1] - '0';
    return tens < 0 || tens > 9 || ones < 0 || ones > 9 ? -1 : tens * 10 + ones;
  }
}
