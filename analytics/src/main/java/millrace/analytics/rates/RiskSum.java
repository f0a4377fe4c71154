package millrace.analytics.rates;

/**
 * Time at risk and what happened in it.
 *
 * @param seconds time at risk
 * @param episodes counted episodes
 * @param stage2plus of which stage 2 or 3
 */
public record RiskSum(long seconds, long episodes, long stage2plus) {
  /** Nothing. */
  public static final RiskSum ZERO = new RiskSum(0, 0, 0);

  private static final double SECONDS_OF_A_DAY = 86_400;

  /** Both together. */
  public RiskSum plus(RiskSum other) {
    return new RiskSum(
        seconds + other.seconds, episodes + other.episodes, stage2plus + other.stage2plus);
  }

  /** What is left without a part. */
  public RiskSum minus(RiskSum part) {
    return new RiskSum(
        seconds - part.seconds, episodes - part.episodes, stage2plus - part.stage2plus);
  }

  /** Patient-days at risk. */
  public double days() {
    return seconds / SECONDS_OF_A_DAY;
  }
}
