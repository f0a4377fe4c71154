package millrace.sampledata;

import java.io.IOException;
import java.nio.file.Path;
import millrace.sampledata.course.Chart;
import millrace.sampledata.course.ChartMaker;
import millrace.sampledata.course.RiskTally;
import millrace.sampledata.dirt.DirtPlanter;
import millrace.sampledata.person.AdmissionCounts;
import millrace.sampledata.person.Person;
import millrace.sampledata.person.PersonMaker;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.truth.InjuryRows;
import millrace.sampledata.write.Buffers;
import millrace.sampledata.write.ExtractTable;
import millrace.sampledata.write.Packing;
import millrace.sampledata.write.PartFile;
import millrace.sampledata.write.PatientWriter;

/** Makes whole parts, one after the other, in the same buffers. Each worker has one. */
final class PartMaker {
  private final long seed;
  private final AdmissionCounts counts;
  private final Buffers buffers = new Buffers();
  private final PatientWriter writer = new PatientWriter(buffers);
  private final DirtPlanter dirt;

  PartMaker(long seed, AdmissionCounts counts) {
    this.seed = seed;
    this.counts = counts;
    this.dirt = new DirtPlanter(seed, counts.patients(), buffers);
  }

  /** Makes a part and writes its files. */
  PartTruth make(Parts parts, int part, Path folder, Packing packing) throws IOException {
    buffers.clear();
    RiskTally counted = new RiskTally();
    RiskTally uncounted = new RiskTally();
    StringBuilder injuries = new StringBuilder();
    long from = parts.from(part);
    long[] numbers = counts.firstNumbers(from, parts.to(part));
    for (int index = 0; index + 1 < numbers.length; index++) {
      Chance chance = Chance.of(seed, from + index);
      int admissions = (int) (numbers[index + 1] - numbers[index]);
      Person person =
          new PersonMaker(chance.split()).make(from + index, numbers[index], admissions);
      Chart chart = new ChartMaker(chance.split(), person, counted, uncounted).make();
      writer.write(chart, chance.split());
      dirt.plant(from + index, chart, chance.split());
      InjuryRows.add(chart, injuries);
    }
    long rows = 0;
    for (ExtractTable table : ExtractTable.values()) {
      if (!table.single()) {
        new PartFile(table, part + 1, packing).write(folder, buffers.of(table));
        rows += buffers.of(table).rows();
      }
    }
    return new PartTruth(counted, injuries.toString(), rows);
  }
}
