package millrace.analytics.mart;

import java.time.Instant;
import java.util.Optional;

/**
 * A rise of creatinine too slow for the seven-day window; never an episode. Methods 4.
 *
 * @param patientId identifier in the extract
 * @param admissionId admission the result belongs to
 * @param firstAt first such result of the admission
 * @param referenceNanomolesPerLitre baseline, else lowest earlier result of the admission
 * @param valueNanomolesPerLitre creatinine
 * @param cohortClass class of the admission
 * @param unitId unit at that instant
 */
public record GradualRiseRow(
    String patientId,
    String admissionId,
    Instant firstAt,
    long referenceNanomolesPerLitre,
    long valueNanomolesPerLitre,
    String cohortClass,
    Optional<String> unitId) {}
