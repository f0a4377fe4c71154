package millrace.etl.parse;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.util.List;
import millrace.etl.fixture.TemporaryFolder;
import millrace.etl.record.SourceLine;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

class SmallTableReaderTest {
  @Provide
  Arbitrary<CsvText> texts() {
    return CsvText.any();
  }

  private static List<RawRow> read(CsvText csv, String path) throws IOException {
    try (TemporaryFolder folder = new TemporaryFolder()) {
      TemporaryFolder.write(folder.path().resolve(path), csv.bytes());
      return SmallTableReader.read(folder.path(), path, 7);
    }
  }

  private static List<CsvText.Written> written(List<RawRow> rows) {
    return rows.stream().map(r -> new CsvText.Written(r.text(), r.source().line())).toList();
  }

  @Property(tries = 200)
  void givesTheRowsAndLinesThatWereWritten(
      @ForAll("texts") CsvText rows, @ForAll boolean byteOrderMark, @ForAll boolean compressed)
      throws IOException {
    CsvText csv = rows.below((byteOrderMark ? "\uFEFF" : "") + "unit_id,name,kind\r\n");

    assertEquals(csv.records(), written(read(csv, compressed ? "units.csv.gz" : "units.csv")));
  }

  @Example
  void aRowKnowsItsFileAndLine() throws IOException {
    List<RawRow> rows = read(new CsvText("unit_id\n\n\"ICU\n2\"\nM1\n", List.of()), "units.csv");

    assertEquals(
        List.of(new SourceLine(7, 3), new SourceLine(7, 5)),
        rows.stream().map(RawRow::source).toList());
  }
}
