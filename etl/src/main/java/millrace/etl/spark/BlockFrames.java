package millrace.etl.spark;

import static org.apache.spark.sql.functions.col;

import org.apache.spark.api.java.JavaRDD;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.SparkSession;
import org.apache.spark.sql.types.DataTypes;
import org.apache.spark.sql.types.StructType;

/** Data frames of packed rows: a key and a block. */
final class BlockFrames {
  private static final StructType BLOCKS =
      new StructType()
          .add("key", DataTypes.StringType, false)
          .add("block", DataTypes.BinaryType, false);

  private BlockFrames() {}

  static Dataset<Row> of(SparkSession spark, JavaRDD<Row> blocks) {
    return spark.createDataFrame(blocks, BLOCKS);
  }

  /** The one shuffle: rows with one key in one partition, sorted by it. */
  static Dataset<Row> byKey(Dataset<Row> rows, int partitions) {
    String key = rows.columns()[0];
    return rows.repartition(partitions, col(key)).sortWithinPartitions(col(key));
  }
}
