package millrace.etl.parse;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.IntStream;
import millrace.etl.record.SourceLine;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RowFieldsTest {
  @Provide
  Arbitrary<CsvText> texts() {
    return CsvText.any();
  }

  private static RowFields split(String raw, int columns, int... columnOfField) {
    RowFields fields = new RowFields(columns);
    fields.split(RawRow.of(raw, new SourceLine(0, 2)), columnOfField);
    return fields;
  }

  private static List<String> texts(RowFields fields, int columns) {
    return IntStream.range(0, columns).mapToObj(fields::text).toList();
  }

  @Test
  void fieldsStandInTheColumnsOfTheirHeader() {
    assertEquals(List.of("x", "", "z"), texts(split("z,ignored,x", 3, 2, -1, 0), 3));
  }

  @Test
  void blanksAroundAFieldAreTrimmedInsideQuotesToo() {
    assertEquals(List.of("a b", "c", ""), texts(split(" a b\t,\" \tc\r\n \", ", 3, 0, 1, 2), 3));
  }

  @Test
  void aDoubledQuoteIsAQuote() {
    assertEquals(
        List.of("say \"no\", twice", "\""),
        texts(split("\"say \"\"no\"\", twice\",\"\"\"\"", 2, 0, 1), 2));
  }

  @Test
  void aShortRowHasEmptyFieldsAndTellsItsLength() {
    RowFields fields = split("a", 3, 0, 1, 2);

    assertEquals(List.of("a", "", ""), texts(fields, 3));
    assertEquals(1, fields.fieldsInRow());
    assertTrue(fields.isEmpty(2));
  }

  @Test
  void aLongRowLosesOnlyWhatNoHeaderNames() {
    RowFields fields = split("a,b,c", 2, 0, 1);

    assertEquals(List.of("a", "b"), texts(fields, 2));
    assertEquals(3, fields.fieldsInRow());
  }

  @Test
  void nothingOfTheRowBeforeIsLeft() {
    RowFields fields = split("a,\"b\"", 2, 0, 1);
    fields.split(RawRow.of("c", new SourceLine(0, 3)), new int[] {0, 1});

    assertEquals(List.of("c", ""), texts(fields, 2));
  }

  @Test
  void rowsEqualAsTextHaveOneHashWhateverTheirOrderAndQuotes() {
    RowFields one = split("p1, 5 ,x", 3, 0, 1, 2);
    RowFields other = split("x,\"5\",p1,more", 3, 2, 1, 0, -1);

    assertTrue(one.sameText(other));
    assertEquals(one.hash(), other.hash());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          a,b,c | a,b,d
          a,b,  | a,,b
          ab,c, | a,bc,
          ,,    | a,,
          1.0,, | 1.00,,
          """)
  void rowsWithOtherTextDiffer(String one, String other) {
    assertFalse(split(one, 3, 0, 1, 2).sameText(split(other, 3, 0, 1, 2)));
  }

  @Property(tries = 500)
  void aFieldFoundWhereItStandsIsTheFieldSplit(
      @ForAll("texts") CsvText csv, @ForAll @IntRange(max = 5) int field) {
    Assume.that(!csv.records().isEmpty());
    for (CsvText.Written record : csv.records()) {
      byte[] bytes = record.raw().getBytes(StandardCharsets.UTF_8);
      int[] range = new int[2];
      List<String> fields = Records.byRowFields(record.raw());
      if (RowFields.findPlain(bytes, 0, bytes.length, field, range)) {
        String found = new String(bytes, range[0], range[1] - range[0], StandardCharsets.UTF_8);
        assertEquals(field < fields.size() ? fields.get(field) : "", found);
      } else {
        assertTrue(record.raw().contains("\""));
      }
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          p1,x   | 0 | p1
          x, p1 ,y | 1 | p1
          x,p1   | 1 | p1
          x,"y",p1 | 0 | x
          """)
  void aPlainFieldIsFoundBeforeAnyQuote(String raw, int field, String text) {
    byte[] bytes = raw.getBytes(StandardCharsets.UTF_8);
    int[] range = new int[2];

    assertTrue(RowFields.findPlain(bytes, 0, bytes.length, field, range));
    assertEquals(text, new String(bytes, range[0], range[1] - range[0], StandardCharsets.UTF_8));
  }
}
