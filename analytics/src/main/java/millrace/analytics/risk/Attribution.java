package millrace.analytics.risk;

/** To which unit an instant at risk goes (methods 6). */
public enum Attribution {
  /** The unit occupied at the instant. */
  AT_ONSET("at-onset"),
  /** The unit occupied 24 h earlier. */
  DAY_BEFORE("day-before");

  private final String word;

  Attribution(String word) {
    this.word = word;
  }

  /** Its name in exports. */
  public String word() {
    return word;
  }
}
