package millrace.etl.record;

/**
 * A kidney replacement.
 *
 * @param startedAt start
 * @param endedAt end, cut to the end of cover; {@link Seconds#ABSENT} when not given
 * @param modality modality
 * @param purpose purpose
 * @param source where the row stands
 */
public record KidneyReplacement(
    long startedAt,
    long endedAt,
    Modality modality,
    ReplacementPurpose purpose,
    SourceLine source) {}
