package millrace.etl.record;

/** How a blood pressure was taken. The words are those of the extract contract. */
public enum PressureMethod implements Word {
  /** arterial-line. */
  ARTERIAL_LINE("arterial-line"),
  /** cuff. */
  CUFF("cuff"),
  /** unknown. */
  UNKNOWN("unknown");

  private final String word;

  PressureMethod(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
