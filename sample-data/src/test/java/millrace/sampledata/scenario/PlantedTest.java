package millrace.sampledata.scenario;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** How planted effects multiply. */
final class PlantedTest {
  private static final double PER_SECOND = 1 / (1000.0 * 86_400.0);

  @Test
  void unitAloneHasItsOwnHazard() {
    assertHazard(6.0, CareUnit.MED_1, 0, false, Calendar.FROM);
  }

  @Test
  void effectsMultiply() {
    int exposures = Planted.bit(DrugClass.AMINOGLYCOSIDE) | Planted.bit(DrugClass.NSAID);
    assertHazard(6.0 * 2.5 * 1.5 * 2.5, CareUnit.MED_1, exposures, true, Calendar.FROM);
  }

  @Test
  void pairHasAnEffectBeyondItsMembers() {
    int piperacillin = Planted.bit(DrugClass.PIPERACILLIN_TAZOBACTAM);
    assertHazard(5.5, CareUnit.SURG_1, piperacillin, false, Calendar.FROM);
    int pair = piperacillin | Planted.bit(DrugClass.VANCOMYCIN);
    assertHazard(5.5 * 1.7 * 2.0, CareUnit.SURG_1, pair, false, Calendar.FROM);
  }

  @Test
  void onlyOneUnitRisesAndFromItsMonth() {
    long from = Planted.risingFromSeconds();
    assertHazard(6.5, CareUnit.MED_2, 0, false, from - 1);
    assertHazard(6.5 * 2.2, CareUnit.MED_2, 0, false, from);
    assertHazard(6.0, CareUnit.MED_1, 0, false, from);
  }

  private static void assertHazard(
      double perThousandDays, CareUnit unit, int exposures, boolean low, long at) {
    assertEquals(
        perThousandDays, Planted.hazardPerSecond(unit, exposures, low, at) / PER_SECOND, 1e-9);
  }
}
