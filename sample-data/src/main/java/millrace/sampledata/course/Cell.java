package millrace.sampledata.course;

/** A running sum of time at risk, expected injuries and injuries. */
public final class Cell {
  private long seconds;
  private double expected;
  private long injuries;

  void add(long moreSeconds, double moreExpected, long moreInjuries) {
    seconds += moreSeconds;
    expected += moreExpected;
    injuries += moreInjuries;
  }

  /**
   * Adds another sum.
   *
   * @param other the other sum
   */
  public void add(Cell other) {
    add(other.seconds, other.expected, other.injuries);
  }

  /**
   * Time at risk.
   *
   * @return seconds
   */
  public long seconds() {
    return seconds;
  }

  /**
   * Time at risk.
   *
   * @return patient-days
   */
  public double days() {
    return seconds / 86_400.0;
  }

  /**
   * Injuries expected from the planted hazard.
   *
   * @return the integral of the hazard over the time at risk
   */
  public double expected() {
    return expected;
  }

  /**
   * Injuries that happened.
   *
   * @return their number
   */
  public long injuries() {
    return injuries;
  }
}
