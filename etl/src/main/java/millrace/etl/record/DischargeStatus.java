package millrace.etl.record;

/** How an admission ended. The words are those of the extract contract. */
public enum DischargeStatus implements Word {
  /** home. */
  HOME("home"),
  /** transfer. */
  TRANSFER("transfer"),
  /** died. */
  DIED("died"),
  /** other. */
  OTHER("other");

  private final String word;

  DischargeStatus(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
