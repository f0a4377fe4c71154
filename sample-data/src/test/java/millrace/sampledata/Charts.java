package millrace.sampledata;

import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.course.Chart;
import millrace.sampledata.course.ChartMaker;
import millrace.sampledata.course.RiskTally;
import millrace.sampledata.person.AdmissionCounts;
import millrace.sampledata.person.Person;
import millrace.sampledata.person.PersonMaker;
import millrace.sampledata.scenario.Chance;

/** Patients in memory, made as the generator makes them. */
final class Charts {
  private Charts() {}

  /** The charts of an extract; the tally gets those in rates. */
  static List<Chart> of(long seed, long admissions, RiskTally tally) {
    AdmissionCounts counts = new AdmissionCounts(seed, admissions);
    long[] numbers = counts.firstNumbers(0, counts.patients());
    List<Chart> charts = new ArrayList<>();
    for (int patient = 0; patient + 1 < numbers.length; patient++) {
      Chance chance = Chance.of(seed, patient);
      int own = (int) (numbers[patient + 1] - numbers[patient]);
      Person person = new PersonMaker(chance.split()).make(patient, numbers[patient], own);
      charts.add(new ChartMaker(chance.split(), person, tally, new RiskTally()).make());
    }
    return charts;
  }
}
