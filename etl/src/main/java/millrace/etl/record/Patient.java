package millrace.etl.record;

import java.time.LocalDate;

/**
 * A patient.
 *
 * @param patientId identifier in the extract
 * @param sex sex
 * @param birthDate date of birth; mid-period when only the month or year is known
 * @param diedAt death, or {@link Seconds#ABSENT}
 * @param source where the row stands
 */
public record Patient(
    String patientId, Sex sex, LocalDate birthDate, long diedAt, SourceLine source) {}
