package millrace.etl.record;

/** Purpose of a kidney replacement. The words are those of the extract contract. */
public enum ReplacementPurpose implements Word {
  /** acute. */
  ACUTE("acute"),
  /** maintenance. */
  MAINTENANCE("maintenance"),
  /** unknown. */
  UNKNOWN("unknown");

  private final String word;

  ReplacementPurpose(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
