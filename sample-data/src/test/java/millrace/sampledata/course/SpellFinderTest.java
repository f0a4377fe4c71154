package millrace.sampledata.course;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Profile;
import millrace.sampledata.person.Stay;
import millrace.sampledata.scenario.CareUnit;
import org.junit.jupiter.api.Test;

/** Spells of low pressure at their edges. */
final class SpellFinderTest {
  private static final long START = 1_890_000_000L;
  private static final long MINUTE = 60;
  private static final int LOW = 60;
  private static final int USUAL = 80;

  private final List<Reading> readings = new ArrayList<>();

  @Test
  void oneLowReadingOnAWardHoldsAnHour() {
    read(0, USUAL, 300, LOW, 700, USUAL);
    assertSpells(CareUnit.MED_1, 300, 360);
  }

  @Test
  void lowReadingInCriticalCareHoldsFifteenMinutes() {
    read(0, USUAL, 30, LOW, 60, USUAL);
    assertSpells(CareUnit.ICU, 30, 45);
  }

  @Test
  void nineMinutesAreTooFewAndTenEnough() {
    read(0, LOW, 9, USUAL);
    assertSpells(CareUnit.ICU);
    readings.clear();
    read(0, LOW, 10, USUAL);
    assertSpells(CareUnit.ICU, 0, 10);
  }

  @Test
  void lowReadingsInARowAreOneSpell() {
    read(0, LOW, 40, LOW, 200, LOW, 230, USUAL);
    assertSpells(CareUnit.MED_1, 0, 230);
  }

  @Test
  void moreThanFourUnobservedHoursEndASpell() {
    read(0, LOW, 300, LOW);
    assertSpells(CareUnit.MED_1, 0, 360);
    readings.clear();
    read(0, LOW, 301, LOW);
    assertSpells(CareUnit.MED_1, 0, 60, 301, 361);
  }

  @Test
  void holdEndsAtDischarge() {
    read(1430, LOW);
    assertSpells(CareUnit.MED_1, 1430, 1440);
  }

  @Test
  void meanArterialPressureIsTakenFromTheFieldsWhenItIsNotCharted() {
    assertEquals(false, new Reading(START, 95, 50, 0, "cuff", "A").low());
    assertEquals(true, new Reading(START, 94, 50, 0, "cuff", "A").low());
    assertEquals(true, new Reading(START, 120, 80, 64, "cuff", "A").low());
    assertEquals(true, new Reading(START, 89, 0, 0, "cuff", "A").low());
    assertEquals(false, new Reading(START, 90, 0, 0, "cuff", "A").low());
  }

  private void read(int... minutesAndMeans) {
    for (int index = 0; index < minutesAndMeans.length; index += 2) {
      long at = START + minutesAndMeans[index] * MINUTE;
      readings.add(new Reading(at, 0, 0, minutesAndMeans[index + 1], "cuff", "A"));
    }
  }

  private void assertSpells(CareUnit unit, int... minutes) {
    long end = START + 1440 * MINUTE;
    Admission admission =
        new Admission("A", Profile.MEDICAL, START, end, false, List.of(new Stay(unit, START, end)));
    List<Spell> expected = new ArrayList<>();
    for (int index = 0; index < minutes.length; index += 2) {
      expected.add(new Spell(START + minutes[index] * MINUTE, START + minutes[index + 1] * MINUTE));
    }
    assertEquals(expected, SpellFinder.find(admission, readings));
  }
}
