package millrace.sampledata.person;

import millrace.sampledata.scenario.CareUnit;

/**
 * A stay in a unit, the half-open time from entering to leaving.
 *
 * @param unit the unit
 * @param enteredAt seconds since the epoch
 * @param leftAt seconds since the epoch
 */
public record Stay(CareUnit unit, long enteredAt, long leftAt) {}
