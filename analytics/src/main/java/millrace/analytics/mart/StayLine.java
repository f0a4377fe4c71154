package millrace.analytics.mart;

import java.time.Instant;
import java.util.Optional;

/**
 * A unit stay of such a patient, whole.
 *
 * @param patientId identifier in the extract
 * @param admissionId admission
 * @param unitId unit
 * @param enteredAt start
 * @param leftAt end
 * @param file source file
 * @param line source line
 */
public record StayLine(
    String patientId,
    String admissionId,
    String unitId,
    Instant enteredAt,
    Optional<Instant> leftAt,
    String file,
    long line) {}
