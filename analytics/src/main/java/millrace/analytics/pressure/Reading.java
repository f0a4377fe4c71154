package millrace.analytics.pressure;

import millrace.etl.record.BloodPressure;

/**
 * A pressure that is used, and how long it stands (methods 8).
 *
 * @param pressure the pressure
 * @param from reading
 * @param to end of its hold
 * @param admission number of the admission it belongs to, or none
 * @param low below the floor
 */
public record Reading(BloodPressure pressure, long from, long to, int admission, boolean low) {
  /** How long it stands, in seconds. */
  public long heldSeconds() {
    return to - from;
  }
}
