package millrace.sampledata.scenario;

import java.time.YearMonth;

/** The effects planted in the invented hospital, and the hazard they make together. */
public final class Planted {
  /** Ratio of the hazard in the 48 h after a spell of low pressure (and in it) to other time. */
  public static final double PRESSURE_RATIO = 2.5;

  /** How long a spell acts after its end. */
  public static final long PRESSURE_WINDOW_SECONDS = 48 * 3600L;

  /** Further ratio when vancomycin and piperacillin-tazobactam expose at once. */
  public static final double PAIR_RATIO = 2.0;

  /** The unit whose hazard rises. */
  public static final CareUnit RISING_UNIT = CareUnit.MED_2;

  /** First month of the risen hazard. */
  public static final YearMonth RISING_FROM = YearMonth.of(2030, 8);

  /** Ratio of the risen hazard to the earlier one. */
  public static final double RISING_RATIO = 2.2;

  private static final DrugClass[] CLASSES = DrugClass.values();
  private static final long RISING_FROM_SECONDS = Calendar.startOf(RISING_FROM.atDay(1));
  private static final int PAIR =
      bit(DrugClass.VANCOMYCIN) | bit(DrugClass.PIPERACILLIN_TAZOBACTAM);

  private Planted() {}

  /**
   * The bit of a class in a mask of exposures.
   *
   * @param drugClass the class
   * @return a mask with one bit set
   */
  public static int bit(DrugClass drugClass) {
    return 1 << drugClass.ordinal();
  }

  /**
   * The instant from which the hazard of the rising unit is raised.
   *
   * @return seconds since the epoch
   */
  public static long risingFromSeconds() {
    return RISING_FROM_SECONDS;
  }

  /**
   * The planted hazard.
   *
   * @param unit unit occupied
   * @param exposures mask of the classes that expose
   * @param recentLowPressure whether a spell of low pressure acts
   * @param atSeconds the instant, for the rising unit
   * @return expected injuries per second at risk
   */
  public static double hazardPerSecond(
      CareUnit unit, int exposures, boolean recentLowPressure, long atSeconds) {
    double perThousandDays = unit.hazardPerThousandDays();
    if (unit == RISING_UNIT && atSeconds >= RISING_FROM_SECONDS) {
      perThousandDays *= RISING_RATIO;
    }
    if (recentLowPressure) {
      perThousandDays *= PRESSURE_RATIO;
    }
    for (int rest = exposures; rest != 0; rest &= rest - 1) {
      perThousandDays *= CLASSES[Integer.numberOfTrailingZeros(rest)].rateRatio();
    }
    if ((exposures & PAIR) == PAIR) {
      perThousandDays *= PAIR_RATIO;
    }
    return perThousandDays / (1000.0 * 86_400.0);
  }
}
