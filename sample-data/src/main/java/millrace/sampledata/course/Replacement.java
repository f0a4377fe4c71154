package millrace.sampledata.course;

/**
 * A kidney replacement.
 *
 * @param startedAt seconds since the epoch
 * @param endedAt seconds since the epoch, 0 when the end was not charted
 * @param modality word of the extract
 * @param purpose word of the extract
 * @param admissionId admission, empty outside
 */
public record Replacement(
    long startedAt, long endedAt, String modality, String purpose, String admissionId) {}
