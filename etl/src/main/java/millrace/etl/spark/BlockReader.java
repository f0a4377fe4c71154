package millrace.etl.spark;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Iterator;
import millrace.etl.contract.ContractTable;
import millrace.etl.contract.FileLayout;
import millrace.etl.parse.FileSurveyor;
import millrace.etl.parse.RawRow;
import millrace.etl.parse.RecordReader;
import millrace.etl.parse.RowFields;
import millrace.etl.record.SourceLine;
import org.apache.spark.api.java.function.FlatMapFunction;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.RowFactory;

/** Reads a part of a file and packs its rows by key: patient, or admission for unit stays. */
final class BlockReader implements FlatMapFunction<BlockReader.Part, Row> {
  /** Rows without a key are spread over this many groups that no patient owns. */
  private static final int KEYLESS_GROUPS = 64;

  /** No identifier starts with this. */
  private static final String KEYLESS = "\u0000";

  private static final long serialVersionUID = 1L;

  /** A part of a file to read. */
  record Part(
      int file,
      ContractTable table,
      String path,
      FileLayout layout,
      millrace.etl.parse.FileSurvey.Split split)
      implements java.io.Serializable {}

  private final String folder;

  BlockReader(Path folder) {
    this.folder = folder.toString();
  }

  @Override
  public Iterator<Row> call(Part part) {
    RowArena arena = new RowArena();
    Key key = new Key(part.table(), part.layout().columnOfField());
    long length = part.split().to() - part.split().from();
    try (RecordReader reader = FileSurveyor.open(Path.of(folder), part.path(), part.split())) {
      while (reader.nextPosition() < length && reader.next()) {
        key.find(reader);
        arena.add(
            reader.line(),
            reader.buffer(),
            reader.from(),
            reader.to(),
            key.bytes,
            key.range[0],
            key.range[1]);
      }
    } catch (IOException e) {
      throw new UncheckedIOException(part.path() + " changed or cannot be read any more", e);
    }
    return arena.packed(part.table().ordinal(), part.file()).stream()
        .map(b -> RowFactory.create(b.key(), b.block()))
        .iterator();
  }

  /** The key of the record read last. */
  private static final class Key {
    private final int column;
    private final int field;
    private final int[] columnOfField;
    private final RowFields fields;
    private final int[] range = new int[2];
    private byte[] bytes = new byte[0];

    Key(ContractTable table, int[] columnOfField) {
      this.column = table.column(table == ContractTable.UNIT_STAYS ? "admission_id" : "patient_id");
      this.columnOfField = columnOfField;
      this.fields = new RowFields(table.columns().size());
      int at = 0;
      while (columnOfField[at] != column) {
        at++;
      }
      this.field = at;
    }

    void find(RecordReader reader) {
      bytes = reader.buffer();
      if (RowFields.findPlain(bytes, reader.from(), reader.to(), field, range)
          && range[0] < range[1]) {
        return;
      }
      SourceLine nowhere = new SourceLine(0, 0);
      fields.split(new RawRow(reader.buffer(), reader.from(), reader.to(), nowhere), columnOfField);
      bytes =
          (fields.isEmpty(column) ? keyless(fields.hash()) : fields.text(column))
              .getBytes(StandardCharsets.UTF_8);
      range[0] = 0;
      range[1] = bytes.length;
    }
  }

  /** The group of a row that names no patient or admission; equal rows share it. */
  static String keyless(long hash) {
    return KEYLESS + Math.floorMod(hash, KEYLESS_GROUPS);
  }
}
