package millrace.analytics.policy;

/**
 * Settings of episodes. Methods 5.
 *
 * @param reversalSeconds quiet time that closes
 * @param lapseSeconds end of what no result closes
 * @param replacementReferenceSeconds where an episode opened by a replacement finds its reference
 * @param hospitalOnsetSeconds hospital origin from admission plus this
 * @param transientSeconds longest transient episode
 * @param prolongedSeconds longest episode that is not prolonged
 * @param replacementAtDischargeSeconds a replacement that ended this long before discharge is still
 *     on
 * @param heightReachSeconds reach of a height either side
 * @param egfrFloor mL/min/1.73 m2; stage 3 below it under 18
 */
public record EpisodePolicy(
    long reversalSeconds,
    long lapseSeconds,
    long replacementReferenceSeconds,
    long hospitalOnsetSeconds,
    long transientSeconds,
    long prolongedSeconds,
    long replacementAtDischargeSeconds,
    long heightReachSeconds,
    int egfrFloor)
    implements java.io.Serializable {
  static EpisodePolicy of(Settings s) {
    return new EpisodePolicy(
        s.seconds("reversal"),
        s.seconds("lapse"),
        s.seconds("replacement_reference"),
        s.seconds("hospital_onset"),
        s.seconds("transient"),
        s.seconds("prolonged"),
        s.seconds("replacement_at_discharge"),
        s.seconds("height_reach"),
        s.whole("egfr_floor"));
  }
}
