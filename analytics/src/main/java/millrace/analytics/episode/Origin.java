package millrace.analytics.episode;

/** Where an episode began (methods 5). */
public enum Origin {
  /** Before admission + 48 h. */
  COMMUNITY("community"),
  /** From admission + 48 h. */
  HOSPITAL("hospital"),
  /** In no admission. */
  OUTSIDE("outside");

  private final String word;

  Origin(String word) {
    this.word = word;
  }

  /** Its name in exports. */
  public String word() {
    return word;
  }
}
