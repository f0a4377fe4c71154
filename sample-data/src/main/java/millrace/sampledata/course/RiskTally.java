package millrace.sampledata.course;

import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.CareUnit;
import millrace.sampledata.scenario.DrugClass;
import millrace.sampledata.scenario.Planted;
import millrace.sampledata.scenario.UnitKind;

/**
 * Time at risk, injuries, and the injuries expected from the planted hazard over that very time.
 * The difference between injuries and expectation has mean zero, so every ratio of expectations is
 * what a perfect analysis would find on average.
 */
public final class RiskTally {
  /** Subjects: the drug classes, then the pair of vancomycin and piperacillin-tazobactam. */
  public static final int SUBJECTS = DrugClass.values().length + 1;

  /** Strata: kind of unit, without and with a recent spell of low pressure. */
  public static final int STRATA = UnitKind.values().length * 2;

  private static final int PAIR =
      Planted.bit(DrugClass.VANCOMYCIN) | Planted.bit(DrugClass.PIPERACILLIN_TAZOBACTAM);

  private final Cell[] byUnitAndMonth = cells(CareUnit.values().length * Calendar.MONTHS);
  private final Cell[] bySubject = cells(SUBJECTS * STRATA * 2);
  private final Cell[] byStratum = cells(STRATA);

  /**
   * Adds a stretch of time during which nothing changes.
   *
   * @param stretch where and under which exposures
   * @param seconds its length
   * @param expected injuries expected in it
   */
  void addTime(Stretch stretch, long seconds, double expected) {
    if (stretch.month() >= 0 && stretch.month() < Calendar.MONTHS) {
      add(stretch, seconds, expected, 0);
    }
  }

  /**
   * Adds an injury at the end of a stretch.
   *
   * @param stretch where and under which exposures it happened
   */
  void addInjury(Stretch stretch) {
    if (stretch.month() >= 0 && stretch.month() < Calendar.MONTHS) {
      add(stretch, 0, 0, 1);
    }
  }

  /**
   * Adds all of another tally.
   *
   * @param other the other tally
   */
  public void addAll(RiskTally other) {
    addAll(byUnitAndMonth, other.byUnitAndMonth);
    addAll(bySubject, other.bySubject);
    addAll(byStratum, other.byStratum);
  }

  /**
   * A unit in a month.
   *
   * @param unit the unit
   * @param month number of the covered month
   * @return its cell
   */
  public Cell unitMonth(CareUnit unit, int month) {
    return byUnitAndMonth[unit.ordinal() * Calendar.MONTHS + month];
  }

  /**
   * A subject in a stratum, in exposed or other time.
   *
   * @param subject ordinal of the drug class, or the pair's number
   * @param stratum ordinal of the kind, doubled, plus 1 with recent low pressure
   * @param exposed whether exposed
   * @return its cell
   */
  public Cell subject(int subject, int stratum, boolean exposed) {
    return bySubject[(subject * STRATA + stratum) * 2 + (exposed ? 1 : 0)];
  }

  /**
   * A stratum, whatever the drugs.
   *
   * @param stratum as in {@link #subject}
   * @return its cell
   */
  public Cell stratum(int stratum) {
    return byStratum[stratum];
  }

  private void add(Stretch stretch, long seconds, double expected, int injuries) {
    unitMonth(stretch.unit(), stretch.month()).add(seconds, expected, injuries);
    int stratum = stretch.unit().kind().ordinal() * 2 + (stretch.recentLowPressure() ? 1 : 0);
    byStratum[stratum].add(seconds, expected, injuries);
    for (int subject = 0; subject < SUBJECTS - 1; subject++) {
      boolean exposed = (stretch.exposures() >>> subject & 1) != 0;
      subject(subject, stratum, exposed).add(seconds, expected, injuries);
    }
    boolean pair = (stretch.exposures() & PAIR) == PAIR;
    subject(SUBJECTS - 1, stratum, pair).add(seconds, expected, injuries);
  }

  private static void addAll(Cell[] to, Cell[] from) {
    for (int index = 0; index < to.length; index++) {
      to[index].add(from[index]);
    }
  }

  private static Cell[] cells(int count) {
    Cell[] cells = new Cell[count];
    for (int index = 0; index < count; index++) {
      cells[index] = new Cell();
    }
    return cells;
  }
}
