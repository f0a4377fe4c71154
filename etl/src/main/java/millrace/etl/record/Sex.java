package millrace.etl.record;

/** Sex of a patient as the extract words it. The words are those of the extract contract. */
public enum Sex implements Word {
  /** female. */
  FEMALE("female"),
  /** male. */
  MALE("male"),
  /** other. */
  OTHER("other"),
  /** unknown. */
  UNKNOWN("unknown");

  private final String word;

  Sex(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
