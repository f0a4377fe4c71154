package millrace.analytics.pressure;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import millrace.analytics.policy.PressurePolicy;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.PatientTimeline;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.Unit;
import millrace.etl.record.UnitKind;

/**
 * Makes a patient's pressures a series: which are used, how long each stands, which are low
 * (methods 8).
 */
public final class PressureReader {
  private final PressurePolicy policy;
  private final Map<String, Unit> units;
  private final long mapFloorThirdsNano;
  private final long systolicFloorNano;

  /**
   * A reader.
   *
   * @param units units by id, for the kind of the unit at each reading
   */
  public PressureReader(PressurePolicy policy, Map<String, Unit> units) {
    this.policy = policy;
    this.units = units;
    this.mapFloorThirdsNano = 3 * policy.mapFloorMmHg() * BloodPressure.NANOS;
    this.systolicFloorNano = policy.systolicFloorMmHg() * BloodPressure.NANOS;
  }

  /** The series of a patient. */
  public PressureSeries read(PatientTimeline timeline) {
    List<BloodPressure> used =
        new UsedReadings(policy.arterialLineReachSeconds()).of(timeline.pressures());
    List<Reading> readings = new ArrayList<>(used.size());
    for (int i = 0; i < used.size(); i++) {
      BloodPressure pressure = used.get(i);
      long at = pressure.measuredAt();
      int admission = timeline.membership().belongsTo(at);
      long to = at + longestHold(timeline, at);
      if (i + 1 < used.size()) {
        to = Math.min(to, used.get(i + 1).measuredAt());
      }
      if (admission != Membership.NONE) {
        to = Math.min(to, timeline.membership().stretches().get(admission).to());
      }
      readings.add(new Reading(pressure, at, to, admission, isLow(pressure)));
    }
    return PressureSeries.of(readings, policy);
  }

  private long longestHold(PatientTimeline timeline, long at) {
    Unit unit = units.get(timeline.occupancy().unitAt(at));
    return unit != null && unit.kind() == UnitKind.CRITICAL_CARE
        ? policy.holdCriticalCareSeconds()
        : policy.holdElsewhereSeconds();
  }

  private boolean isLow(BloodPressure pressure) {
    return pressure.hasMap()
        ? pressure.mapThirdsNanoMmHg() < mapFloorThirdsNano
        : pressure.systolicNanoMmHg() < systolicFloorNano;
  }
}
