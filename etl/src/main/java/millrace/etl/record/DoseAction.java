package millrace.etl.record;

/** What was done with a dose. The words are those of the extract contract. */
public enum DoseAction implements Word {
  /** given. */
  GIVEN("given"),
  /** held. */
  HELD("held"),
  /** refused. */
  REFUSED("refused"),
  /** stopped. */
  STOPPED("stopped"),
  /** entered-in-error. */
  ENTERED_IN_ERROR("entered-in-error");

  private final String word;

  DoseAction(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
