package millrace.sampledata.course;

/**
 * A blood pressure, in mmHg; 0 stands for a field not charted.
 *
 * @param at seconds since the epoch
 * @param systolic systolic pressure
 * @param diastolic diastolic pressure
 * @param mean mean pressure as charted
 * @param method word of the extract
 * @param admissionId admission
 */
public record Reading(
    long at, int systolic, int diastolic, int mean, String method, String admissionId) {
  private static final int FLOOR = 65;

  /**
   * Whether the mean arterial pressure is below 65 mmHg, or, where none can be had, the systolic
   * below 90.
   *
   * @return true when low
   */
  public boolean low() {
    if (mean > 0) {
      return mean < FLOOR;
    }
    return diastolic > 0 ? 2 * diastolic + systolic < 3 * FLOOR : systolic < 90;
  }
}
