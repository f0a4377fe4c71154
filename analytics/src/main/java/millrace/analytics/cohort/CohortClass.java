package millrace.analytics.cohort;

/** Classes of admissions, in the order in which the first that fits is taken (methods 6). */
public enum CohortClass {
  /** Younger than the least age at admission. */
  UNDER_AGE("under-age"),
  /** On maintenance dialysis. */
  MAINTENANCE_DIALYSIS("maintenance-dialysis"),
  /** With a transplanted kidney. */
  TRANSPLANT("transplant"),
  /** Too few results to judge; never the same as no injury. */
  NOT_ASSESSABLE("not-assessable"),
  /** Counted. */
  ELIGIBLE("eligible");

  private final String word;

  CohortClass(String word) {
    this.word = word;
  }

  /** Its name in exports. */
  public String word() {
    return word;
  }
}
