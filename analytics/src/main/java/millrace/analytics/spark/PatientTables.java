package millrace.analytics.spark;

import static org.apache.spark.sql.functions.col;
import static org.apache.spark.sql.functions.explode;
import static org.apache.spark.sql.functions.sum;

import java.util.Arrays;
import java.util.Iterator;
import millrace.analytics.mart.MartTable;
import millrace.analytics.patient.RunContext;
import millrace.analytics.patient.Tally;
import millrace.etl.spark.ReadExtract;
import org.apache.spark.api.java.JavaRDD;
import org.apache.spark.api.java.JavaSparkContext;
import org.apache.spark.sql.Column;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.RowFactory;
import org.apache.spark.sql.SparkSession;
import org.apache.spark.storage.StorageLevel;

/**
 * The outcome of the pass over all patients, kept on disk column by column while the tables are
 * written from it.
 */
final class PatientTables implements AutoCloseable {
  private final SparkSession spark;
  private final Dataset<Row> outcomes;

  private PatientTables(SparkSession spark, Dataset<Row> outcomes) {
    this.spark = spark;
    this.outcomes = outcomes;
  }

  /** Plans the pass; the first table that is asked for runs it. */
  static PatientTables of(SparkSession spark, ReadExtract extract, RunContext context) {
    JavaSparkContext sparkContext = JavaSparkContext.fromSparkContext(spark.sparkContext());
    JavaRDD<Row> rows =
        extract
            .patientBlocks()
            .toJavaRDD()
            .mapPartitions(new PatientPass(sparkContext.broadcast(context), extract.context()));
    return new PatientTables(
        spark, spark.createDataFrame(rows, PatientPass.schema()).persist(StorageLevel.DISK_ONLY()));
  }

  /** Rows of a table, by patient. */
  Dataset<Row> table(MartTable table) {
    return exploded(table.tableName());
  }

  /** Rows of a table in one partition, in the order of those columns. */
  Dataset<Row> sorted(MartTable table, String... columns) {
    Column[] order = Arrays.stream(columns).map(c -> col(c)).toArray(Column[]::new);
    return table(table).repartition(1).sortWithinPartitions(order);
  }

  /** Episodes in order of onset, then patient, with their ids. */
  Dataset<Row> episodes() {
    Dataset<Row> sorted = sorted(MartTable.EPISODES, "onset_at", "patient_id");
    return spark.createDataFrame(
        sorted.toJavaRDD().mapPartitions(PatientTables::numbered), sorted.schema());
  }

  /** Sums of time at risk by cell. */
  Dataset<Row> cells() {
    return exploded(PatientPass.CELLS)
        .groupBy(col("cell"))
        .agg(
            sum("seconds").as("seconds"),
            sum("episodes").as("episodes"),
            sum("stage2plus").as("stage2plus"));
  }

  /** The tallies of all patients. */
  Tally tallies() {
    Tally tally = new Tally();
    for (Row row :
        exploded(PatientPass.TALLIES)
            .groupBy("tally", "first", "second", "third")
            .agg(sum("sum").as("sum"))
            .collectAsList()) {
      tally.add(
          Tally.Group.valueOf(row.getString(0)),
          row.getString(1),
          row.getString(2),
          row.getString(3),
          row.getLong(4));
    }
    return tally;
  }

  @Override
  public void close() {
    outcomes.unpersist();
  }

  private Dataset<Row> exploded(String column) {
    return outcomes.select(explode(col(column)).as("row")).select("row.*");
  }

  private static Iterator<Row> numbered(Iterator<Row> rows) {
    return new Iterator<>() {
      private long number;

      @Override
      public boolean hasNext() {
        return rows.hasNext();
      }

      @Override
      public Row next() {
        Row row = rows.next();
        Object[] values = new Object[row.size()];
        for (int i = 1; i < values.length; i++) {
          values[i] = row.get(i);
        }
        number++;
        values[0] = "e-" + number;
        return RowFactory.create(values);
      }
    };
  }
}
