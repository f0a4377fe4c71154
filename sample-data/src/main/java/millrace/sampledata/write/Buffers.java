package millrace.sampledata.write;

import java.util.EnumMap;
import java.util.Map;

/** One row buffer for every table. */
public final class Buffers {
  private final Map<ExtractTable, RowBuffer> buffers = new EnumMap<>(ExtractTable.class);

  /** Makes empty buffers. */
  public Buffers() {
    for (ExtractTable table : ExtractTable.values()) {
      buffers.put(table, new RowBuffer());
    }
  }

  /**
   * The buffer of a table.
   *
   * @param table the table
   * @return its buffer
   */
  public RowBuffer of(ExtractTable table) {
    return buffers.get(table);
  }

  /** Forgets the rows of all tables. */
  public void clear() {
    buffers.values().forEach(RowBuffer::clear);
  }
}
