package millrace.etl.parse;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import millrace.etl.record.SourceLine;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** Ways of reading records that the tests of this package share. */
final class Records {
  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180.builder().setIgnoreEmptyLines(true).get();

  private Records() {}

  /** All records to the end. */
  static List<CsvText.Written> all(RecordReader reader) throws IOException {
    return upTo(reader, Long.MAX_VALUE);
  }

  /** The records of a part of that length. */
  static List<CsvText.Written> upTo(RecordReader reader, long length) throws IOException {
    List<CsvText.Written> records = new ArrayList<>();
    while (reader.nextPosition() < length && reader.next()) {
      String raw =
          new String(
              reader.buffer(), reader.from(), reader.to() - reader.from(), StandardCharsets.UTF_8);
      records.add(new CsvText.Written(raw, reader.line()));
    }
    return records;
  }

  static RecordReader reader(String text, int bufferBytes) {
    byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
    return new RecordReader(new ByteArrayInputStream(bytes), 1, bufferBytes);
  }

  /** A stream that gives at most so many bytes at a time, as a network does. */
  static InputStream inChunks(byte[] bytes, int most) {
    ByteArrayInputStream whole = new ByteArrayInputStream(bytes);
    return new InputStream() {
      @Override
      public int read() {
        return whole.read();
      }

      @Override
      public int read(byte[] target, int from, int length) {
        return whole.read(target, from, Math.min(length, most));
      }
    };
  }

  /** The trimmed fields of each record as Commons CSV reads them. */
  static List<List<String>> byCommonsCsv(String text) throws IOException {
    try (CSVParser parser = CSVParser.parse(text, FORMAT)) {
      return parser.stream().map(CSVRecord::toList).map(Records::trimmed).toList();
    }
  }

  /** The fields of a record as {@link RowFields} splits it. */
  static List<String> byRowFields(String raw) {
    RowFields fields = new RowFields(9);
    fields.split(RawRow.of(raw, new SourceLine(0, 1)), IntStream.range(0, 9).toArray());
    return IntStream.range(0, fields.fieldsInRow()).mapToObj(fields::text).toList();
  }

  private static List<String> trimmed(List<String> fields) {
    return fields.stream().map(f -> f.replaceAll("\\A[ \t\r\n]+|[ \t\r\n]+\\z", "")).toList();
  }
}
