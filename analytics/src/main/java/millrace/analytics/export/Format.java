package millrace.analytics.export;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** How a value is printed; rounding is half-up and an absent value is empty (methods 12). */
public enum Format {
  /** As it is: texts, whole numbers, flags, times in ISO-8601 UTC. */
  PLAIN {
    @Override
    String printPresent(Object value) {
      return value.toString();
    }
  },
  /** Nanomoles per litre as mg/dL with 4 decimals. */
  MILLIGRAMS_PER_DECILITRE {
    @Override
    String printPresent(Object value) {
      return BigDecimal.valueOf((Long) value)
          .divide(NANOMOLES_PER_MILLIGRAM, 4, RoundingMode.HALF_UP)
          .toPlainString();
    }
  },
  /** Seconds as days with 6 decimals. */
  DAYS {
    @Override
    String printPresent(Object value) {
      return BigDecimal.valueOf((Long) value)
          .divide(SECONDS_OF_A_DAY, 6, RoundingMode.HALF_UP)
          .toPlainString();
    }
  },
  /** A rate, ratio or probability with 6 significant digits. */
  SIX_DIGITS {
    @Override
    String printPresent(Object value) {
      double number = (Double) value;
      if (number == 0) {
        return "0";
      }
      BigDecimal rounded = new BigDecimal(number).round(SIX);
      return rounded
          .setScale(rounded.scale() + SIX.getPrecision() - rounded.precision())
          .toPlainString();
    }
  },
  /** A measure with 4 decimals. */
  FOUR_DECIMALS {
    @Override
    String printPresent(Object value) {
      return new BigDecimal((Double) value).setScale(4, RoundingMode.HALF_UP).toPlainString();
    }
  };

  private static final BigDecimal NANOMOLES_PER_MILLIGRAM = BigDecimal.valueOf(88_400);
  private static final BigDecimal SECONDS_OF_A_DAY = BigDecimal.valueOf(86_400);
  private static final MathContext SIX = new MathContext(6, RoundingMode.HALF_UP);

  /** Prints a value; null prints as nothing. */
  public String print(Object value) {
    return value == null ? "" : printPresent(value);
  }

  abstract String printPresent(Object value);
}
