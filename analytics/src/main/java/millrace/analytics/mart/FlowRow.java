package millrace.analytics.mart;

/**
 * Admissions of one cohort class. Methods 6.
 *
 * @param cohortClass one of the five classes
 * @param admissions number
 */
public record FlowRow(String cohortClass, long admissions) {}
