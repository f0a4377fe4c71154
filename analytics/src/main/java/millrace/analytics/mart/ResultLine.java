package millrace.analytics.mart;

import java.time.Instant;
import java.util.Optional;

/**
 * A creatinine result of a patient with an episode or gradual rise.
 *
 * @param patientId identifier in the extract
 * @param collectedAt collection
 * @param resultedAt report
 * @param nanomolesPerLitre value
 * @param state used, masked (replacement washout) or superseded (another value at this instant)
 * @param admissionId admission it belongs to
 * @param setting inpatient, outpatient, emergency or unknown
 * @param file source file
 * @param line source line
 */
public record ResultLine(
    String patientId,
    Instant collectedAt,
    Optional<Instant> resultedAt,
    long nanomolesPerLitre,
    String state,
    Optional<String> admissionId,
    String setting,
    String file,
    long line) {}
