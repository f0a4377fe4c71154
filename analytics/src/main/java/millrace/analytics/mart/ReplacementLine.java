package millrace.analytics.mart;

import java.time.Instant;
import java.util.Optional;

/**
 * A kidney replacement of such a patient.
 *
 * @param patientId identifier in the extract
 * @param startedAt start
 * @param endedAt end as recorded
 * @param modality intermittent, continuous, peritoneal or unknown
 * @param purpose acute, maintenance or unknown
 * @param maskedUntil end of the washout
 * @param file source file
 * @param line source line
 */
public record ReplacementLine(
    String patientId,
    Instant startedAt,
    Optional<Instant> endedAt,
    String modality,
    String purpose,
    Instant maskedUntil,
    String file,
    long line) {}
