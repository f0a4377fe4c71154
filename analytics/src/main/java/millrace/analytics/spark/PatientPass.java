package millrace.analytics.spark;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.NoSuchElementException;
import millrace.analytics.patient.PatientAnalyst;
import millrace.analytics.patient.RunContext;
import millrace.analytics.patient.Tally;
import millrace.etl.check.CheckContext;
import millrace.etl.contract.ContractTable;
import millrace.etl.spark.PatientStream;
import org.apache.spark.api.java.function.Function2;
import org.apache.spark.broadcast.Broadcast;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.RowFactory;
import org.apache.spark.sql.types.DataTypes;
import org.apache.spark.sql.types.StructType;

/**
 * The pass over the patients of a partition: checks and analyses one after another, writes their
 * rows to the partition's files, and gives the partition's sums: time at risk by cell, and tallies.
 */
final class PatientPass implements Function2<Integer, Iterator<Row>, Iterator<Row>> {
  /** Columns of the sums: either a cell with its three, or a tally with its words and one. */
  static final StructType SUMS =
      new StructType()
          .add("cell", DataTypes.LongType, true)
          .add("seconds", DataTypes.LongType, false)
          .add("episodes", DataTypes.LongType, false)
          .add("stage2plus", DataTypes.LongType, false)
          .add("tally", DataTypes.StringType, true)
          .add("first", DataTypes.StringType, true)
          .add("second", DataTypes.StringType, true)
          .add("third", DataTypes.StringType, true);

  private static final long serialVersionUID = 1L;
  private static final int MOST_CELLS = 200_000;

  private final String folder;
  private final Broadcast<RunContext> run;
  private final Broadcast<CheckContext> extract;

  PatientPass(Path folder, Broadcast<RunContext> run, Broadcast<CheckContext> extract) {
    this.folder = folder.toString();
    this.run = run;
    this.extract = extract;
  }

  @Override
  public Iterator<Row> call(Integer part, Iterator<Row> blocks) {
    PatientStream patients = new PatientStream(blocks, extract.value());
    return new Sums(
        patients, new PatientAnalyst(run.value()), new PatientFiles(Path.of(folder), part));
  }

  /** Drives the patients through as the sums are asked for. */
  private static final class Sums implements Iterator<Row> {
    private final PatientStream patients;
    private final PatientAnalyst analyst;
    private final PatientFiles files;
    private Iterator<Row> ready = List.<Row>of().iterator();
    private boolean ended;

    Sums(PatientStream patients, PatientAnalyst analyst, PatientFiles files) {
      this.patients = patients;
      this.analyst = analyst;
      this.files = files;
    }

    @Override
    public boolean hasNext() {
      while (!ready.hasNext() && !ended) {
        advance();
      }
      return ready.hasNext();
    }

    @Override
    public Row next() {
      if (!hasNext()) {
        throw new NoSuchElementException();
      }
      return ready.next();
    }

    private void advance() {
      List<Row> rows = new ArrayList<>();
      try {
        while (patients.hasNext() && analyst.cells().size() < MOST_CELLS) {
          files.write(analyst.analyse(patients.next()));
        }
        takeCells(rows);
        if (!patients.hasNext()) {
          takeTallies(rows);
          files.close();
          ended = true;
        }
      } catch (IOException e) {
        throw new UncheckedIOException(e.getMessage(), e);
      }
      ready = rows.iterator();
    }

    private void takeCells(List<Row> rows) {
      analyst
          .cells()
          .forEach(
              (cell, seconds, episodes, stage2plus) ->
                  rows.add(
                      RowFactory.create(
                          cell,
                          seconds,
                          (long) episodes,
                          (long) stage2plus,
                          null,
                          null,
                          null,
                          null)));
      analyst.cells().clear();
    }

    private void takeTallies(List<Row> rows) {
      Tally tally = analyst.tally();
      tally.addFindings(patients.findings());
      for (ContractTable table : ContractTable.values()) {
        Accounts.tally(tally, table, patients.accounting().of(table));
      }
      tally.forEach(
          (key, sum) ->
              rows.add(
                  RowFactory.create(
                      null,
                      sum,
                      0L,
                      0L,
                      key.group().name(),
                      key.first(),
                      key.second(),
                      key.third())));
    }
  }
}
