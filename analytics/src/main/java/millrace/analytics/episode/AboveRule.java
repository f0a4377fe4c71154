package millrace.analytics.episode;

import java.util.OptionalLong;
import millrace.analytics.criteria.Ratios;
import millrace.analytics.policy.CriteriaPolicy;

/**
 * Whether a result is above an episode's reference: at least 1.5 times, or a rise of at least RISE;
 * without a reference every result is (methods 5).
 *
 * @param riseNanomolesPerLitre RISE
 */
public record AboveRule(long riseNanomolesPerLitre) {
  /** The rule of a policy. */
  public static AboveRule of(CriteriaPolicy policy) {
    return new AboveRule(policy.riseNanomolesPerLitre());
  }

  /** Whether {@code value} is above. */
  public boolean isAbove(long value, OptionalLong reference) {
    return reference.isEmpty()
        || Ratios.atLeastOneAndAHalf(value, reference.getAsLong())
        || value - reference.getAsLong() >= riseNanomolesPerLitre;
  }
}
