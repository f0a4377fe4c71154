package millrace.analytics.pressure;

import java.math.BigInteger;
import java.util.List;
import java.util.OptionalLong;
import millrace.analytics.policy.PressurePolicy;
import millrace.etl.record.BloodPressure;

/**
 * Measures of the window before an onset, by the holds clipped to it (methods 8).
 *
 * @param observedSeconds time covered by readings
 * @param lowSeconds time under the floor
 * @param lowestMapThirdsNanoMmHg lowest mean, in thirds of a billionth of a mmHg; empty for none
 * @param areaThirdsNanoMmHgSeconds area under the floor, in the same unit times seconds
 * @param spells counting spells that meet the window
 */
public record PressureMeasures(
    long observedSeconds,
    long lowSeconds,
    OptionalLong lowestMapThirdsNanoMmHg,
    BigInteger areaThirdsNanoMmHgSeconds,
    int spells) {
  private static final double THIRDS_NANO = 3.0 * BloodPressure.NANOS;

  /** The measures before an onset. */
  public static PressureMeasures before(long onset, PressureSeries series, PressurePolicy policy) {
    long from = onset - policy.windowSeconds();
    long floor = 3 * policy.mapFloorMmHg() * BloodPressure.NANOS;
    long observed = 0;
    long low = 0;
    long lowest = Long.MAX_VALUE;
    BigInteger area = BigInteger.ZERO;
    List<Reading> readings = series.readings();
    for (int i = firstReaching(readings, from);
        i < readings.size() && readings.get(i).from() < onset;
        i++) {
      Reading reading = readings.get(i);
      long seconds = Math.min(reading.to(), onset) - Math.max(reading.from(), from);
      if (seconds > 0) {
        observed += seconds;
        low += reading.low() ? seconds : 0;
        if (reading.pressure().hasMap()) {
          long map = reading.pressure().mapThirdsNanoMmHg();
          lowest = Math.min(lowest, map);
          if (map < floor) {
            area = area.add(BigInteger.valueOf(floor - map).multiply(BigInteger.valueOf(seconds)));
          }
        }
      }
    }
    int spells = 0;
    for (Spell spell : series.spells()) {
      spells += spell.from() < onset && spell.to() > from ? 1 : 0;
    }
    return new PressureMeasures(
        observed,
        low,
        lowest == Long.MAX_VALUE ? OptionalLong.empty() : OptionalLong.of(lowest),
        area,
        spells);
  }

  /** Area under the floor in mmHg times minutes. */
  public double areaMmHgMinutes() {
    return areaThirdsNanoMmHgSeconds.doubleValue() / THIRDS_NANO / 60;
  }

  /**
   * Depth under the floor in mmHg, averaged over the observed time; 0 when nothing was observed.
   */
  public double timeWeightedDepthMmHg() {
    return observedSeconds == 0
        ? 0
        : areaThirdsNanoMmHgSeconds.doubleValue() / THIRDS_NANO / observedSeconds;
  }

  /** A mean in thirds of a billionth of a mmHg as mmHg. */
  public static double mmHg(long thirdsNanoMmHg) {
    return thirdsNanoMmHg / THIRDS_NANO;
  }

  private static int firstReaching(List<Reading> readings, long from) {
    int low = 0;
    int high = readings.size();
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (readings.get(middle).to() <= from) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }
}
