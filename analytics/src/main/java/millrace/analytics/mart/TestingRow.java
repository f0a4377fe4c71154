package millrace.analytics.mart;

/**
 * Testing intensity of one month and unit. Methods 6.
 *
 * @param month YYYY-MM in the extract's zone
 * @param unitId unit
 * @param occupiedSeconds time of all admissions in the unit
 * @param results creatinine results collected in it
 */
public record TestingRow(String month, String unitId, long occupiedSeconds, long results) {}
