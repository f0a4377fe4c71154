package millrace.analytics.spark;

import java.io.Serializable;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.NoSuchElementException;
import millrace.analytics.mart.AdmissionRow;
import millrace.analytics.mart.DoseLine;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.GradualRiseRow;
import millrace.analytics.mart.LinkRow;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.PressureLine;
import millrace.analytics.mart.QuarantineRow;
import millrace.analytics.mart.ReplacementLine;
import millrace.analytics.mart.ResultLine;
import millrace.analytics.mart.StayLine;
import millrace.analytics.patient.PatientAnalyst;
import millrace.analytics.patient.PatientOutcome;
import millrace.analytics.patient.RunContext;
import millrace.analytics.patient.Tally;
import millrace.etl.check.CheckContext;
import millrace.etl.contract.ContractTable;
import millrace.etl.spark.PatientStream;
import org.apache.spark.api.java.function.FlatMapFunction;
import org.apache.spark.broadcast.Broadcast;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.RowFactory;
import org.apache.spark.sql.types.DataTypes;
import org.apache.spark.sql.types.StructType;

/**
 * The pass over the patients of a partition: checks and analyses each, and gives one row per
 * patient that holds its published rows as arrays, with rows of the partition's sums between and
 * after them.
 */
final class PatientPass implements FlatMapFunction<Iterator<Row>, Row> {
  /** Column of the sums of time at risk by cell. */
  static final String CELLS = "cells";

  /** Column of the tallies. */
  static final String TALLIES = "tallies";

  /** Tables that are arrays of a patient's row. */
  static final List<MartTable> TABLES =
      List.of(
          MartTable.ADMISSIONS,
          MartTable.EPISODES,
          MartTable.GRADUAL_RISES,
          MartTable.LINKS,
          MartTable.QUARANTINE,
          MartTable.RESULTS,
          MartTable.DOSES,
          MartTable.PRESSURES,
          MartTable.STAYS,
          MartTable.REPLACEMENTS);

  static final StructType CELL =
      new StructType()
          .add("cell", DataTypes.LongType, false)
          .add("seconds", DataTypes.LongType, false)
          .add("episodes", DataTypes.LongType, false)
          .add("stage2plus", DataTypes.LongType, false);

  static final StructType TALLY =
      new StructType()
          .add("tally", DataTypes.StringType, false)
          .add("first", DataTypes.StringType, false)
          .add("second", DataTypes.StringType, false)
          .add("third", DataTypes.StringType, false)
          .add("sum", DataTypes.LongType, false);

  private static final long serialVersionUID = 1L;
  private static final int MOST_CELLS = 100_000;

  private final Broadcast<RunContext> run;
  private final Broadcast<CheckContext> extract;
  private final Codecs codecs = new Codecs();

  PatientPass(Broadcast<RunContext> run, Broadcast<CheckContext> extract) {
    this.run = run;
    this.extract = extract;
  }

  static StructType schema() {
    StructType schema = new StructType();
    for (MartTable table : TABLES) {
      schema =
          schema.add(
              table.tableName(),
              DataTypes.createArrayType(new RowCodec<>(table.rowType()).schema(), false),
              true);
    }
    return schema
        .add(CELLS, DataTypes.createArrayType(CELL, false), true)
        .add(TALLIES, DataTypes.createArrayType(TALLY, false), true);
  }

  @Override
  public Iterator<Row> call(Iterator<Row> blocks) {
    PatientStream patients = new PatientStream(blocks, extract.value());
    return new Outcomes(patients, new PatientAnalyst(run.value()), codecs);
  }

  /** A codec for each table of a patient's row. */
  private static final class Codecs implements Serializable {
    private static final long serialVersionUID = 1L;
    private final RowCodec<AdmissionRow> admissions = new RowCodec<>(AdmissionRow.class);
    private final RowCodec<EpisodeRow> episodes = new RowCodec<>(EpisodeRow.class);
    private final RowCodec<GradualRiseRow> gradualRises = new RowCodec<>(GradualRiseRow.class);
    private final RowCodec<LinkRow> links = new RowCodec<>(LinkRow.class);
    private final RowCodec<QuarantineRow> quarantine = new RowCodec<>(QuarantineRow.class);
    private final RowCodec<ResultLine> results = new RowCodec<>(ResultLine.class);
    private final RowCodec<DoseLine> doses = new RowCodec<>(DoseLine.class);
    private final RowCodec<PressureLine> pressures = new RowCodec<>(PressureLine.class);
    private final RowCodec<StayLine> stays = new RowCodec<>(StayLine.class);
    private final RowCodec<ReplacementLine> replacements = new RowCodec<>(ReplacementLine.class);

    Row row(PatientOutcome outcome) {
      return RowFactory.create(
          array(admissions.encodeAll(outcome.admissions())),
          array(episodes.encodeAll(outcome.episodes())),
          array(gradualRises.encodeAll(outcome.gradualRises())),
          array(links.encodeAll(outcome.links())),
          array(quarantine.encodeAll(outcome.quarantine())),
          array(results.encodeAll(outcome.results())),
          array(doses.encodeAll(outcome.doses())),
          array(pressures.encodeAll(outcome.pressures())),
          array(stays.encodeAll(outcome.stays())),
          array(replacements.encodeAll(outcome.replacements())),
          null,
          null);
    }

    /** No array at all when there is no row, which is most patients' case in most tables. */
    private static Object array(List<Row> rows) {
      return rows.isEmpty() ? null : rows.toArray(new Row[0]);
    }
  }

  private static final class Outcomes implements Iterator<Row> {
    private final PatientStream patients;
    private final PatientAnalyst analyst;
    private final Codecs codecs;
    private boolean summed;

    Outcomes(PatientStream patients, PatientAnalyst analyst, Codecs codecs) {
      this.patients = patients;
      this.analyst = analyst;
      this.codecs = codecs;
    }

    @Override
    public boolean hasNext() {
      return patients.hasNext() || !summed;
    }

    @Override
    public Row next() {
      if (analyst.cells().size() > MOST_CELLS) {
        return sums(cells(), null);
      }
      if (patients.hasNext()) {
        return codecs.row(analyst.analyse(patients.next()));
      }
      if (summed) {
        throw new NoSuchElementException();
      }
      summed = true;
      addExtractTallies();
      return sums(cells(), tallies());
    }

    private static Row sums(Object cells, Object tallies) {
      Object[] values = new Object[TABLES.size() + 2];
      values[TABLES.size()] = cells;
      values[TABLES.size() + 1] = tallies;
      return RowFactory.create(values);
    }

    private Object cells() {
      List<Row> rows = new ArrayList<>(analyst.cells().size());
      analyst
          .cells()
          .forEach(
              (cell, seconds, episodes, stage2plus) ->
                  rows.add(RowFactory.create(cell, seconds, (long) episodes, (long) stage2plus)));
      analyst.cells().clear();
      return rows.toArray(new Row[0]);
    }

    private Object tallies() {
      List<Row> rows = new ArrayList<>();
      analyst
          .tally()
          .forEach(
              (key, sum) ->
                  rows.add(
                      RowFactory.create(
                          key.group().name(), key.first(), key.second(), key.third(), sum)));
      return rows.toArray(new Row[0]);
    }

    private void addExtractTallies() {
      Tally tally = analyst.tally();
      patients
          .findings()
          .forEach(
              (key, rows) ->
                  tally.add(
                      Tally.Group.FINDING,
                      key.kind().word(),
                      key.table().tableName(),
                      key.detail(),
                      rows));
      for (ContractTable table : ContractTable.values()) {
        Accounts.tally(tally, table, patients.accounting().of(table));
      }
    }
  }
}
