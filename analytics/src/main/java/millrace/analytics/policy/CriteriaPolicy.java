package millrace.analytics.policy;

/**
 * Settings of the criteria. Methods 1, 4.
 *
 * @param riseNanomolesPerLitre rise that is evidence
 * @param riseWindowSeconds window of RISE_48H
 * @param ratioWindowSeconds window of RATIO_7D
 * @param ceilingNanomolesPerLitre stage 3 from this value inside an episode
 * @param baselineReachSeconds reach of RATIO_BASELINE after admission
 * @param fallArrivalSeconds reach of the first result for FALL_7D
 * @param fallWindowSeconds how far FALL_7D looks forward
 */
public record CriteriaPolicy(
    long riseNanomolesPerLitre,
    long riseWindowSeconds,
    long ratioWindowSeconds,
    long ceilingNanomolesPerLitre,
    long baselineReachSeconds,
    long fallArrivalSeconds,
    long fallWindowSeconds)
    implements java.io.Serializable {
  static CriteriaPolicy of(Settings s) {
    return new CriteriaPolicy(
        s.whole("rise"),
        s.seconds("rise_window"),
        s.seconds("ratio_window"),
        s.whole("ceiling"),
        s.seconds("baseline_reach"),
        s.seconds("fall_arrival"),
        s.seconds("fall_window"));
  }
}
