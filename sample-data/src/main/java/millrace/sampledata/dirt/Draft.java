package millrace.sampledata.dirt;

import java.util.Arrays;
import millrace.sampledata.write.Buffers;
import millrace.sampledata.write.ExtractTable;
import millrace.sampledata.write.RowBuffer;

/** A row as text by column name, for the few rows that are not written the quick way. */
final class Draft {
  private final ExtractTable table;
  private final String[] fields;

  Draft(ExtractTable table) {
    this.table = table;
    this.fields = new String[table.columns().size()];
    Arrays.fill(fields, "");
  }

  /** Sets a field. */
  Draft set(String column, String value) {
    int index = table.columns().indexOf(column);
    if (index < 0) {
      throw new IllegalArgumentException(table.word() + " has no column " + column);
    }
    fields[index] = value;
    return this;
  }

  /** Writes the row among those of the given time. */
  void write(Buffers buffers, long seconds) {
    RowBuffer row = buffers.of(table).begin(seconds);
    for (String field : fields) {
      row.text(field);
    }
    row.end();
  }
}
