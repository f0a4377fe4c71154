package millrace.analytics.criteria;

import millrace.analytics.policy.CriteriaPolicy;

/** Criteria with windows of a few seconds. */
final class Policies {
  private Policies() {}

  static CriteriaPolicy criteria(long riseWindowSeconds, long ratioWindowSeconds) {
    return new CriteriaPolicy(3, riseWindowSeconds, ratioWindowSeconds, 40, 25, 4, 25);
  }
}
