package millrace.etl.record;

/** State of a laboratory result. The words are those of the extract contract. */
public enum ResultStatus implements Word {
  /** final. */
  FINAL("final"),
  /** corrected. */
  CORRECTED("corrected"),
  /** preliminary. */
  PRELIMINARY("preliminary"),
  /** cancelled. */
  CANCELLED("cancelled");

  private final String word;

  ResultStatus(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
