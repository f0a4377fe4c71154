package millrace.analytics.spark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.List;
import java.util.Locale;
import org.apache.hadoop.conf.Configuration;
import org.apache.parquet.conf.ParquetConfiguration;
import org.apache.parquet.conf.PlainParquetConfiguration;
import org.apache.parquet.hadoop.ParquetFileWriter;
import org.apache.parquet.hadoop.ParquetWriter;
import org.apache.parquet.hadoop.api.WriteSupport;
import org.apache.parquet.hadoop.metadata.CompressionCodecName;
import org.apache.parquet.io.LocalOutputFile;
import org.apache.parquet.io.OutputFile;

/**
 * One Parquet file of a published table: written under a name of its own and given its final name
 * when it is complete, so that a task that runs again only replaces it.
 *
 * @param <T> row type, a record
 */
final class TableFile<T extends Record> implements AutoCloseable {
  /** Small row groups, so that one patient's lines are read from one of them. */
  private static final long ROW_GROUP_BYTES = 4L << 20;

  private static final int PAGE_BYTES = 256 << 10;

  private final Class<T> rowType;
  private final Path file;
  private final Path unfinished;
  private ParquetWriter<T> writer;

  /**
   * A file of a table; nothing is written before {@link #write} or {@link #close()}.
   *
   * @param folder folder of the table
   * @param part number of the file in the table
   */
  TableFile(Class<T> rowType, Path folder, int part) {
    this.rowType = rowType;
    this.file = folder.resolve(String.format(Locale.ROOT, "part-%05d.parquet", part));
    this.unfinished =
        folder.resolve("." + file.getFileName() + "-" + Thread.currentThread().getId());
  }

  /** Writes a table that is held here as one file. */
  static <T extends Record> void write(Class<T> rowType, Path folder, List<T> rows)
      throws IOException {
    try (TableFile<T> file = new TableFile<>(rowType, folder, 0)) {
      file.writeAll(rows);
    }
  }

  void writeAll(List<T> rows) throws IOException {
    for (T row : rows) {
      write(row);
    }
  }

  void write(T row) throws IOException {
    if (writer == null) {
      open();
    }
    writer.write(row);
  }

  /**
   * Completes the file; a table part without rows becomes a file without rows, which still has its
   * columns.
   */
  @Override
  public void close() throws IOException {
    if (writer == null) {
      open();
    }
    writer.close();
    Files.move(
        unfinished, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
  }

  private void open() throws IOException {
    Files.createDirectories(file.getParent());
    writer = new Builder<>(rowType, new LocalOutputFile(unfinished)).build();
  }

  private static final class Builder<T extends Record>
      extends ParquetWriter.Builder<T, Builder<T>> {
    private final Class<T> rowType;

    Builder(Class<T> rowType, OutputFile file) {
      super(file);
      this.rowType = rowType;
      withConf(new PlainParquetConfiguration());
      withRowGroupSize(ROW_GROUP_BYTES);
      withPageSize(PAGE_BYTES);
      withCompressionCodec(CompressionCodecName.SNAPPY);
      withWriteMode(ParquetFileWriter.Mode.OVERWRITE);
    }

    @Override
    protected Builder<T> self() {
      return this;
    }

    /** Abstract still, though the other one is called. */
    @SuppressWarnings("deprecation")
    @Override
    protected WriteSupport<T> getWriteSupport(Configuration configuration) {
      return new RecordWriteSupport<>(rowType);
    }

    @Override
    protected WriteSupport<T> getWriteSupport(ParquetConfiguration configuration) {
      return new RecordWriteSupport<>(rowType);
    }
  }
}
