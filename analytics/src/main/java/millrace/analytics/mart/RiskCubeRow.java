package millrace.analytics.mart;

/**
 * Time at risk and counted episodes of one cell. Methods 6 to 8. A subject's rows hold its exposed
 * time; the rows of level all hold the whole.
 *
 * @param day local day, YYYY-MM-DD
 * @param unitId unit
 * @param attribution at-onset or day-before
 * @param level all, agent, class or combination
 * @param subject name within the level; empty for all
 * @param exposed false only for level all
 * @param recentHypotension within 48 h of a counting spell
 * @param burden 0, 1, 2 or 3+
 * @param atRiskSeconds time at risk
 * @param episodes counted episodes
 * @param stage2plus of which stage 2 or 3
 */
public record RiskCubeRow(
    String day,
    String unitId,
    String attribution,
    String level,
    String subject,
    boolean exposed,
    boolean recentHypotension,
    String burden,
    long atRiskSeconds,
    long episodes,
    long stage2plus) {}
