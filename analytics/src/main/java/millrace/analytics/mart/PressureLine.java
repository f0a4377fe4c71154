package millrace.analytics.mart;

import java.time.Instant;
import java.util.OptionalDouble;

/**
 * A blood pressure of such a patient.
 *
 * @param patientId identifier in the extract
 * @param measuredAt reading
 * @param systolic mmHg
 * @param diastolic mmHg
 * @param mean mmHg as recorded
 * @param map mmHg, recorded or estimated
 * @param method arterial-line, cuff or unknown
 * @param setAside not used (methods 8)
 * @param low below the floor
 * @param holdSeconds how long it stands; 0 when set aside
 * @param file source file
 * @param line source line
 */
public record PressureLine(
    String patientId,
    Instant measuredAt,
    OptionalDouble systolic,
    OptionalDouble diastolic,
    OptionalDouble mean,
    OptionalDouble map,
    String method,
    boolean setAside,
    boolean low,
    long holdSeconds,
    String file,
    long line) {}
