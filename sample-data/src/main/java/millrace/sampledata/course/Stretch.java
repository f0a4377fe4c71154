package millrace.sampledata.course;

import millrace.sampledata.scenario.CareUnit;

/**
 * Where a patient is, and under what, during a time in which nothing changes.
 *
 * @param unit unit occupied
 * @param month number of the month, see {@link millrace.sampledata.scenario.Calendar#monthOf}
 * @param exposures mask of exposing drug classes
 * @param recentLowPressure whether a spell of low pressure acts
 */
public record Stretch(CareUnit unit, int month, int exposures, boolean recentLowPressure) {}
