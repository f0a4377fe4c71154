package millrace.etl.record;

/**
 * A measured height.
 *
 * @param measuredAt measurement
 * @param microCentimetres height in millionths of a centimetre
 */
public record BodyHeight(long measuredAt, long microCentimetres) {}
