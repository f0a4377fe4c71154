package millrace.etl.record;

/** Kind of a unit. The words are those of the extract contract. */
public enum UnitKind implements Word {
  /** critical-care. */
  CRITICAL_CARE("critical-care"),
  /** step-down. */
  STEP_DOWN("step-down"),
  /** medical. */
  MEDICAL("medical"),
  /** surgical. */
  SURGICAL("surgical"),
  /** oncology. */
  ONCOLOGY("oncology"),
  /** obstetric. */
  OBSTETRIC("obstetric"),
  /** paediatric. */
  PAEDIATRIC("paediatric"),
  /** emergency. */
  EMERGENCY("emergency"),
  /** other. */
  OTHER("other");

  private final String word;

  UnitKind(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
