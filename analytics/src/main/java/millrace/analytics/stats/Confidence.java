package millrace.analytics.stats;

import org.apache.commons.statistics.distribution.NormalDistribution;

/** Two-sided confidence: what one tail holds, and the normal quantile that cuts it off. */
public final class Confidence {
  /** The 95 % at which the program reports. */
  public static final double NINETY_FIVE_PERCENT = 0.95;

  private static final double LEAST = 0.5;
  private static final NormalDistribution STANDARD_NORMAL = NormalDistribution.of(0, 1);

  private Confidence() {}

  /**
   * Probability left in each tail.
   *
   * @param confidence two-sided confidence, at least 0.5 and below 1
   * @return {@code (1 - confidence) / 2}, e.g. 0.025
   * @throws IllegalArgumentException if the confidence is outside {@code [0.5, 1)} or NaN
   */
  public static double tail(double confidence) {
    if (confidence >= LEAST && confidence < 1) {
      return (1 - confidence) / 2;
    }
    throw new IllegalArgumentException(
        "confidence must be at least 0.5 and below 1, and is " + confidence);
  }

  /**
   * Standard normal quantile of a two-sided confidence, exact and not rounded to 1.96.
   *
   * @param confidence two-sided confidence, at least 0.5 and below 1
   * @return the z with {@code P(Z > z) = (1 - confidence) / 2}, e.g. 1.959963984540054
   * @throws IllegalArgumentException if the confidence is outside {@code [0.5, 1)} or NaN
   */
  public static double normalQuantile(double confidence) {
    return STANDARD_NORMAL.inverseSurvivalProbability(tail(confidence));
  }
}
