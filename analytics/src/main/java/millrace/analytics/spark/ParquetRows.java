package millrace.analytics.spark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.apache.hadoop.conf.Configuration;
import org.apache.parquet.example.data.Group;
import org.apache.parquet.hadoop.ParquetFileReader;
import org.apache.parquet.hadoop.ParquetReader;
import org.apache.parquet.hadoop.example.GroupReadSupport;
import org.apache.parquet.io.LocalInputFile;

/** Reads the Parquet files of a published table without a Spark session. */
public final class ParquetRows {
  private ParquetRows() {}

  /** Number of rows in a table's folder, from the footers of its files. */
  static long count(Path table) throws IOException {
    long rows = 0;
    for (Path file : files(table)) {
      try (ParquetFileReader reader = ParquetFileReader.open(new LocalInputFile(file))) {
        rows += reader.getRecordCount();
      }
    }
    return rows;
  }

  /** Gives every row of a table's folder, in the order of its files. */
  public static void forEach(Path table, Consumer<Group> row) throws IOException {
    for (Path file : files(table)) {
      try (ParquetReader<Group> reader =
          ParquetReader.builder(new GroupReadSupport(), new org.apache.hadoop.fs.Path(file.toUri()))
              .withConf(new Configuration())
              .build()) {
        for (Group group = reader.read(); group != null; group = reader.read()) {
          row.accept(group);
        }
      }
    }
  }

  private static List<Path> files(Path table) throws IOException {
    try (Stream<Path> files = Files.list(table)) {
      return files.filter(f -> f.toString().endsWith(".parquet")).sorted().toList();
    }
  }
}
