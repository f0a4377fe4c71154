package millrace.analytics.pressure;

import java.util.ArrayList;
import java.util.List;
import millrace.analytics.policy.PressurePolicy;
import millrace.analytics.timeline.IntervalSet;

/**
 * A patient's used readings and counting spells (methods 8).
 *
 * @param readings used readings in order
 * @param spells counting spells in order
 * @param recent instants of recent hypotension
 */
public record PressureSeries(List<Reading> readings, List<Spell> spells, IntervalSet recent) {
  static PressureSeries of(List<Reading> readings, PressurePolicy policy) {
    List<Spell> spells = spells(readings, policy);
    List<IntervalSet.Interval> recent = new ArrayList<>();
    for (Spell spell : spells) {
      recent.add(new IntervalSet.Interval(spell.from(), spell.to() + policy.recentSeconds()));
    }
    return new PressureSeries(readings, spells, IntervalSet.union(recent));
  }

  private static List<Spell> spells(List<Reading> readings, PressurePolicy policy) {
    List<Spell> spells = new ArrayList<>();
    int from = 0;
    while (from < readings.size()) {
      Reading first = readings.get(from);
      int to = from + 1;
      if (first.low() && first.admission() >= 0) {
        long held = first.heldSeconds();
        while (to < readings.size() && continues(readings.get(to - 1), readings.get(to), policy)) {
          held += readings.get(to).heldSeconds();
          to++;
        }
        if (held >= policy.spellLeastSeconds()) {
          spells.add(new Spell(first.from(), readings.get(to - 1).to()));
        }
      }
      from = to;
    }
    return spells;
  }

  private static boolean continues(Reading last, Reading next, PressurePolicy policy) {
    return next.low()
        && next.admission() == last.admission()
        && next.from() - last.to() <= policy.spellGapSeconds();
  }
}
