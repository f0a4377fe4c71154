package millrace.ui.page;

import java.time.YearMonth;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.OptionalDouble;

/** Numbers and months as they are printed. */
public final class Say {
  private static final DateTimeFormatter MONTH =
      DateTimeFormatter.ofPattern("MMMM uuuu", Locale.ENGLISH);
  private static final String NONE = "–";

  private Say() {}

  /** A count, with commas. */
  public static String count(long value) {
    return String.format(Locale.ROOT, "%,d", value);
  }

  /** A count and its noun. */
  public static String count(long value, String noun) {
    return count(value) + " " + noun + (value == 1 ? "" : "s");
  }

  /** Days, whole. */
  public static String days(double value) {
    return String.format(Locale.ROOT, "%,.0f", value);
  }

  /** A rate, one decimal. */
  public static String rate(OptionalDouble value) {
    return value.isEmpty() ? NONE : rate(value.getAsDouble());
  }

  /** A rate, one decimal. */
  public static String rate(double value) {
    return String.format(Locale.ROOT, "%,.1f", value);
  }

  /** Limits of a rate. */
  public static String limits(OptionalDouble lower, OptionalDouble upper) {
    return lower.isEmpty() ? NONE : rate(lower) + "–" + (upper.isEmpty() ? "∞" : rate(upper));
  }

  /** A ratio, two decimals. */
  public static String ratio(OptionalDouble value) {
    return value.isEmpty() ? NONE : ratio(value.getAsDouble());
  }

  /** A ratio, two decimals. */
  public static String ratio(double value) {
    return String.format(Locale.ROOT, "%,.2f", value);
  }

  /** A ratio with its limits. */
  public static String ratio(OptionalDouble value, OptionalDouble lower, OptionalDouble upper) {
    if (value.isEmpty() && lower.isEmpty()) {
      return NONE;
    }
    return ratio(value) + " (" + ratio(lower) + "–" + (upper.isEmpty() ? "∞" : ratio(upper)) + ")";
  }

  /** A small probability. */
  public static String q(OptionalDouble value) {
    if (value.isEmpty()) {
      return NONE;
    }
    return value.getAsDouble() < 0.001
        ? "< 0.001"
        : String.format(Locale.ROOT, "%.3f", value.getAsDouble());
  }

  /** A share in percent. */
  public static String percent(long part, long whole) {
    if (whole == 0) {
      return NONE;
    }
    double percent = 100.0 * part / whole;
    return percent > 0 && percent < 0.1
        ? "< 0.1 %"
        : String.format(Locale.ROOT, "%.1f %%", percent);
  }

  /** A month in words. */
  public static String month(YearMonth month) {
    return MONTH.format(month);
  }
}
