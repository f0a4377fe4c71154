package millrace.sampledata.course;

import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.person.Admission;

/**
 * Finds spells of low pressure in the readings as charted, so that the planted effect follows what
 * is on paper.
 */
final class SpellFinder {
  private static final long LONGEST_GAP_SECONDS = 4 * 3600;
  private static final long SHORTEST_HELD_SECONDS = 600;

  private SpellFinder() {}

  /**
   * The spells of at least 10 held minutes among the readings of one admission, in order of time.
   */
  static List<Spell> find(Admission admission, List<Reading> readings) {
    List<Spell> spells = new ArrayList<>();
    long startAt = -1;
    long endAt = -1;
    long heldSeconds = 0;
    for (int index = 0; index < readings.size(); index++) {
      Reading reading = readings.get(index);
      boolean gap = startAt >= 0 && reading.at() - endAt > LONGEST_GAP_SECONDS;
      if (startAt >= 0 && (gap || !reading.low())) {
        keep(spells, startAt, endAt, heldSeconds);
        startAt = -1;
      }
      if (reading.low()) {
        if (startAt < 0) {
          startAt = reading.at();
          heldSeconds = 0;
        }
        long nextAt = index + 1 < readings.size() ? readings.get(index + 1).at() : Long.MAX_VALUE;
        long holdSeconds = admission.unitAt(reading.at()).kind().holdSeconds();
        endAt = Math.min(Math.min(nextAt, reading.at() + holdSeconds), admission.dischargedAt());
        heldSeconds += endAt - reading.at();
      }
    }
    if (startAt >= 0) {
      keep(spells, startAt, endAt, heldSeconds);
    }
    return spells;
  }

  private static void keep(List<Spell> spells, long startAt, long endAt, long heldSeconds) {
    if (heldSeconds >= SHORTEST_HELD_SECONDS) {
      spells.add(new Spell(startAt, endAt));
    }
  }
}
