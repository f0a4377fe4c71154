package millrace.etl.parse;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.util.List;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class RecordReaderTest {
  @Provide
  Arbitrary<CsvText> texts() {
    return CsvText.any();
  }

  private static List<CsvText.Written> read(String text) throws IOException {
    try (RecordReader reader = Records.reader(text, 4)) {
      return Records.all(reader);
    }
  }

  @Property(tries = 500)
  void givesTheRecordsAndLinesThatWereWritten(
      @ForAll("texts") CsvText csv,
      @ForAll @IntRange(min = 1, max = 40) int buffer,
      @ForAll @IntRange(min = 1, max = 9) int chunk)
      throws IOException {
    try (RecordReader reader = new RecordReader(Records.inChunks(csv.bytes(), chunk), 1, buffer)) {
      assertEquals(csv.records(), Records.all(reader));
      assertEquals(csv.bytes().length, reader.nextPosition());
    }
  }

  @Property(tries = 500)
  void givesTheFieldsThatCommonsCsvGives(@ForAll("texts") CsvText csv) throws IOException {
    List<List<String>> fields =
        read(csv.text()).stream().map(r -> Records.byRowFields(r.raw())).toList();

    assertEquals(Records.byCommonsCsv(csv.text()), fields);
  }

  @Test
  void aLineEndInQuotesIsTextAndIsCounted() throws IOException {
    assertEquals(
        List.of(
            new CsvText.Written("a,\"1\n2\r\n3\"", 1),
            new CsvText.Written("b", 4),
            new CsvText.Written("c", 6)),
        read("a,\"1\n2\r\n3\"\r\nb\n\nc"));
  }

  @Test
  void aQuoteInsideAPlainFieldIsText() throws IOException {
    assertEquals(
        List.of(new CsvText.Written("5\" tube,x", 1), new CsvText.Written("y,z", 2)),
        read("5\" tube,x\ny,z\n"));
  }

  @Test
  void aClosingQuoteAfterACommaDoesNotOpenAnother() throws IOException {
    assertEquals(
        List.of(new CsvText.Written("\"a,\",b", 1), new CsvText.Written("c,d", 2)),
        read("\"a,\",b\nc,d\n"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "\n", "\r\n", "\n\r\n\n"})
  void aTextOfEmptyLinesHasNoRecord(String text) throws IOException {
    try (RecordReader reader = Records.reader(text, 2)) {
      assertFalse(reader.next());
      assertFalse(reader.next());
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          "a              | 1
          a,"b~c~d        | 1
          a~b~c,"d~e      | 3
          a,"b~c"~d~"e"" | 4
          """)
  void anUnclosedQuoteNamesTheLineOfItsRecord(String text, long line) throws IOException {
    try (RecordReader reader = Records.reader(text.strip().replace('~', '\n'), 3)) {
      UnclosedQuoteException thrown =
          assertThrows(UnclosedQuoteException.class, () -> Records.all(reader));

      assertEquals(line, thrown.line());
    }
  }
}
