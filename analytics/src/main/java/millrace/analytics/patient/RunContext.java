package millrace.analytics.patient;

import java.io.Serializable;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import millrace.analytics.exposure.Subjects;
import millrace.analytics.policy.Policy;
import millrace.analytics.timeline.Occupancy;
import millrace.etl.contract.Cover;
import millrace.etl.record.Unit;

/**
 * What the computation of a patient needs to know of the run.
 *
 * @param policy the policy
 * @param cover zone and dates
 * @param subjects watchlist and combinations
 * @param units units by id
 * @param files path of each file of the extract, by its index
 */
public record RunContext(
    Policy policy, Cover cover, Subjects subjects, Map<String, Unit> units, List<String> files)
    implements Serializable {
  /** Names of the units by number: every unit, then no unit and unassigned, sorted. */
  public List<String> unitNames() {
    TreeSet<String> names = new TreeSet<>(units.keySet());
    names.add(Occupancy.NOWHERE);
    names.add(Occupancy.UNASSIGNED);
    return new ArrayList<>(names);
  }

  /** Number of each unit name. */
  public Map<String, Integer> unitNumbers() {
    Map<String, Integer> numbers = new HashMap<>();
    for (String name : unitNames()) {
      numbers.put(name, numbers.size());
    }
    return numbers;
  }
}
