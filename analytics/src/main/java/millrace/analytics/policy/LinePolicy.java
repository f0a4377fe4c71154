package millrace.analytics.policy;

/**
 * Settings of the patient's line. Methods 2.
 *
 * @param replacementWashoutSeconds masked after a replacement
 * @param arrivalWindowSeconds reach of an admission before its start
 */
public record LinePolicy(long replacementWashoutSeconds, long arrivalWindowSeconds)
    implements java.io.Serializable {
  static LinePolicy of(Settings s) {
    return new LinePolicy(s.seconds("replacement_washout"), s.seconds("arrival_window"));
  }
}
