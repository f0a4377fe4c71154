package millrace.analytics.criteria;

/** Exact comparisons of creatinine values in nmol/L (methods 1). */
public final class Ratios {
  private Ratios() {}

  /** Whether {@code value} is at least 1.5 times {@code reference}. */
  public static boolean atLeastOneAndAHalf(long value, long reference) {
    return 2 * value >= 3 * reference;
  }

  /** Whether {@code value} is at least twice {@code reference}. */
  public static boolean atLeastTwo(long value, long reference) {
    return value >= 2 * reference;
  }

  /** Whether {@code value} is at least three times {@code reference}. */
  public static boolean atLeastThree(long value, long reference) {
    return value >= 3 * reference;
  }
}
