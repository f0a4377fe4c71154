package millrace.analytics.spark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import millrace.analytics.mart.MartTable;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.SaveMode;
import org.apache.spark.sql.SparkSession;

/** Writes tables of a run as Parquet files with names that tell nothing but their order. */
final class TableWriter {
  /** Small row groups, so that one patient's lines are read from one of them. */
  private static final long ROW_GROUP_BYTES = 4L << 20;

  private static final Pattern PART = Pattern.compile("part-(\\d+)-.*\\.parquet");

  private final SparkSession spark;
  private final Path run;

  /** A writer into the folder of an unfinished run. */
  TableWriter(SparkSession spark, Path run) {
    this.spark = spark;
    this.run = run;
  }

  /** Writes rows that are held here. */
  <T extends Record> void write(MartTable table, Class<T> rowType, List<T> rows)
      throws IOException {
    RowCodec<T> codec = new RowCodec<>(rowType);
    write(table, spark.createDataFrame(codec.encodeAll(rows), codec.schema()).coalesce(1));
  }

  /** Writes a data frame, a file for each of its partitions that has rows. */
  void write(MartTable table, Dataset<Row> rows) throws IOException {
    Path folder = run.resolve(table.tableName());
    rows.write()
        .mode(SaveMode.Overwrite)
        .option("parquet.block.size", Long.toString(ROW_GROUP_BYTES))
        .parquet(folder.toUri().toString());
    try (Stream<Path> files = Files.list(folder)) {
      for (Path file : files.toList()) {
        Matcher part = PART.matcher(file.getFileName().toString());
        if (part.matches()) {
          Files.move(file, folder.resolve("part-" + part.group(1) + ".parquet"));
        } else {
          Files.delete(file);
        }
      }
    }
  }
}
