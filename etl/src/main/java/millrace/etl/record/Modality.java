package millrace.etl.record;

/** Modality of a kidney replacement. The words are those of the extract contract. */
public enum Modality implements Word {
  /** intermittent. */
  INTERMITTENT("intermittent"),
  /** continuous. */
  CONTINUOUS("continuous"),
  /** peritoneal. */
  PERITONEAL("peritoneal"),
  /** unknown. */
  UNKNOWN("unknown");

  private final String word;

  Modality(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
