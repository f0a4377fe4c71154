package millrace.sampledata.course;

/**
 * A laboratory result.
 *
 * @param collectedAt seconds since the epoch
 * @param resultedAt seconds since the epoch, 0 when not known
 * @param analyte what was measured
 * @param analyser where
 * @param value in the last printed digit: hundredths of mg/dL or whole umol/L for creatinine,
 *     tenths for potassium
 * @param setting word of the extract, may be empty
 * @param admissionId admission, empty outside
 */
public record LabResult(
    long collectedAt,
    long resultedAt,
    Analyte analyte,
    Analyser analyser,
    int value,
    String setting,
    String admissionId) {}
