package millrace.sampledata.write;

import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import millrace.sampledata.scenario.Calendar;

/** Wall-clock times as bytes, from a table of days. */
public final class TimeText {
  /** Bytes of a time with seconds. */
  static final int LONGEST = 19;

  private static final LocalDate FIRST_DAY = LocalDate.of(2020, 1, 1);
  private static final int DAYS = 5114;
  private static final int DAY_BYTES = 10;
  private static final byte[] DATES = dates();

  private TimeText() {}

  /**
   * Puts {@code YYYY-MM-DD}, the separator and {@code HH:MM}, with seconds when asked; returns the
   * next position.
   */
  static int put(byte[] bytes, int at, long seconds, char separator, boolean withSeconds) {
    long wall = Calendar.wallSeconds(seconds);
    int next = putDay(bytes, at, wall);
    int rest = (int) Math.floorMod(wall, 86_400L);
    bytes[next++] = (byte) separator;
    next = twoDigits(bytes, next, rest / 3600);
    bytes[next++] = ':';
    next = twoDigits(bytes, next, rest / 60 % 60);
    if (withSeconds) {
      bytes[next++] = ':';
      next = twoDigits(bytes, next, rest % 60);
    }
    return next;
  }

  /**
   * A time as the large tables print it.
   *
   * @param seconds seconds since the epoch
   * @return {@code YYYY-MM-DDTHH:MM}
   */
  public static String minute(long seconds) {
    byte[] bytes = new byte[LONGEST];
    return new String(bytes, 0, put(bytes, 0, seconds, 'T', false), StandardCharsets.US_ASCII);
  }

  /** Puts the local date; returns the next position. */
  static int putDate(byte[] bytes, int at, long seconds) {
    return putDay(bytes, at, Calendar.wallSeconds(seconds));
  }

  private static int putDay(byte[] bytes, int at, long wall) {
    int day = (int) (Math.floorDiv(wall, 86_400L) - FIRST_DAY.toEpochDay());
    System.arraycopy(DATES, day * DAY_BYTES, bytes, at, DAY_BYTES);
    return at + DAY_BYTES;
  }

  private static int twoDigits(byte[] bytes, int at, int number) {
    bytes[at] = (byte) ('0' + number / 10);
    bytes[at + 1] = (byte) ('0' + number % 10);
    return at + 2;
  }

  private static byte[] dates() {
    StringBuilder text = new StringBuilder(DAYS * DAY_BYTES);
    for (int day = 0; day < DAYS; day++) {
      text.append(FIRST_DAY.plusDays(day));
    }
    return text.toString().getBytes(StandardCharsets.US_ASCII);
  }
}
