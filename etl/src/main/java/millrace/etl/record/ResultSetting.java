package millrace.etl.record;

/** Where a specimen was taken. The words are those of the extract contract. */
public enum ResultSetting implements Word {
  /** inpatient. */
  INPATIENT("inpatient"),
  /** outpatient. */
  OUTPATIENT("outpatient"),
  /** emergency. */
  EMERGENCY("emergency"),
  /** unknown. */
  UNKNOWN("unknown");

  private final String word;

  ResultSetting(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
