package millrace.etl.record;

/** What a row of administrations stands for. The words are those of the extract contract. */
public enum DoseBasis implements Word {
  /** administered. */
  ADMINISTERED("administered"),
  /** ordered. */
  ORDERED("ordered");

  private final String word;

  DoseBasis(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
