package millrace.analytics.mart;

import java.util.OptionalDouble;

/**
 * Incidence of one unit with or without recent hypotension. Methods 8.
 *
 * @param unitId unit at onset
 * @param recentHypotension stratum
 * @param atRiskSeconds time at risk
 * @param episodes counted episodes
 * @param rate per 1,000 patient-days at risk
 * @param lower lower 95 % limit (Garwood)
 * @param upper upper 95 % limit (Garwood)
 */
public record UnitPressureRow(
    String unitId,
    boolean recentHypotension,
    long atRiskSeconds,
    long episodes,
    OptionalDouble rate,
    OptionalDouble lower,
    OptionalDouble upper) {}
