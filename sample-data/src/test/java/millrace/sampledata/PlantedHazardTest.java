package millrace.sampledata;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import millrace.sampledata.course.Cell;
import millrace.sampledata.course.Chart;
import millrace.sampledata.course.RiskTally;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.CareUnit;
import millrace.sampledata.scenario.DrugClass;
import millrace.sampledata.scenario.Planted;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The injuries that happen are those the planted hazards ask for. */
final class PlantedHazardTest {
  private static final double BOUND = 4;
  private static final RiskTally TALLY = new RiskTally();
  private static List<Chart> charts = List.of();

  @BeforeAll
  static void make() {
    charts = Charts.of(20310401, 30_000, TALLY);
  }

  @Test
  void injuriesOfEveryUnitMatchTheIntegratedHazard() {
    for (CareUnit unit : CareUnit.values()) {
      Cell all = new Cell();
      for (int month = 0; month < Calendar.MONTHS; month++) {
        all.add(TALLY.unitMonth(unit, month));
      }
      assertNear(unit.id(), all);
    }
  }

  @Test
  void injuriesOfEveryExposureMatchTheIntegratedHazard() {
    for (int subject = 0; subject < RiskTally.SUBJECTS; subject++) {
      assertNear("subject " + subject, sum(subject, true));
      assertNear("subject " + subject + " unexposed", sum(subject, false));
    }
  }

  @Test
  void everySecondIsInEveryTable() {
    Cell strata = new Cell();
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      strata.add(TALLY.stratum(stratum));
    }
    for (int subject = 0; subject < RiskTally.SUBJECTS; subject++) {
      Cell both = sum(subject, true);
      both.add(sum(subject, false));
      assertEquals(strata.seconds(), both.seconds());
      assertEquals(strata.injuries(), both.injuries());
    }
    long counted =
        charts.stream()
            .flatMap(chart -> chart.injuries().stream())
            .filter(note -> note.counted())
            .count();
    assertEquals(counted, strata.injuries());
  }

  @Test
  void stratifiedRatiosComeNearThePlantedOnes() {
    assertEquals(2.5, stratified(DrugClass.AMINOGLYCOSIDE), 0.25);
    assertEquals(1.5, stratified(DrugClass.NSAID), 0.12);
    assertEquals(1.0, stratified(DrugClass.CONTRAST), 0.08);
    assertEquals(1.0, stratified(DrugClass.PROTON_PUMP_INHIBITOR), 0.08);
  }

  @Test
  void loopDiureticIsBlamedByTheCrudeRatioAndClearedByTheStratifiedOne() {
    Cell exposed = sum(DrugClass.LOOP_DIURETIC.ordinal(), true);
    Cell other = sum(DrugClass.LOOP_DIURETIC.ordinal(), false);
    double crude = exposed.expected() / exposed.days() / (other.expected() / other.days());
    assertTrue(crude > 1.4, "crude " + crude);
    assertEquals(1.0, stratified(DrugClass.LOOP_DIURETIC), 0.08);
  }

  @Test
  void hazardOfOneUnitRises() {
    int rising = Calendar.monthOf(Planted.risingFromSeconds());
    assertEquals(16, rising);
    Cell before = new Cell();
    Cell after = new Cell();
    for (int month = 0; month < Calendar.MONTHS; month++) {
      (month < rising ? before : after).add(TALLY.unitMonth(Planted.RISING_UNIT, month));
    }
    assertEquals(2.2, after.expected() / after.days() / (before.expected() / before.days()), 0.25);
  }

  @Property(tries = 5)
  void injuriesOfAnySeedMatchTheIntegratedHazard(@ForAll long seed) {
    RiskTally tally = new RiskTally();
    Charts.of(seed, 3_000, tally);
    Cell all = new Cell();
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      all.add(tally.stratum(stratum));
    }
    assertTrue(all.expected() > 40, "expected " + all.expected());
    assertEquals(all.expected(), all.injuries(), 6 * Math.sqrt(all.expected()));
  }

  private static void assertNear(String what, Cell cell) {
    double slack = BOUND * Math.sqrt(Math.max(4, cell.expected()));
    assertEquals(cell.expected(), cell.injuries(), slack, what);
  }

  private static Cell sum(int subject, boolean exposed) {
    Cell all = new Cell();
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      all.add(TALLY.subject(subject, stratum, exposed));
    }
    return all;
  }

  private static double stratified(DrugClass drugClass) {
    double above = 0;
    double below = 0;
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      Cell exposed = TALLY.subject(drugClass.ordinal(), stratum, true);
      Cell other = TALLY.subject(drugClass.ordinal(), stratum, false);
      double days = exposed.days() + other.days();
      above += days > 0 ? exposed.expected() * other.days() / days : 0;
      below += days > 0 ? other.expected() * exposed.days() / days : 0;
    }
    return above / below;
  }
}
