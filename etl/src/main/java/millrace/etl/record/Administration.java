package millrace.etl.record;

/**
 * A dose given, or ordered.
 *
 * @param drug code as the extract writes it
 * @param atc ATC code; empty when the drug is not mapped
 * @param drugName name; may be empty
 * @param route route
 * @param startedAt start
 * @param endedAt end, cut to the end of cover; {@link Seconds#ABSENT} when not given
 * @param dose dose and its unit as text; may be empty
 * @param basis administered or ordered
 * @param admissionId admission as the extract writes it; empty when not given. Information only:
 *     membership is by time
 * @param source where the row stands
 */
public record Administration(
    String drug,
    String atc,
    String drugName,
    Route route,
    long startedAt,
    long endedAt,
    String dose,
    DoseBasis basis,
    String admissionId,
    SourceLine source) {}
