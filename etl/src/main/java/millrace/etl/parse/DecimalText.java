package millrace.etl.parse;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;

/**
 * Reads a decimal number exactly: up to 15 digits in a long, anything longer or with an exponent as
 * a {@link BigDecimal}. Reused from field to field; not for several threads.
 */
public final class DecimalText {
  private static final int LONGEST_FAST = 15;

  /** Longer numbers are no measurement, and their arithmetic could take any amount of memory. */
  private static final int MOST_DIGITS = 100;

  private static final long[] POWERS = powers();

  private long unscaled;
  private int scale;
  private BigDecimal large;

  /** Reads bytes {@code [from, to)}; false when they are no decimal number. */
  public boolean read(byte[] b, int from, int to) {
    large = null;
    if (to - from > LONGEST_FAST + 2) {
      return readLarge(b, from, to);
    }
    boolean negative = b[from] == '-';
    int at = negative ? from + 1 : from;
    long value = 0;
    int digits = 0;
    int point = -1;
    for (; at < to; at++) {
      int digit = b[at] - '0';
      if (digit >= 0 && digit <= 9) {
        value = value * 10 + digit;
        digits++;
      } else if (b[at] == '.' && point < 0) {
        point = digits;
      } else {
        return readLarge(b, from, to);
      }
    }
    if (digits == 0 || digits > LONGEST_FAST) {
      return readLarge(b, from, to);
    }
    unscaled = negative ? -value : value;
    scale = point < 0 ? 0 : digits - point;
    return true;
  }

  /**
   * The number times {@code factor}, rounded half-up to a whole number.
   *
   * @param factor from 1 to 10,000,000,000
   * @throws ArithmeticException if it does not fit a long
   */
  public long timesRounded(long factor) {
    if (large == null && Math.multiplyHigh(unscaled, factor) == (unscaled >= 0 ? 0 : -1)) {
      long product = unscaled * factor;
      if (product >= 0 == unscaled >= 0) {
        long power = POWERS[scale];
        long whole = product / power;
        long rest = Math.abs(product % power);
        return rest >= power - rest ? whole + (product < 0 ? -1 : 1) : whole;
      }
    }
    return value()
        .multiply(BigDecimal.valueOf(factor))
        .setScale(0, RoundingMode.HALF_UP)
        .longValueExact();
  }

  /** The number. */
  public BigDecimal value() {
    return large == null ? BigDecimal.valueOf(unscaled, scale) : large;
  }

  private boolean readLarge(byte[] b, int from, int to) {
    try {
      large = new BigDecimal(new String(b, from, to - from, StandardCharsets.US_ASCII));
      return Math.abs((long) large.scale()) + large.precision() <= MOST_DIGITS;
    } catch (NumberFormatException e) {
      return false;
    }
  }

  private static long[] powers() {
    long[] powers = new long[LONGEST_FAST + 1];
    powers[0] = 1;
    for (int i = 1; i < powers.length; i++) {
      powers[i] = powers[i - 1] * 10;
    }
    return powers;
  }
}
