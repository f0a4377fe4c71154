package millrace.analytics.policy;

/**
 * Settings of the baseline. Methods 3.
 *
 * @param method how it is found
 * @param fromSeconds start of the outpatient window before admission
 * @param untilSeconds its end before admission
 * @param lowestValueReachSeconds reach of lowest-first-week
 */
public record BaselinePolicy(
    BaselineMethod method, long fromSeconds, long untilSeconds, long lowestValueReachSeconds)
    implements java.io.Serializable {
  static BaselinePolicy of(Settings s) {
    return new BaselinePolicy(
        BaselineMethod.of(s.oneOf("baseline", BaselineMethod.allWords())),
        s.seconds("baseline_from"),
        s.seconds("baseline_until"),
        s.seconds("lowest_value_reach"));
  }
}
