package millrace.analytics.pressure;

import java.util.ArrayList;
import java.util.List;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.PressureMethod;

/**
 * Which readings are used (methods 8): set aside are readings with neither mean nor systolic, then
 * cuff and unknown ones near an arterial line; at one instant the one with a mean stands, then the
 * lowest.
 *
 * @param arterialLineReachSeconds how near
 */
record UsedReadings(long arterialLineReachSeconds) {
  /** The used ones of readings in order of time, one per instant. */
  List<BloodPressure> of(List<BloodPressure> readings) {
    List<BloodPressure> usable = new ArrayList<>(readings.size());
    for (BloodPressure reading : readings) {
      if (reading.hasMap() || reading.systolicNanoMmHg() != BloodPressure.NONE) {
        usable.add(reading);
      }
    }
    List<BloodPressure> used = new ArrayList<>(usable.size());
    for (int i = 0; i < usable.size(); i++) {
      BloodPressure reading = usable.get(i);
      if (reading.method() == PressureMethod.ARTERIAL_LINE || !nearLine(usable, i)) {
        int last = used.size() - 1;
        if (last >= 0 && used.get(last).measuredAt() == reading.measuredAt()) {
          if (stands(reading, used.get(last))) {
            used.set(last, reading);
          }
        } else {
          used.add(reading);
        }
      }
    }
    return used;
  }

  private boolean nearLine(List<BloodPressure> usable, int at) {
    long instant = usable.get(at).measuredAt();
    for (int i = at - 1;
        i >= 0 && instant - usable.get(i).measuredAt() <= arterialLineReachSeconds;
        i--) {
      if (usable.get(i).method() == PressureMethod.ARTERIAL_LINE) {
        return true;
      }
    }
    for (int i = at + 1;
        i < usable.size() && usable.get(i).measuredAt() - instant <= arterialLineReachSeconds;
        i++) {
      if (usable.get(i).method() == PressureMethod.ARTERIAL_LINE) {
        return true;
      }
    }
    return false;
  }

  private static boolean stands(BloodPressure reading, BloodPressure other) {
    if (reading.hasMap() != other.hasMap()) {
      return reading.hasMap();
    }
    return reading.hasMap()
        ? reading.mapThirdsNanoMmHg() < other.mapThirdsNanoMmHg()
        : reading.systolicNanoMmHg() < other.systolicNanoMmHg();
  }
}
