package millrace.analytics.spark;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import millrace.analytics.cohort.CohortClass;
import millrace.analytics.exposure.Subjects;
import millrace.analytics.mart.FindingRow;
import millrace.analytics.mart.FlowRow;
import millrace.analytics.mart.MonitoringRow;
import millrace.analytics.mart.TestingRow;
import millrace.analytics.mart.UnitRow;
import millrace.analytics.patient.Tally;
import millrace.analytics.timeline.Occupancy;
import millrace.etl.record.Unit;

/** Small published tables made of tallies. */
final class SummaryTables {
  private SummaryTables() {}

  /** All five classes, zeros too. */
  static List<FlowRow> flow(Tally tally) {
    List<FlowRow> rows = new ArrayList<>();
    for (CohortClass cohort : CohortClass.values()) {
      rows.add(
          new FlowRow(
              cohort.word(), tally.sum(new Tally.Key(Tally.Group.FLOW, cohort.word(), "", ""))));
    }
    return rows;
  }

  /** Findings, the most frequent of a kind first. */
  static List<FindingRow> findings(Tally tally) {
    List<FindingRow> rows = new ArrayList<>();
    tally.forEach(
        (key, sum) -> {
          if (key.group() == Tally.Group.FINDING) {
            rows.add(new FindingRow(key.first(), key.second(), key.third(), sum));
          }
        });
    rows.sort(
        Comparator.comparing(FindingRow::kind)
            .thenComparing(FindingRow::table)
            .thenComparing(Comparator.comparingLong(FindingRow::rows).reversed())
            .thenComparing(FindingRow::detail));
    return rows;
  }

  /** Units, with the one of uncovered time. */
  static List<UnitRow> units(Map<String, Unit> units) {
    List<UnitRow> rows = new ArrayList<>();
    new TreeMap<>(units)
        .forEach((id, unit) -> rows.add(new UnitRow(id, unit.name(), unit.kind().word())));
    if (!units.containsKey(Occupancy.UNASSIGNED)) {
      rows.add(new UnitRow(Occupancy.UNASSIGNED, "in no unit", "other"));
    }
    return rows;
  }

  /** Exposed and monitored days of every agent and class. */
  static List<MonitoringRow> monitoring(Tally tally, Subjects subjects) {
    List<MonitoringRow> rows = new ArrayList<>();
    for (int number = 0; number < subjects.all().size(); number++) {
      Subjects.Subject subject = subjects.all().get(number);
      if (subject.level() != Subjects.Level.COMBINATION) {
        String key = Integer.toString(number);
        rows.add(
            new MonitoringRow(
                subject.level().word(),
                subject.name(),
                tally.sum(new Tally.Key(Tally.Group.MONITORING, key, "exposed", "")),
                tally.sum(new Tally.Key(Tally.Group.MONITORING, key, "monitored", ""))));
      }
    }
    return rows;
  }

  /** Results and occupied time by month and unit. */
  static List<TestingRow> testing(Tally tally) {
    Map<String, TreeSet<String>> unitsOfMonth = new TreeMap<>();
    tally.forEach(
        (key, sum) -> {
          if (key.group() == Tally.Group.TESTING) {
            unitsOfMonth.computeIfAbsent(key.first(), m -> new TreeSet<>()).add(key.second());
          }
        });
    List<TestingRow> rows = new ArrayList<>();
    unitsOfMonth.forEach(
        (month, units) ->
            units.forEach(
                unit ->
                    rows.add(
                        new TestingRow(
                            month,
                            unit,
                            tally.sum(new Tally.Key(Tally.Group.TESTING, month, unit, "seconds")),
                            tally.sum(
                                new Tally.Key(Tally.Group.TESTING, month, unit, "results"))))));
    return rows;
  }
}
