package millrace.analytics.stats;

/**
 * Events and person-time with and without an exposure: one comparison, or one stratum of it.
 *
 * @param exposedEvents events while exposed, from 0 to 1,000,000,000
 * @param exposedTime person-time exposed, in any unit: 0, or from 1e-100 to 1e100
 * @param unexposedEvents events in all other time, in the same range
 * @param unexposedTime all other person-time, in the unit and range of the other
 */
public record PersonTimeTable(
    long exposedEvents, double exposedTime, long unexposedEvents, double unexposedTime) {
  /**
   * Checks counts and times.
   *
   * @throws IllegalArgumentException if a count or a time is out of range
   */
  public PersonTimeTable {
    EventCount.require("exposed events", exposedEvents);
    PersonTime.require("exposed time", exposedTime);
    EventCount.require("unexposed events", unexposedEvents);
    PersonTime.require("unexposed time", unexposedTime);
  }

  /** Exposed and unexposed change places. */
  public PersonTimeTable swapped() {
    return new PersonTimeTable(unexposedEvents, unexposedTime, exposedEvents, exposedTime);
  }

  /** Whether a ratio can be looked for at all: time on both sides and at least one event. */
  boolean compares() {
    return exposedTime > 0 && unexposedTime > 0 && (exposedEvents > 0 || unexposedEvents > 0);
  }
}
