package millrace.sampledata.write;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.zip.GZIPOutputStream;

/**
 * One file of a table.
 *
 * @param table the table
 * @param part its number, from 1
 * @param packing which files are compressed
 */
public record PartFile(ExtractTable table, int part, Packing packing) {
  private static final int BUFFER_BYTES = 1 << 20;
  private static final String BYTE_ORDER_MARK = "\uFEFF";

  /**
   * Name of the file.
   *
   * @return for instance {@code results-0001.csv.gz}
   */
  public String name() {
    String number = "000" + part;
    String stem =
        table.single() ? table.word() : table.word() + "-" + number.substring(number.length() - 4);
    return stem + (compressed() ? ".csv.gz" : ".csv");
  }

  /**
   * Whether the file is compressed.
   *
   * @return true for a {@code .gz} file
   */
  public boolean compressed() {
    return switch (packing) {
      case PLAIN -> false;
      case MIXED -> part % 2 == 1 && large();
      case GZIP -> !windows();
    };
  }

  /**
   * Writes header and rows.
   *
   * @param folder folder of the extract
   * @param rows the rows
   * @throws IOException when writing fails
   */
  public void write(Path folder, RowBuffer rows) throws IOException {
    String lineEnd = windows() ? "\r\n" : "\n";
    String mark = table == ExtractTable.BODY_MEASURES && part == 1 ? BYTE_ORDER_MARK : "";
    String header = mark + String.join(",", table.columns()) + lineEnd;
    try (OutputStream out = open(folder.resolve(name()))) {
      out.write(header.getBytes(StandardCharsets.UTF_8));
      rows.writeTo(out, lineEnd);
    }
  }

  private OutputStream open(Path file) throws IOException {
    OutputStream raw = Files.newOutputStream(file);
    return new BufferedOutputStream(
        compressed() ? new GZIPOutputStream(raw, 1 << 16) : raw, BUFFER_BYTES);
  }

  private boolean large() {
    return table == ExtractTable.RESULTS
        || table == ExtractTable.ADMINISTRATIONS
        || table == ExtractTable.BLOOD_PRESSURES;
  }

  /** One file of every extract comes from a Windows machine. */
  private boolean windows() {
    return table == ExtractTable.ADMINISTRATIONS && part == 2;
  }
}
