package millrace.sampledata.person;

/** The state of a patient's kidneys before anything happens in hospital. */
public enum Kidneys {
  /** Within the usual range for age and sex. */
  ORDINARY,
  /** Chronically reduced, stable. */
  REDUCED,
  /** On maintenance dialysis, three sessions a week. */
  MAINTENANCE_HAEMODIALYSIS,
  /** On maintenance dialysis through the peritoneum, every night. */
  MAINTENANCE_PERITONEAL,
  /** With a transplanted kidney. */
  TRANSPLANT;

  /**
   * Whether the patient is on maintenance dialysis of either kind.
   *
   * @return true for both kinds
   */
  public boolean onMaintenance() {
    return this == MAINTENANCE_HAEMODIALYSIS || this == MAINTENANCE_PERITONEAL;
  }
}
