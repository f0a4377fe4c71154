package millrace.analytics.rates;

import java.util.OptionalDouble;
import millrace.analytics.mart.ClassPressureRow;

/**
 * The four cells of a drug class and recent hypotension, and the relative excess risk due to
 * interaction: the rate ratio of both, less that of each alone, plus one (methods 8; Rothman 1986).
 */
public final class ClassPressure {
  private ClassPressure() {}

  /**
   * The row of a class.
   *
   * @param wholeWithout all time without recent hypotension
   * @param wholeWith all time with it
   * @param exposedWithout exposed time without it
   * @param exposedWith exposed time with it
   */
  public static ClassPressureRow row(
      String drugClass,
      RiskSum wholeWithout,
      RiskSum wholeWith,
      RiskSum exposedWithout,
      RiskSum exposedWith) {
    RiskSum neither = wholeWithout.minus(exposedWithout);
    RiskSum pressure = wholeWith.minus(exposedWith);
    return new ClassPressureRow(
        drugClass,
        neither.seconds(),
        neither.episodes(),
        exposedWithout.seconds(),
        exposedWithout.episodes(),
        pressure.seconds(),
        pressure.episodes(),
        exposedWith.seconds(),
        exposedWith.episodes(),
        excess(neither, exposedWithout, pressure, exposedWith));
  }

  private static OptionalDouble excess(
      RiskSum neither, RiskSum drug, RiskSum pressure, RiskSum both) {
    boolean noTime =
        neither.seconds() <= 0
            || drug.seconds() <= 0
            || pressure.seconds() <= 0
            || both.seconds() <= 0;
    if (noTime || neither.episodes() == 0) {
      return OptionalDouble.empty();
    }
    double base = rate(neither);
    return OptionalDouble.of((rate(both) - rate(drug) - rate(pressure)) / base + 1);
  }

  private static double rate(RiskSum sum) {
    return sum.episodes() / sum.days();
  }
}
