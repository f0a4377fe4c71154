package millrace.etl.record;

/**
 * A valid creatinine result in serum, plasma or blood.
 *
 * @param collectedAt collection
 * @param resultedAt report, or {@link Seconds#ABSENT}
 * @param nanomolesPerLitre value, exact (methods 1)
 * @param setting where the specimen was taken
 * @param admissionId admission as the extract writes it; empty when not given. Information only:
 *     membership is by time
 * @param source where the row stands
 */
public record CreatinineResult(
    long collectedAt,
    long resultedAt,
    long nanomolesPerLitre,
    ResultSetting setting,
    String admissionId,
    SourceLine source) {}
