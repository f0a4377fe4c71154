package millrace.analytics.policy;

import java.util.List;

/**
 * Settings of low blood pressure. Methods 8.
 *
 * @param mapFloorMmHg a mean pressure below it is low
 * @param systolicFloorMmHg without a mean, a systolic below it is low
 * @param arterialLineReachSeconds a cuff reading this near to an arterial line is set aside
 * @param holdCriticalCareSeconds longest hold in critical care
 * @param holdElsewhereSeconds longest hold elsewhere
 * @param spellGapSeconds a longer unobserved gap ends a spell
 * @param spellLeastSeconds held time from which a spell counts
 * @param windowSeconds window of the measures before onset
 * @param recentSeconds how long after a counting spell
 * @param vasopressors ATC codes
 */
public record PressurePolicy(
    int mapFloorMmHg,
    int systolicFloorMmHg,
    long arterialLineReachSeconds,
    long holdCriticalCareSeconds,
    long holdElsewhereSeconds,
    long spellGapSeconds,
    long spellLeastSeconds,
    long windowSeconds,
    long recentSeconds,
    List<String> vasopressors)
    implements java.io.Serializable {
  static PressurePolicy of(Settings s) {
    return new PressurePolicy(
        s.whole("map_floor"),
        s.whole("systolic_floor"),
        s.seconds("arterial_line_reach"),
        s.seconds("hold", "critical-care"),
        s.seconds("hold", "elsewhere"),
        s.seconds("spell_gap"),
        s.seconds("spell_least"),
        s.seconds("pressure_window"),
        s.seconds("recent_hypotension"),
        s.texts("vasopressors"));
  }
}
