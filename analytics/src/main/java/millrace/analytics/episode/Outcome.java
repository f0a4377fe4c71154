package millrace.analytics.episode;

/** How an episode stood at discharge (methods 5). */
public enum Outcome {
  /** The patient had died. */
  DIED("died"),
  /** A kidney replacement was still on. */
  ON_REPLACEMENT("on-replacement"),
  /** No result after onset. */
  UNKNOWN("unknown"),
  /** The last result was not above. */
  RECOVERED("recovered"),
  /** The last result was above, at a lower stage than the episode's. */
  PARTIAL("partial"),
  /** The last result was at the episode's stage. */
  NOT_RECOVERED("not-recovered");

  private final String word;

  Outcome(String word) {
    this.word = word;
  }

  /** Its name in exports. */
  public String word() {
    return word;
  }
}
