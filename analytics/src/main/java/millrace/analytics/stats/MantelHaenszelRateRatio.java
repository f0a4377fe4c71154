package millrace.analytics.stats;

import java.util.Collection;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Rate ratio common to several strata, after Mantel and Haenszel, with limits from the variance of
 * Greenland and Robins.
 *
 * <p>With a and b events in exposed and unexposed time s and t of a stratum, and N = s + t: ratio R
 * / Q with R the sum of a t / N and Q the sum of b s / N; variance of its logarithm V / (R Q) with
 * V the sum of (a + b) s t / N squared. A stratum without any time contributes nothing.
 *
 * <p>Example: smoking and coronary deaths of British doctors in five age bands give 1.4247 (1.1547
 * to 1.7578), against a crude ratio of 1.7198 (Doll and Hill 1966).
 *
 * @param ratio R / Q; 0 when R is 0 and Q is not; empty when Q is 0, as nothing then bounds it
 * @param limits confidence limits of the ratio; empty when R or Q is 0, for then its logarithm has
 *     no variance
 * @see "Methods 7; Greenland and Robins, Biometrics 1985;41:55; Rothman and Greenland 1998, ch. 15"
 */
public record MantelHaenszelRateRatio(OptionalDouble ratio, Optional<Limits> limits) {
  /**
   * The ratio with 95 % limits.
   *
   * @param strata any number, none included
   */
  public static MantelHaenszelRateRatio of(Collection<PersonTimeTable> strata) {
    return of(strata, Confidence.NINETY_FIVE_PERCENT);
  }

  /**
   * The ratio with limits of a chosen confidence.
   *
   * @param strata any number, none included; summed in iteration order
   * @param confidence two-sided confidence, at least 0.5 and below 1
   * @throws IllegalArgumentException if the confidence is out of range
   */
  public static MantelHaenszelRateRatio of(Collection<PersonTimeTable> strata, double confidence) {
    double z = Confidence.normalQuantile(confidence);
    double numerator = 0;
    double denominator = 0;
    double variance = 0;
    for (PersonTimeTable stratum : strata) {
      double time = stratum.exposedTime() + stratum.unexposedTime();
      if (time > 0) {
        double exposedShare = stratum.exposedTime() / time;
        double unexposedShare = stratum.unexposedTime() / time;
        numerator += stratum.exposedEvents() * unexposedShare;
        denominator += stratum.unexposedEvents() * exposedShare;
        variance += events(stratum) * exposedShare * unexposedShare;
      }
    }
    if (denominator == 0) {
      return new MantelHaenszelRateRatio(OptionalDouble.empty(), Optional.empty());
    }
    double ratio = numerator / denominator;
    if (numerator == 0) {
      return new MantelHaenszelRateRatio(OptionalDouble.of(ratio), Optional.empty());
    }
    double factor = Math.exp(z * Math.sqrt(variance / (numerator * denominator)));
    return new MantelHaenszelRateRatio(
        OptionalDouble.of(ratio), Optional.of(new Limits(ratio / factor, ratio * factor)));
  }

  private static double events(PersonTimeTable stratum) {
    return (double) stratum.exposedEvents() + stratum.unexposedEvents();
  }
}
