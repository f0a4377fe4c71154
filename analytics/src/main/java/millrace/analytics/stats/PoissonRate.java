package millrace.analytics.stats;

import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.commons.statistics.distribution.GammaDistribution;

/**
 * A count of events over an exposure, and its rate with exact limits.
 *
 * <p>Example: 4 episodes in 1,250 patient-days, given as {@code new PoissonRate(4, 1.25)}, are 3.20
 * (0.872 to 8.193) per 1,000 patient-days.
 *
 * @param events number of events, from 0 to 1,000,000,000
 * @param exposure person-time in the unit of the rate's denominator, or an expected count: 0, or
 *     from 1e-100 to 1e100
 * @see "Methods 6, 7 and 12; Garwood F. Biometrika 1936;28:437; Ulm K. Am J Epidemiol 1990;131:373"
 */
public record PoissonRate(long events, double exposure) {
  /**
   * Checks count and exposure.
   *
   * @throws IllegalArgumentException if the count or the exposure is out of range
   */
  public PoissonRate {
    EventCount.require("events", events);
    PersonTime.require("exposure", exposure);
  }

  /**
   * Exact (Garwood) limits of a Poisson mean. Without an event the lower limit is 0 and the upper
   * one {@code -ln((1 - confidence) / 2)}, 3.689 at 95 %.
   *
   * @param events observed count, from 0 to 1,000,000,000
   * @param confidence two-sided confidence, at least 0.5 and below 1
   * @return limits in events
   * @throws IllegalArgumentException if the count is out of range or the confidence is
   */
  public static Limits garwood(long events, double confidence) {
    EventCount.require("events", events);
    double tail = Confidence.tail(confidence);
    double lower =
        events == 0 ? 0 : GammaDistribution.of(events, 1).inverseCumulativeProbability(tail);
    double upper = GammaDistribution.of(events + 1.0, 1).inverseSurvivalProbability(tail);
    return new Limits(lower, upper);
  }

  /** Events per unit of exposure; empty when there is no exposure. */
  public OptionalDouble value() {
    return exposure > 0 ? OptionalDouble.of(events / exposure) : OptionalDouble.empty();
  }

  /**
   * Exact limits of the rate.
   *
   * @param confidence two-sided confidence, at least 0.5 and below 1
   * @return limits per unit of exposure; empty when there is no exposure
   * @throws IllegalArgumentException if the confidence is out of range
   */
  public Optional<Limits> limits(double confidence) {
    Limits count = garwood(events, confidence);
    return exposure > 0 ? Optional.of(count.dividedBy(exposure)) : Optional.empty();
  }
}
