package millrace.analytics.spark;

import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import millrace.analytics.export.ExportColumn;
import millrace.analytics.export.ExportTable;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import org.apache.parquet.example.data.Group;
import org.apache.parquet.schema.LogicalTypeAnnotation.TimestampLogicalTypeAnnotation;
import org.apache.parquet.schema.PrimitiveType;

/** Writes a published table as CSV, rows in the order of its leading columns. */
public final class MartExporter {
  private MartExporter() {}

  /**
   * Writes a table.
   *
   * @param table folder of the published table
   * @param export what to write and how
   * @param out file to write; replaced in one move when it is complete
   * @return number of rows written
   */
  public static int export(Path table, ExportTable export, Path out) throws IOException {
    List<Object[]> rows = new ArrayList<>();
    ParquetRows.forEach(table, group -> rows.add(values(group, export.columns())));
    rows.sort(order(export.ordering()));
    Path unfinished = out.resolveSibling("." + out.getFileName() + ".unfinished");
    CSVFormat format =
        CSVFormat.RFC4180
            .builder()
            .setRecordSeparator("\n")
            .setHeader(export.columns().stream().map(ExportColumn::name).toArray(String[]::new))
            .get();
    try (BufferedWriter writer = Files.newBufferedWriter(unfinished);
        CSVPrinter printer = new CSVPrinter(writer, format)) {
      for (Object[] row : rows) {
        for (int i = 0; i < row.length; i++) {
          printer.print(export.columns().get(i).format().print(row[i]));
        }
        printer.println();
      }
    } catch (IOException e) {
      Files.deleteIfExists(unfinished);
      throw e;
    }
    Files.move(unfinished, out, StandardCopyOption.REPLACE_EXISTING);
    return rows.size();
  }

  private static Object[] values(Group group, List<ExportColumn> columns) {
    Object[] values = new Object[columns.size()];
    for (int i = 0; i < values.length; i++) {
      values[i] = value(group, columns.get(i).source());
    }
    return values;
  }

  private static Object value(Group group, String column) {
    int field = group.getType().getFieldIndex(column);
    if (group.getFieldRepetitionCount(field) == 0) {
      return null;
    }
    PrimitiveType type = group.getType().getType(field).asPrimitiveType();
    return switch (type.getPrimitiveTypeName()) {
      case INT32 -> group.getInteger(field, 0);
      case INT64 ->
          type.getLogicalTypeAnnotation() instanceof TimestampLogicalTypeAnnotation
              ? Instant.EPOCH.plus(group.getLong(field, 0), ChronoUnit.MICROS)
              : (Object) group.getLong(field, 0);
      case DOUBLE -> group.getDouble(field, 0);
      case BOOLEAN -> group.getBoolean(field, 0);
      default -> group.getString(field, 0);
    };
  }

  @SuppressWarnings("unchecked")
  private static Comparator<Object[]> order(int columns) {
    return (a, b) -> {
      for (int i = 0; i < columns; i++) {
        int compared =
            Comparator.nullsFirst(Comparator.<Comparable<Object>>naturalOrder())
                .compare((Comparable<Object>) a[i], (Comparable<Object>) b[i]);
        if (compared != 0) {
          return compared;
        }
      }
      return 0;
    };
  }
}
