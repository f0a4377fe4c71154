package millrace.sampledata.truth;

import java.math.BigDecimal;
import java.math.RoundingMode;
import millrace.sampledata.course.Cell;
import millrace.sampledata.course.RiskTally;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.CareUnit;
import millrace.sampledata.scenario.DrugClass;
import millrace.sampledata.scenario.Planted;
import millrace.sampledata.scenario.UnitKind;
import millrace.sampledata.write.Json;

/** The text of {@code truth.json}: what was planted, and what of it happened. */
public final class TruthReport {
  private static final String PAIR = "vancomycin IV + piperacillin-tazobactam";
  private static final String NOTE =
      "Hazards are per 1,000 patient-days at risk of an adult in rates, from 48 h after admission to the injury, the"
          + " discharge or the end of coverage. expected_injuries is the planted hazard integrated over that very time;"
          + " expected_crude_ratio and expected_stratified_ratio are what a perfect analysis finds on average.";

  private final Json json = new Json();
  private final RiskTally tally;

  private TruthReport(RiskTally tally) {
    this.tally = tally;
  }

  /**
   * Writes the report.
   *
   * @param size admissions asked for
   * @param seed the seed
   * @param tally time at risk and injuries of adults in rates
   * @return JSON text
   */
  public static String text(long size, long seed, RiskTally tally) {
    return new TruthReport(tally).write(size, seed);
  }

  private String write(long size, long seed) {
    json.object()
        .field("invented", true)
        .field("admissions", size)
        .field("seed", seed)
        .field("note", NOTE);
    total();
    units();
    pressure();
    drugs();
    return json.close().text();
  }

  private void total() {
    Cell all = new Cell();
    for (int stratum = 0; stratum < RiskTally.STRATA; stratum++) {
      all.add(tally.stratum(stratum));
    }
    json.key("hospital").object();
    realised(all);
    json.close();
  }

  private void units() {
    json.key("units").array();
    for (CareUnit unit : CareUnit.values()) {
      json.object().field("unit_id", unit.id()).field("kind", unit.kind().word());
      json.field("hazard_per_1000_days", unit.hazardPerThousandDays());
      if (unit == Planted.RISING_UNIT) {
        json.field("rises_from_month", Planted.RISING_FROM.toString())
            .field("rises_by_ratio", Planted.RISING_RATIO);
      }
      Cell all = new Cell();
      for (int month = 0; month < Calendar.MONTHS; month++) {
        all.add(tally.unitMonth(unit, month));
      }
      realised(all);
      months(unit);
      json.close();
    }
    json.close();
  }

  private void months(CareUnit unit) {
    json.key("months").array();
    for (int month = 0; month < Calendar.MONTHS; month++) {
      json.object()
          .field("month", Calendar.COVERS_FROM.plusMonths(month).toString().substring(0, 7));
      realised(tally.unitMonth(unit, month));
      json.close();
    }
    json.close();
  }

  private void pressure() {
    Cell[] sides = {new Cell(), new Cell()};
    double above = 0;
    double below = 0;
    for (int kind = 0; kind < UnitKind.values().length; kind++) {
      Cell usual = tally.stratum(kind * 2);
      Cell low = tally.stratum(kind * 2 + 1);
      sides[0].add(usual);
      sides[1].add(low);
      double days = usual.days() + low.days();
      above += days > 0 ? low.expected() * usual.days() / days : 0;
      below += days > 0 ? usual.expected() * low.days() / days : 0;
    }
    json.key("low_pressure").object().field("planted_ratio", Planted.PRESSURE_RATIO);
    json.field("hours_after_spell", Planted.PRESSURE_WINDOW_SECONDS / 3600);
    number(
        "expected_crude_ratio",
        sides[1].expected() / sides[1].days() / (sides[0].expected() / sides[0].days()));
    number("expected_ratio_within_unit_kinds", above / below);
    json.key("with").object();
    realised(sides[1]);
    json.close().key("without").object();
    realised(sides[0]);
    json.close().close();
  }

  private void drugs() {
    json.key("drug_classes").array();
    for (DrugClass drugClass : DrugClass.values()) {
      if (drugClass != DrugClass.UNWATCHED) {
        json.object()
            .field("class", drugClass.word())
            .field("planted_ratio", drugClass.rateRatio());
        json.field("lag_hours", drugClass.lagHours())
            .field("look_back_days", drugClass.lookBackDays());
        json.field("confounded_by_low_pressure", drugClass == DrugClass.LOOP_DIURETIC);
        subject(drugClass.ordinal());
      }
    }
    json.close().key("combinations").array();
    json.object()
        .field("combination", PAIR)
        .field("planted_ratio_beyond_its_members", Planted.PAIR_RATIO);
    subject(RiskTally.SUBJECTS - 1);
    json.close();
  }

  private void subject(int subject) {
    ExpectedRatio ratio = new ExpectedRatio(tally, subject);
    number("exposed_days", ratio.days(true));
    number("exposed_expected_injuries", ratio.expected(true));
    json.field("exposed_injuries", ratio.injuries(true));
    number("other_days", ratio.days(false));
    number("other_expected_injuries", ratio.expected(false));
    json.field("other_injuries", ratio.injuries(false));
    number("expected_crude_ratio", ratio.crude());
    number("expected_stratified_ratio", ratio.stratified());
    json.close();
  }

  private void realised(Cell cell) {
    number("at_risk_days", cell.days());
    number("expected_injuries", cell.expected());
    json.field("injuries", cell.injuries());
  }

  /** A number that cannot be formed, for want of time at risk, is null. */
  private void number(String name, double value) {
    Object shown =
        Double.isFinite(value)
            ? BigDecimal.valueOf(value).setScale(4, RoundingMode.HALF_UP)
            : "null";
    json.field(name, shown);
  }
}
