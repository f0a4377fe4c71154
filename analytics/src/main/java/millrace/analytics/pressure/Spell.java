package millrace.analytics.pressure;

/**
 * A run of consecutive low readings of one admission that counts (methods 8).
 *
 * @param from its first reading
 * @param to end of the hold of its last
 */
public record Spell(long from, long to) {}
