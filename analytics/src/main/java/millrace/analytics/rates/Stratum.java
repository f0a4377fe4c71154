package millrace.analytics.rates;

/**
 * A stratum of the Mantel–Haenszel ratio (methods 7).
 *
 * @param unitKind kind of the unit at onset; unassigned is other
 * @param recentHypotension recent hypotension
 * @param month calendar month, or empty when the policy does not ask for it
 */
public record Stratum(String unitKind, boolean recentHypotension, String month) {}
