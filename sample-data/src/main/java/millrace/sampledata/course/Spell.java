package millrace.sampledata.course;

/**
 * A spell of low pressure that counts.
 *
 * @param startAt first low reading, seconds since the epoch
 * @param endAt end of the last one's hold, seconds since the epoch
 */
public record Spell(long startAt, long endAt) {}
