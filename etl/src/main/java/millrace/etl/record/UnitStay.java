package millrace.etl.record;

/**
 * A stay in a unit, whole.
 *
 * @param admissionId admission
 * @param unitId unit
 * @param enteredAt start
 * @param leftAt end, cut to the end of cover; {@link Seconds#ABSENT} when not given
 * @param source where the row stands
 */
public record UnitStay(
    String admissionId, String unitId, long enteredAt, long leftAt, SourceLine source) {}
