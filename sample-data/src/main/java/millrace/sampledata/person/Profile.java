package millrace.sampledata.person;

/** Why an admission happens: decides its path through the units, its length and its drugs. */
public enum Profile {
  MEDICAL(4.6, 0.75),
  SURGICAL(3.9, 0.65),
  CRITICAL(9.0, 0.55),
  CANCER(5.2, 0.7),
  MATERNITY(2.4, 0.4),
  CHILD(2.3, 0.6),
  SHORT(0.8, 0.3);

  private final double medianDays;
  private final double spread;

  Profile(double medianDays, double spread) {
    this.medianDays = medianDays;
    this.spread = spread;
  }

  /**
   * Median length of stay.
   *
   * @return days
   */
  public double medianDays() {
    return medianDays;
  }

  /**
   * Standard deviation of the logarithm of the length of stay.
   *
   * @return the spread
   */
  public double spread() {
    return spread;
  }
}
