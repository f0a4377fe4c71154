package millrace.sampledata.scenario;

/** Kinds of units, with the word the extract uses. */
public enum UnitKind {
  /** Intensive care. */
  CRITICAL_CARE("critical-care", 15, 58),
  /** Between intensive care and a ward. */
  STEP_DOWN("step-down", 90, 180),
  /** Medical ward. */
  MEDICAL("medical", 240, 480),
  /** Surgical ward. */
  SURGICAL("surgical", 240, 480),
  /** Cancer ward. */
  ONCOLOGY("oncology", 240, 480),
  /** Maternity. */
  OBSTETRIC("obstetric", 300, 480),
  /** Children's ward. */
  PAEDIATRIC("paediatric", 300, 480),
  /** Emergency department. */
  EMERGENCY("emergency", 60, 150),
  /** Theatres, rehabilitation and the rest. */
  OTHER("other", 240, 480);

  private final String word;
  private final int shortestReadingMinutes;
  private final int longestReadingMinutes;

  UnitKind(String word, int shortestReadingMinutes, int longestReadingMinutes) {
    this.word = word;
    this.shortestReadingMinutes = shortestReadingMinutes;
    this.longestReadingMinutes = longestReadingMinutes;
  }

  /**
   * The word of the extract.
   *
   * @return for instance {@code critical-care}
   */
  public String word() {
    return word;
  }

  /**
   * Shortest time between two routine pressures.
   *
   * @return minutes
   */
  public int shortestReadingMinutes() {
    return shortestReadingMinutes;
  }

  /**
   * Longest time between two routine pressures.
   *
   * @return minutes
   */
  public int longestReadingMinutes() {
    return longestReadingMinutes;
  }

  /**
   * How long a pressure is taken to hold when no other follows.
   *
   * @return seconds: 15 minutes in critical care, 60 elsewhere
   */
  public long holdSeconds() {
    return this == CRITICAL_CARE ? 900 : 3600;
  }
}
