package millrace.sampledata.course;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import millrace.sampledata.scenario.CareUnit;
import millrace.sampledata.scenario.Chance;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.LongRange;

/** The course of an injury. */
final class InjuryTest {
  private static final long START = 1_890_000_000L;
  private static final Stretch WHERE = new Stretch(CareUnit.MED_1, 0, 0, false);

  @Property
  void crossesTheThresholdAtOnceRisesToItsPeakAndFades(
      @ForAll long seed, @ForAll @DoubleRange(min = 0.5, max = 2.5) double baselineMgDl) {
    Injury injury = Injury.inHospital(Chance.of(seed, 0), START, baselineMgDl, true, WHERE);
    assertEquals(1, injury.factorAt(START - 1));
    double first = injury.factorAt(START);
    assertTrue(first >= 1.5 || (first - 1) * baselineMgDl >= 0.3, "first " + first);
    assertEquals(injury.peak(), injury.factorAt(injury.peakAt()), 1e-9);
    assertTrue(injury.factorAt(injury.peakAt() + 40 * 86_400) < 1.1);
  }

  @Property
  void neverExceedsItsPeak(
      @ForAll long seed, @ForAll @LongRange(min = -500_000, max = 3_000_000) long later) {
    Injury injury = Injury.beforeHospital(Chance.of(seed, 1), START, WHERE);
    assertTrue(injury.factorAt(START + later) <= injury.peak() + 1e-9);
  }

  @Property
  void stageFollowsThePeak(@ForAll long seed) {
    Injury injury = Injury.inHospital(Chance.of(seed, 2), START, 1.0, false, WHERE);
    assertEquals(injury.peak() < 2 ? 1 : injury.peak() < 3 ? 2 : 3, injury.stage());
  }
}
