package millrace.analytics.mart;

import java.util.OptionalDouble;

/**
 * The four cells of one drug class and recent hypotension. Methods 8.
 *
 * @param drugClass class of the watchlist
 * @param neitherSeconds time at risk with neither
 * @param neitherEpisodes counted episodes with neither
 * @param drugSeconds time at risk with the drug alone
 * @param drugEpisodes counted episodes with the drug alone
 * @param pressureSeconds time at risk after low pressure alone
 * @param pressureEpisodes counted episodes after low pressure alone
 * @param bothSeconds time at risk with both
 * @param bothEpisodes counted episodes with both
 * @param relativeExcessRisk relative excess risk due to interaction; empty when a rate of neither
 *     is zero or a cell has no time
 */
public record ClassPressureRow(
    String drugClass,
    long neitherSeconds,
    long neitherEpisodes,
    long drugSeconds,
    long drugEpisodes,
    long pressureSeconds,
    long pressureEpisodes,
    long bothSeconds,
    long bothEpisodes,
    OptionalDouble relativeExcessRisk) {}
