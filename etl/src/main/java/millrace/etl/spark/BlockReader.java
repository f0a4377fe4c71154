package millrace.etl.spark;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Iterator;
import java.util.Map;
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
    Map<String, PatientBlock> blocks = new HashMap<>();
    int keyColumn =
        part.table() == ContractTable.UNIT_STAYS
            ? part.table().column("admission_id")
            : part.table().column("patient_id");
    RowFields fields = new RowFields(part.table().columns().size());
    int[] columnOfField = part.layout().columnOfField();
    long length = part.split().to() - part.split().from();
    String lastKey = null;
    PatientBlock lastBlock = null;
    try (RecordReader reader = FileSurveyor.open(Path.of(folder), part.path(), part.split())) {
      while (reader.nextPosition() < length && reader.next()) {
        SourceLine source = new SourceLine(part.file(), (int) reader.line());
        fields.split(
            new RawRow(reader.buffer(), reader.from(), reader.to(), source), columnOfField);
        String key = fields.isEmpty(keyColumn) ? keyless(fields.hash()) : fields.text(keyColumn);
        if (!key.equals(lastKey)) {
          lastKey = key;
          lastBlock = blocks.computeIfAbsent(key, k -> new PatientBlock(part.table(), part.file()));
        }
        lastBlock.add(reader.line(), reader.buffer(), reader.from(), reader.to());
      }
    } catch (IOException e) {
      throw new UncheckedIOException(part.path() + " changed or cannot be read any more", e);
    }
    return blocks.entrySet().stream()
        .map(e -> RowFactory.create(e.getKey(), e.getValue().packed()))
        .iterator();
  }

  /** The group of a row that names no patient or admission; equal rows share it. */
  static String keyless(long hash) {
    return KEYLESS + Math.floorMod(hash, KEYLESS_GROUPS);
  }
}
