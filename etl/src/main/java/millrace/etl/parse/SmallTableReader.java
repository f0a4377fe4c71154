package millrace.etl.parse;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.zip.GZIPInputStream;
import millrace.etl.record.SourceLine;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * Reads a table that fits in memory ({@code units}, {@code code_map}) with its raw rows and their
 * lines.
 */
public final class SmallTableReader {
  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180
          .builder()
          .setIgnoreEmptyLines(true)
          .setTrailingData(true)
          .setLenientEof(true)
          .get();

  private SmallTableReader() {}

  /**
   * The rows of a file, without its header.
   *
   * @param folder folder of the extract
   * @param path path of the file inside it
   * @param fileIndex index of the file in the extract
   */
  public static List<RawRow> read(Path folder, String path, int fileIndex) throws IOException {
    String text = text(folder.resolve(path));
    List<Integer> starts = new ArrayList<>();
    try (CSVParser parser = CSVParser.parse(text, FORMAT)) {
      for (CSVRecord record : parser) {
        starts.add((int) record.getCharacterPosition());
      }
    }
    List<RawRow> rows = new ArrayList<>();
    int line = 1;
    int counted = 0;
    for (int i = 0; i < starts.size(); i++) {
      int from = starts.get(i);
      int to = i + 1 < starts.size() ? starts.get(i + 1) : text.length();
      while (from < to && isLineEnd(text.charAt(from))) {
        from++;
      }
      while (to > from && isLineEnd(text.charAt(to - 1))) {
        to--;
      }
      line += (int) text.substring(counted, from).chars().filter(c -> c == '\n').count();
      counted = from;
      if (i > 0 && to > from) {
        rows.add(RawRow.of(text.substring(from, to), new SourceLine(fileIndex, line)));
      }
    }
    return rows;
  }

  private static boolean isLineEnd(char c) {
    return c == '\n' || c == '\r';
  }

  private static String text(Path file) throws IOException {
    try (InputStream in = Files.newInputStream(file);
        InputStream plain = file.toString().endsWith(".gz") ? new GZIPInputStream(in) : in) {
      return new String(plain.readAllBytes(), StandardCharsets.UTF_8);
    }
  }
}
