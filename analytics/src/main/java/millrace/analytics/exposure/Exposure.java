package millrace.analytics.exposure;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import millrace.analytics.timeline.IntervalSet;
import millrace.etl.record.Administration;
import millrace.etl.record.DoseBasis;

/**
 * The exposed time of one patient: for each agent, class and combination the union over the doses,
 * and the burden (methods 7). The same sets make numerator and denominator, so that no time is
 * immortal.
 */
public final class Exposure {
  /** The highest burden that is told apart: three or more. */
  public static final int HIGHEST_BURDEN = 3;

  private final List<WatchedDose> doses;
  private final Map<Integer, IntervalSet> sets;
  private final List<IntervalSet> burdenSets;

  private Exposure(
      List<WatchedDose> doses, Map<Integer, IntervalSet> sets, List<IntervalSet> burdenSets) {
    this.doses = doses;
    this.sets = sets;
    this.burdenSets = burdenSets;
  }

  /** The exposure of a patient's kept administrations. */
  public static Exposure of(
      List<Administration> administrations, Subjects subjects, boolean countOrdered) {
    List<WatchedDose> doses = new ArrayList<>();
    for (Administration dose : administrations) {
      if (!dose.atc().isEmpty() && (countOrdered || dose.basis() == DoseBasis.ADMINISTERED)) {
        for (WatchedDrug drug : subjects.watchlist().exposing(dose.atc(), dose.route())) {
          doses.add(new WatchedDose(dose, drug));
        }
      }
    }
    if (doses.isEmpty()) {
      return new Exposure(List.of(), Map.of(), List.of());
    }
    Map<String, List<IntervalSet.Interval>> byAgent = new TreeMap<>();
    Map<String, List<IntervalSet.Interval>> byClass = new TreeMap<>();
    Map<String, List<IntervalSet.Interval>> burden = new TreeMap<>();
    for (WatchedDose dose : doses) {
      add(byAgent, dose.drug().agent(), dose);
      add(byClass, dose.drug().drugClass(), dose);
      if (dose.drug().burden()) {
        add(burden, dose.drug().agent(), dose);
      }
    }
    Map<Integer, IntervalSet> sets = new TreeMap<>();
    byAgent.forEach(
        (name, i) -> put(sets, subjects.number(Subjects.Level.AGENT, name), IntervalSet.union(i)));
    byClass.forEach(
        (name, i) -> put(sets, subjects.number(Subjects.Level.CLASS, name), IntervalSet.union(i)));
    for (Combination combination : subjects.combinations()) {
      put(
          sets,
          subjects.number(Subjects.Level.COMBINATION, combination.name()),
          together(combination, byAgent, byClass));
    }
    return new Exposure(
        doses,
        sets,
        burden.values().stream().map(IntervalSet::union).filter(s -> !s.isEmpty()).toList());
  }

  /** Exposed time by number of subject; subjects that never expose are not in it. */
  public Map<Integer, IntervalSet> sets() {
    return sets;
  }

  /** Doses that expose, in order of start. */
  public List<WatchedDose> doses() {
    return doses;
  }

  /**
   * How many distinct agents marked for the burden expose at an instant, at most {@link
   * #HIGHEST_BURDEN}.
   */
  public int burdenAt(long instant) {
    int agents = 0;
    for (IntervalSet set : burdenSets) {
      agents += set.contains(instant) ? 1 : 0;
    }
    return Math.min(agents, HIGHEST_BURDEN);
  }

  /** The exposed time of each agent that counts towards the burden. */
  public List<IntervalSet> burdenSets() {
    return burdenSets;
  }

  /** The burden as exports write it: 0, 1, 2 or 3+. */
  public static String burdenWord(int burden) {
    return burden == HIGHEST_BURDEN ? "3+" : Integer.toString(burden);
  }

  private static void add(
      Map<String, List<IntervalSet.Interval>> sets, String name, WatchedDose dose) {
    sets.computeIfAbsent(name, n -> new ArrayList<>()).add(dose.exposed());
  }

  private static void put(Map<Integer, IntervalSet> sets, int subject, IntervalSet set) {
    if (!set.isEmpty()) {
      sets.put(subject, set);
    }
  }

  private static IntervalSet together(
      Combination combination,
      Map<String, List<IntervalSet.Interval>> byAgent,
      Map<String, List<IntervalSet.Interval>> byClass) {
    IntervalSet all = null;
    for (String member : combination.members()) {
      List<IntervalSet.Interval> own = new ArrayList<>(byClass.getOrDefault(member, List.of()));
      own.addAll(byAgent.getOrDefault(member, List.of()));
      IntervalSet set = IntervalSet.union(own);
      all = all == null ? set : all.intersect(set);
      if (all.isEmpty()) {
        return IntervalSet.EMPTY;
      }
    }
    return all == null ? IntervalSet.EMPTY : all;
  }
}
