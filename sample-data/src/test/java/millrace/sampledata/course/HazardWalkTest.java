package millrace.sampledata.course;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalLong;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Profile;
import millrace.sampledata.person.Stay;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.CareUnit;
import millrace.sampledata.scenario.Drug;
import millrace.sampledata.scenario.DrugClass;
import millrace.sampledata.scenario.Planted;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;

/** The walk along the time at risk. */
final class HazardWalkTest {
  private static final long DAY = 86_400;
  private static final long HOUR = 3600;
  private static final long START = Calendar.FROM + 10 * DAY;
  private static final long END = START + 20 * DAY;
  private static final double PER_DAY = CareUnit.MED_1.hazardPerThousandDays() / 1000;

  private final Exposures exposures = new Exposures();
  private final RiskTally tally = new RiskTally();

  @Test
  void withoutExposuresTheInjuryComesWhenTheHazardHasAddedUp() {
    OptionalLong injuredAt = walk(List.of(), START, END, 5 * PER_DAY);
    assertEquals(START + 5 * DAY, injuredAt.getAsLong(), 1);
    Cell cell = tally.unitMonth(CareUnit.MED_1, 0);
    assertEquals(5 * DAY, cell.seconds(), 1);
    assertEquals(5 * PER_DAY, cell.expected(), 1e-6);
    assertEquals(1, cell.injuries());
  }

  @Test
  void thresholdBeyondTheTimeAtRiskInjuresNobody() {
    assertTrue(walk(List.of(), START, END, 21 * PER_DAY).isEmpty());
    assertEquals(20 * DAY, tally.stratum(CareUnit.MED_1.kind().ordinal() * 2).seconds());
  }

  @Test
  void noTimeAtRiskNoInjury() {
    assertTrue(walk(List.of(), START, START, 1e-12).isEmpty());
  }

  @Test
  void doseExposesFromLagToLookBack() {
    exposures.add(new Dose(START, 0, Drug.GENTAMICIN, "given", false, false, "A"));
    int bit = Planted.bit(DrugClass.AMINOGLYCOSIDE);
    assertEquals(0, exposures.maskAt(START + DAY - 1));
    assertEquals(bit, exposures.maskAt(START + DAY));
    assertEquals(bit, exposures.maskAt(START + 14 * DAY - 1));
    assertEquals(0, exposures.maskAt(START + 14 * DAY));
    walk(List.of(), START, END, 9);
    assertEquals(13 * DAY, exposedSeconds(DrugClass.AMINOGLYCOSIDE));
  }

  @Test
  void heldDosesOrdersAndUnwatchedDrugsExposeNobody() {
    exposures.add(new Dose(START, 0, Drug.GENTAMICIN, "held", false, false, "A"));
    exposures.add(new Dose(START, 0, Drug.GENTAMICIN, "given", true, false, "A"));
    exposures.add(new Dose(START, 0, Drug.TOBRAMYCIN_INHALED, "given", false, false, "A"));
    assertEquals(0, exposures.maskAt(START + 2 * DAY));
  }

  @Test
  void spellActsUntilTwoDaysAfterItsEnd() {
    walk(List.of(new Spell(START + DAY, START + DAY + HOUR)), START, END, 9);
    int kind = CareUnit.MED_1.kind().ordinal();
    assertEquals(2 * DAY + HOUR, tally.stratum(kind * 2 + 1).seconds());
    assertEquals(
        (2 * DAY + HOUR) * 2.5 * PER_DAY / DAY, tally.stratum(kind * 2 + 1).expected(), 1e-9);
  }

  @Property
  void integralUpToTheInjuryIsTheThreshold(
      @ForAll @DoubleRange(min = 0.001, max = 0.1) @Scale(4) double threshold) {
    RiskTally own = new RiskTally();
    exposures.add(new Dose(START + DAY, 0, Drug.IBUPROFEN, "given", false, false, "A"));
    List<Spell> spells = List.of(new Spell(START + 3 * DAY, START + 3 * DAY + HOUR));
    OptionalLong injuredAt =
        new HazardWalk(admission(), exposures, spells, own).walk(START, END, threshold);
    Cell sum = new Cell();
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      sum.add(own.stratum(stratum));
    }
    if (injuredAt.isPresent()) {
      assertEquals(threshold, sum.expected(), 1e-5);
      assertEquals(injuredAt.getAsLong() - START, sum.seconds());
    } else {
      assertTrue(sum.expected() < threshold);
      assertEquals(END - START, sum.seconds());
    }
  }

  private OptionalLong walk(List<Spell> spells, long from, long to, double threshold) {
    return new HazardWalk(admission(), exposures, spells, tally).walk(from, to, threshold);
  }

  private static Admission admission() {
    return new Admission(
        "A", Profile.MEDICAL, START, END, false, List.of(new Stay(CareUnit.MED_1, START, END)));
  }

  private long exposedSeconds(DrugClass drugClass) {
    long seconds = 0;
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      seconds += tally.subject(drugClass.ordinal(), stratum, true).seconds();
    }
    return seconds;
  }
}
