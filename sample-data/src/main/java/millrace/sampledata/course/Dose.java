package millrace.sampledata.course;

import millrace.sampledata.scenario.Drug;

/**
 * A charted dose.
 *
 * @param startedAt seconds since the epoch
 * @param endedAt seconds since the epoch, 0 without an end
 * @param drug the drug
 * @param action word of the extract, {@code given} when it was
 * @param ordered whether the row is an order and no administration
 * @param pump whether it is charted by a pump with local codes
 * @param admissionId admission
 */
public record Dose(
    long startedAt,
    long endedAt,
    Drug drug,
    String action,
    boolean ordered,
    boolean pump,
    String admissionId) {

  /**
   * Whether the dose exposes the patient.
   *
   * @return true when administered and given
   */
  public boolean exposes() {
    return !ordered && action.equals("given");
  }
}
