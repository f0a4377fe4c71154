package millrace.analytics.spark;

import static org.apache.spark.sql.functions.col;
import static org.apache.spark.sql.functions.sum;

import java.nio.file.Path;
import millrace.analytics.patient.RunContext;
import millrace.analytics.patient.Tally;
import millrace.etl.spark.ReadExtract;
import org.apache.spark.api.java.JavaRDD;
import org.apache.spark.api.java.JavaSparkContext;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.SparkSession;
import org.apache.spark.storage.StorageLevel;

/**
 * The sums over all patients; asking for the first of them runs the pass, which writes the tables
 * by patient.
 */
final class PatientSums implements AutoCloseable {
  private final Dataset<Row> sums;

  private PatientSums(Dataset<Row> sums) {
    this.sums = sums;
  }

  /** Plans the pass, with its files in the folder of an unfinished run. */
  static PatientSums of(SparkSession spark, ReadExtract extract, RunContext context, Path folder) {
    JavaSparkContext sparkContext = JavaSparkContext.fromSparkContext(spark.sparkContext());
    JavaRDD<Row> rows =
        extract
            .patientBlocks()
            .toJavaRDD()
            .mapPartitionsWithIndex(
                new PatientPass(folder, sparkContext.broadcast(context), extract.context()), true);
    return new PatientSums(
        spark.createDataFrame(rows, PatientPass.SUMS).persist(StorageLevel.MEMORY_AND_DISK_SER()));
  }

  /** The tallies of all patients. */
  Tally tallies() {
    Tally tally = new Tally();
    for (Row row :
        sums.where(col("tally").isNotNull())
            .groupBy("tally", "first", "second", "third")
            .agg(sum("seconds"))
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

  /** Sums of time at risk by cell. */
  Dataset<Row> cells() {
    return sums.where(col("cell").isNotNull())
        .groupBy(col("cell"))
        .agg(
            sum("seconds").as("seconds"),
            sum("episodes").as("episodes"),
            sum("stage2plus").as("stage2plus"));
  }

  @Override
  public void close() {
    sums.unpersist();
  }
}
