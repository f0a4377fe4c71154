package millrace.analytics.baseline;

import millrace.etl.record.Sex;

/**
 * CKD-EPI 2021 creatinine equation without a race term, for adults: eGFR = 142 min(Scr/k,1)^a
 * max(Scr/k,1)^-1.200 0.9938^age 1.012 [female]; Scr in mg/dL, k 0.7 or 0.9, a -0.241 or -0.302
 * (Inker 2021, N Engl J Med 385:1737).
 */
public final class CkdEpi2021 {
  private static final double NANOMOLES_PER_MILLIGRAM_PER_DECILITRE = 88_400;
  private static final double ABOVE_KNOT = -1.2;
  private static final int OLDEST_YEARS = 120;
  private static final int READ_AS_YEARS = 90;

  private CkdEpi2021() {}

  /**
   * Estimated filtration rate.
   *
   * @param nanomolesPerLitre creatinine, above 0
   * @param ageYears completed years; above 120 is read as 90
   * @param sex sex; other and unknown use the male constants, which give the lower rate
   * @return mL/min/1.73 m2
   */
  public static double rate(double nanomolesPerLitre, int ageYears, Sex sex) {
    double ratio = nanomolesPerLitre / NANOMOLES_PER_MILLIGRAM_PER_DECILITRE / knot(sex);
    double power = ratio < 1 ? (sex == Sex.FEMALE ? -0.241 : -0.302) : ABOVE_KNOT;
    return scale(ageYears, sex) * Math.pow(ratio, power);
  }

  /** The creatinine in nmol/L, rounded, at which {@link #rate} gives that rate. */
  public static long creatinine(double rate, int ageYears, Sex sex) {
    double relative = rate / scale(ageYears, sex);
    double power = relative > 1 ? (sex == Sex.FEMALE ? -0.241 : -0.302) : ABOVE_KNOT;
    return Math.round(
        knot(sex) * Math.pow(relative, 1 / power) * NANOMOLES_PER_MILLIGRAM_PER_DECILITRE);
  }

  private static double knot(Sex sex) {
    return sex == Sex.FEMALE ? 0.7 : 0.9;
  }

  private static double scale(int ageYears, Sex sex) {
    int age = ageYears > OLDEST_YEARS ? READ_AS_YEARS : ageYears;
    return 142 * Math.pow(0.9938, age) * (sex == Sex.FEMALE ? 1.012 : 1);
  }
}
