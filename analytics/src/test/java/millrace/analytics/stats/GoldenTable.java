package millrace.analytics.stats;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;

/** Rows of one file of externally computed values; the README beside the files says how made. */
final class GoldenTable {
  private final List<String> columns;
  private final List<Row> rows;

  private GoldenTable(List<String> lines) {
    columns = List.of(lines.get(0).split(",", -1));
    rows = lines.stream().skip(1).map(Row::new).toList();
  }

  static GoldenTable read(String file) {
    try (InputStream in = GoldenTable.class.getResourceAsStream("/golden/" + file)) {
      String text =
          new String(Objects.requireNonNull(in, file).readAllBytes(), StandardCharsets.UTF_8);
      return new GoldenTable(text.lines().toList());
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    }
  }

  Stream<Row> rows() {
    return rows.stream();
  }

  /** One line, its fields found by the name of the column. */
  final class Row {
    private final String[] fields;

    private Row(String line) {
      fields = line.split(",", -1);
    }

    String text(String column) {
      return fields[columns.indexOf(column)];
    }

    long count(String column) {
      return Math.round(number(column));
    }

    boolean defined(String column) {
      return !List.of("NA", "NaN").contains(text(column));
    }

    double number(String column) {
      String text = text(column);
      return "Inf".equals(text) ? Double.POSITIVE_INFINITY : Double.parseDouble(text);
    }

    @Override
    public String toString() {
      return Arrays.toString(Arrays.copyOf(fields, Math.min(fields.length, 5)));
    }
  }
}
