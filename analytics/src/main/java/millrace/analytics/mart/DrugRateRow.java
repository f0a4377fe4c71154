package millrace.analytics.mart;

import java.util.OptionalDouble;

/**
 * Exposed and unexposed incidence of one subject. Associations, not causes. Methods 7.
 *
 * @param level agent, class, burden or combination
 * @param subject its name
 * @param exposedSeconds time at risk while exposed
 * @param exposedEpisodes counted episodes with onset while exposed
 * @param unexposedSeconds all other time at risk
 * @param unexposedEpisodes all other counted episodes
 * @param rateRatio crude rate ratio
 * @param lower lower exact mid-P limit
 * @param upper upper exact mid-P limit
 * @param pMid two-sided mid-P value
 * @param mhRatio Mantel-Haenszel ratio over unit kind and recent hypotension
 * @param mhLower its lower limit (Greenland-Robins)
 * @param mhUpper its upper limit
 * @param q Benjamini-Hochberg value within the level
 */
public record DrugRateRow(
    String level,
    String subject,
    long exposedSeconds,
    long exposedEpisodes,
    long unexposedSeconds,
    long unexposedEpisodes,
    OptionalDouble rateRatio,
    OptionalDouble lower,
    OptionalDouble upper,
    OptionalDouble pMid,
    OptionalDouble mhRatio,
    OptionalDouble mhLower,
    OptionalDouble mhUpper,
    OptionalDouble q) {}
