package millrace.etl.record;

/**
 * A coded condition.
 *
 * @param admissionId admission; empty when not given
 * @param code code without point and blanks, in capitals
 * @param codeSystem code system
 * @param recordedAt record, or {@link Seconds#ABSENT}
 */
public record Condition(
    String admissionId, String code, ConditionCodeSystem codeSystem, long recordedAt) {}
