package millrace.analytics.mart;

/**
 * Creatinine measured while a drug exposes an admitted patient. Methods 7.
 *
 * @param level agent or class
 * @param subject its name
 * @param exposedDays exposed patient-days (local calendar days in hospital)
 * @param monitoredDays of which with a creatinine result within 24 h of noon
 */
public record MonitoringRow(String level, String subject, long exposedDays, long monitoredDays) {}
