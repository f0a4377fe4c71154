package millrace.analytics.mart;

import java.util.OptionalDouble;

/**
 * Incidence of counted episodes in one month and unit. Methods 6.
 *
 * @param month YYYY-MM in the extract's zone
 * @param unitId unit
 * @param attribution at-onset or day-before
 * @param atRiskSeconds time at risk
 * @param episodes counted episodes
 * @param stage2plus of which stage 2 or 3
 * @param rate per 1,000 patient-days at risk; empty without time
 * @param lower lower 95 % limit (Garwood)
 * @param upper upper 95 % limit (Garwood)
 */
public record UnitRateRow(
    String month,
    String unitId,
    String attribution,
    long atRiskSeconds,
    long episodes,
    long stage2plus,
    OptionalDouble rate,
    OptionalDouble lower,
    OptionalDouble upper) {}
