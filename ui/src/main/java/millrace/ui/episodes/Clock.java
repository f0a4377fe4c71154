package millrace.ui.episodes;

import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/**
 * Instants as the hospital's clock shows them.
 *
 * @param zone zone of the extract
 */
record Clock(ZoneId zone) {
  private static final DateTimeFormatter FULL =
      DateTimeFormatter.ofPattern("d MMM uuuu HH:mm", Locale.ENGLISH);
  private static final DateTimeFormatter SHORT =
      DateTimeFormatter.ofPattern("d MMM HH:mm", Locale.ENGLISH);
  private static final double SECONDS_OF_AN_HOUR = 3_600;
  private static final double LONG_HOURS = 72;
  private static final double HOURS_OF_A_DAY = 24;

  Clock(String zone) {
    this(ZoneId.of(zone));
  }

  /** Day, month, year and time. */
  String full(Instant at) {
    return FULL.format(at.atZone(zone));
  }

  /** Day, month and time. */
  String brief(Instant at) {
    return SHORT.format(at.atZone(zone));
  }

  /** Milliseconds at which a clock without zones shows the same. */
  long wall(Instant at) {
    return at.atZone(zone).toLocalDateTime().toInstant(ZoneOffset.UTC).toEpochMilli();
  }

  /** A span in hours, or days when long. */
  static String span(Instant from, Instant to) {
    return span(hours(from, to));
  }

  /** A span in hours, or days when long. */
  static String span(double hours) {
    return hours < LONG_HOURS
        ? String.format(Locale.ROOT, "%.0f hours", hours)
        : String.format(Locale.ROOT, "%.1f days", hours / HOURS_OF_A_DAY);
  }

  /** Hours between. */
  static double hours(Instant from, Instant to) {
    return Duration.between(from, to).toSeconds() / SECONDS_OF_AN_HOUR;
  }
}
