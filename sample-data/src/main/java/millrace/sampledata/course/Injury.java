package millrace.sampledata.course;

import millrace.sampledata.scenario.Chance;

/**
 * An injury of the kidneys, as the factor by which it multiplies the usual creatinine.
 *
 * @param origin {@code hospital} or {@code community}
 * @param injuredAt instant from which the creatinine is over the threshold, seconds since the epoch
 * @param crossing factor at that instant
 * @param peak highest factor
 * @param peakAt instant of the peak
 * @param halfLifeSeconds time in which what is above the usual value halves after the peak
 * @param residual factor that remains
 * @param where unit and exposures at the injury
 */
public record Injury(
    String origin,
    long injuredAt,
    double crossing,
    double peak,
    long peakAt,
    double halfLifeSeconds,
    double residual,
    Stretch where) {
  /** Origin in hospital. */
  public static final String HOSPITAL = "hospital";

  /** Origin before or within 48 h of admission. */
  public static final String COMMUNITY = "community";

  private static final double DAY = 86_400;

  /** Draws the size and the course of a hospital-onset injury. */
  static Injury inHospital(
      Chance chance, long injuredAt, double baselineMgDl, boolean testedDaily, Stretch where) {
    double draw = chance.uniform();
    boolean smallRise = draw < 0.22 && testedDaily && baselineMgDl > 0.65;
    double crossing = smallRise ? 1 + 0.40 / baselineMgDl : 1.62;
    double peak =
        draw < 0.6
            ? chance.within(1.66, 1.9)
            : draw < 0.84 ? chance.within(2.1, 2.85) : chance.within(3.15, 6.0);
    if (smallRise) {
      peak = crossing + chance.within(0.02, 0.12);
    }
    long peakAt = injuredAt + (long) (DAY * chance.within(0.5, peak > 2 ? 3.0 : 1.5));
    return new Injury(
        HOSPITAL,
        injuredAt,
        crossing,
        Math.max(crossing, peak),
        peakAt,
        DAY * chance.within(0.7, 2.4),
        chance.within(0.98, 1.08),
        where);
  }

  /** Draws an injury that is there at admission, rising, or seen only while it falls. */
  static Injury beforeHospital(Chance chance, long admittedAt, Stretch where) {
    boolean falling = chance.happens(0.45);
    double peak = chance.happens(0.55) ? chance.within(1.75, 2.0) : chance.within(2.1, 4.5);
    long injuredAt =
        falling
            ? admittedAt - (long) (DAY * chance.within(1.5, 3.0))
            : admittedAt + (long) (DAY * chance.within(-0.6, 0.6));
    long peakAt =
        falling ? admittedAt - 8 * 3600 : injuredAt + (long) (DAY * chance.within(0.3, 1.0));
    return new Injury(
        COMMUNITY,
        injuredAt,
        1.62,
        peak,
        peakAt,
        DAY * chance.within(0.6, 1.6),
        chance.within(0.98, 1.08),
        where);
  }

  /** The factor at an instant. */
  double factorAt(long at) {
    if (at < injuredAt) {
      return 1;
    }
    if (at < peakAt) {
      return crossing + (peak - crossing) * (at - injuredAt) / (peakAt - injuredAt);
    }
    return residual
        + (peak - residual) * StrictMath.exp(-0.6931471805599453 * (at - peakAt) / halfLifeSeconds);
  }

  /**
   * Stage by the true peak.
   *
   * @return 1, 2 or 3
   */
  public int stage() {
    return peak >= 3 ? 3 : peak >= 2 ? 2 : 1;
  }
}
