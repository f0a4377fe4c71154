package millrace.analytics.rates;

import java.util.OptionalDouble;
import millrace.analytics.stats.Limits;
import millrace.analytics.stats.PoissonRate;

/**
 * Episodes per 1,000 patient-days at risk with Garwood limits; all empty without time at risk
 * (methods 6, 12).
 *
 * @param rate per 1,000 patient-days
 * @param lower lower 95 % limit
 * @param upper upper 95 % limit
 */
public record Incidence(OptionalDouble rate, OptionalDouble lower, OptionalDouble upper) {
  private static final double CONFIDENCE = 0.95;
  private static final double PER = 1_000;

  /** The incidence of a sum. */
  public static Incidence of(RiskSum sum) {
    if (sum.seconds() <= 0) {
      return new Incidence(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());
    }
    Limits limits = PoissonRate.garwood(sum.episodes(), CONFIDENCE);
    double thousands = sum.days() / PER;
    return new Incidence(
        OptionalDouble.of(sum.episodes() / thousands),
        OptionalDouble.of(limits.lower() / thousands),
        OptionalDouble.of(limits.upper() / thousands));
  }
}
