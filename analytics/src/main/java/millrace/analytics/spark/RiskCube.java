package millrace.analytics.spark;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import millrace.analytics.exposure.Exposure;
import millrace.analytics.exposure.Subjects;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.RiskCubeRow;
import millrace.analytics.patient.RunContext;
import millrace.analytics.rates.RateTables;
import millrace.analytics.rates.RiskSum;
import millrace.analytics.risk.CellTable;
import millrace.analytics.risk.RiskCell;
import org.apache.spark.api.java.function.Function2;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.RowFactory;

/**
 * Time at risk by cell: writes the published cube by day and adds up the months that the rates are
 * made of.
 */
final class RiskCube {
  private RiskCube() {}

  /** Writes the cube and adds every cell to the rates, each day's as its month's. */
  static void write(Dataset<Row> cells, RunContext context, Path run, RateTables rates) {
    List<Row> monthly =
        cells
            .sortWithinPartitions("cell")
            .toJavaRDD()
            .mapPartitionsWithIndex(new Writer(context, run), true)
            .collect();
    for (Row row : monthly) {
      rates.add(
          RiskCell.of(row.getLong(0)), new RiskSum(row.getLong(1), row.getLong(2), row.getLong(3)));
    }
  }

  /** Writes a part of the cube and gives its sums by month. */
  private static final class Writer implements Function2<Integer, Iterator<Row>, Iterator<Row>> {
    private static final long serialVersionUID = 1L;
    private final ArrayList<String> units;
    private final ArrayList<Subjects.Subject> subjects;
    private final String folder;

    Writer(RunContext context, Path run) {
      this.units = new ArrayList<>(context.unitNames());
      this.subjects = new ArrayList<>(context.subjects().all());
      this.folder = run.resolve(MartTable.RISK_CUBE.tableName()).toString();
    }

    @Override
    public Iterator<Row> call(Integer part, Iterator<Row> cells) throws IOException {
      CellTable months = new CellTable();
      try (TableFile<RiskCubeRow> file =
          new TableFile<>(RiskCubeRow.class, Path.of(folder), part)) {
        while (cells.hasNext()) {
          Row row = cells.next();
          RiskCell cell = RiskCell.of(row.getLong(0));
          file.write(inWords(cell, row));
          months.add(month(cell), row.getLong(1), (int) row.getLong(2), (int) row.getLong(3));
        }
      }
      List<Row> sums = new ArrayList<>();
      months.forEach(
          (cell, seconds, episodes, stage2plus) ->
              sums.add(RowFactory.create(cell, seconds, (long) episodes, (long) stage2plus)));
      return sums.iterator();
    }

    private static long month(RiskCell cell) {
      long firstDay = LocalDate.ofEpochDay(cell.epochDay()).withDayOfMonth(1).toEpochDay();
      return new RiskCell(
              firstDay,
              cell.unit(),
              cell.attribution(),
              cell.subject(),
              cell.recentHypotension(),
              cell.burden())
          .packed();
    }

    private RiskCubeRow inWords(RiskCell cell, Row row) {
      boolean all = cell.subject() == RiskCell.ALL;
      return new RiskCubeRow(
          LocalDate.ofEpochDay(cell.epochDay()).toString(),
          units.get(cell.unit()),
          cell.attribution().word(),
          all ? "all" : subjects.get(cell.subject()).level().word(),
          all ? "" : subjects.get(cell.subject()).name(),
          !all,
          cell.recentHypotension(),
          Exposure.burdenWord(cell.burden()),
          row.getLong(1),
          row.getLong(2),
          row.getLong(3));
    }
  }
}
