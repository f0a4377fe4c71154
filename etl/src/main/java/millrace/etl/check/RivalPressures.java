package millrace.etl.check;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import millrace.etl.record.BloodPressure;

/**
 * Of two pressures of one patient, instant and method the one with the lower mean stands, then the
 * one with the lower systolic, then the earlier row (extract contract, duplicates). One without a
 * mean gives way to one that has it.
 */
final class RivalPressures {
  private static final Comparator<BloodPressure> BY_INSTANT_AND_RANK =
      Comparator.comparingLong(BloodPressure::measuredAt)
          .thenComparing(BloodPressure::method)
          .thenComparingLong(p -> p.hasMap() ? p.mapThirdsNanoMmHg() : Long.MAX_VALUE)
          .thenComparingLong(
              p ->
                  p.systolicNanoMmHg() == BloodPressure.NONE
                      ? Long.MAX_VALUE
                      : p.systolicNanoMmHg())
          .thenComparing(BloodPressure::source);

  private RivalPressures() {}

  /** The pressures that stand, by instant and method. */
  static List<BloodPressure> standing(List<BloodPressure> readings) {
    List<BloodPressure> sorted = new ArrayList<>(readings);
    sorted.sort(BY_INSTANT_AND_RANK);
    List<BloodPressure> standing = new ArrayList<>(sorted.size());
    BloodPressure last = null;
    for (BloodPressure reading : sorted) {
      if (last == null
          || last.measuredAt() != reading.measuredAt()
          || last.method() != reading.method()) {
        standing.add(reading);
        last = reading;
      }
    }
    return standing;
  }
}
