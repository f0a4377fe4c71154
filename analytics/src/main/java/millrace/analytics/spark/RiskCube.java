package millrace.analytics.spark;

import static org.apache.spark.sql.functions.col;

import java.io.Serializable;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import millrace.analytics.exposure.Exposure;
import millrace.analytics.exposure.Subjects;
import millrace.analytics.mart.RiskCubeRow;
import millrace.analytics.patient.RunContext;
import millrace.analytics.rates.RateTables;
import millrace.analytics.rates.RiskSum;
import millrace.analytics.risk.CellTable;
import millrace.analytics.risk.RiskCell;
import org.apache.spark.api.java.JavaRDD;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.RowFactory;
import org.apache.spark.sql.SparkSession;
import org.apache.spark.storage.StorageLevel;

/**
 * Time at risk by cell: the published cube by day, and the sums by month that the rates are made
 * of.
 */
final class RiskCube implements AutoCloseable {
  private static final int FILES = 4;

  private final Dataset<Row> cells;

  private RiskCube(Dataset<Row> cells) {
    this.cells = cells;
  }

  static RiskCube of(Dataset<Row> cells) {
    return new RiskCube(cells.persist(StorageLevel.MEMORY_AND_DISK()));
  }

  /** Adds all cells to the rates, each day's as its month's. */
  void addTo(RateTables rates) {
    List<Row> monthly = cells.toJavaRDD().mapPartitions(RiskCube::byMonth).collect();
    for (Row row : monthly) {
      rates.add(
          RiskCell.of(row.getLong(0)), new RiskSum(row.getLong(1), row.getLong(2), row.getLong(3)));
    }
  }

  /** The published cube. */
  Dataset<Row> table(SparkSession spark, RunContext context) {
    JavaRDD<Row> rows =
        cells
            .repartition(FILES, col("cell"))
            .sortWithinPartitions("cell")
            .toJavaRDD()
            .map(new Decoder(context.unitNames(), context.subjects())::decode);
    return spark.createDataFrame(rows, new RowCodec<>(RiskCubeRow.class).schema());
  }

  @Override
  public void close() {
    cells.unpersist();
  }

  private static Iterator<Row> byMonth(Iterator<Row> daily) {
    CellTable months = new CellTable();
    List<long[]> withEpisodes = new ArrayList<>();
    daily.forEachRemaining(
        row -> {
          RiskCell cell = RiskCell.of(row.getLong(0));
          long firstDay = LocalDate.ofEpochDay(cell.epochDay()).withDayOfMonth(1).toEpochDay();
          long month =
              new RiskCell(
                      firstDay,
                      cell.unit(),
                      cell.attribution(),
                      cell.subject(),
                      cell.recentHypotension(),
                      cell.burden())
                  .packed();
          months.addSeconds(month, row.getLong(1));
          if (row.getLong(2) > 0) {
            withEpisodes.add(new long[] {month, row.getLong(2), row.getLong(3)});
          }
        });
    List<Row> rows = new ArrayList<>();
    months.forEach(
        (cell, seconds, episodes, stage2plus) ->
            rows.add(RowFactory.create(cell, seconds, 0L, 0L)));
    withEpisodes.forEach(e -> rows.add(RowFactory.create(e[0], 0L, e[1], e[2])));
    return rows.iterator();
  }

  /** Cells in words. */
  private static final class Decoder implements Serializable {
    private static final long serialVersionUID = 1L;
    private final ArrayList<String> units;
    private final ArrayList<Subjects.Subject> subjects;
    private final RowCodec<RiskCubeRow> codec = new RowCodec<>(RiskCubeRow.class);

    Decoder(List<String> units, Subjects subjects) {
      this.units = new ArrayList<>(units);
      this.subjects = new ArrayList<>(subjects.all());
    }

    Row decode(Row row) {
      RiskCell cell = RiskCell.of(row.getLong(0));
      boolean all = cell.subject() == RiskCell.ALL;
      return codec.encode(
          new RiskCubeRow(
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
              row.getLong(3)));
    }
  }
}
