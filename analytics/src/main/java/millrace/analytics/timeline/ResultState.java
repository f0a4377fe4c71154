package millrace.analytics.timeline;

/** What became of a creatinine result on the patient's line (methods 2). */
public enum ResultState {
  /** On the line. */
  USED("used"),
  /** Collected during a kidney replacement or its washout. */
  MASKED("masked"),
  /** Another value at this instant stands. */
  SUPERSEDED("superseded");

  private final String word;

  ResultState(String word) {
    this.word = word;
  }

  /** Its name on screen and in the mart. */
  public String word() {
    return word;
  }
}
