package millrace.sampledata.write;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.format.DateTimeFormatter;
import millrace.sampledata.scenario.Calendar;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.LongRange;
import org.junit.jupiter.api.Test;

/** Rows as bytes. */
final class RowBufferTest {
  private final RowBuffer rows = new RowBuffer();

  @Test
  void rowsComeInOrderOfTimeAndEqualTimesInOrderOfWriting() throws IOException {
    rows.begin(300).plain("late").end();
    rows.begin(-5).plain("early").end();
    rows.begin(300).plain("later").end();
    assertEquals("early\nlate\nlater\n", written("\n"));
  }

  @Test
  void fieldsAreQuotedWhereTheyMustBe() throws IOException {
    rows.begin(0).text("plain").text("a,b").text("say \"no\"").text("two\nlines").empty().end();
    assertEquals("plain,\"a,b\",\"say \"\"no\"\"\",\"two\nlines\",\n", written("\n"));
  }

  @Test
  void windowsLineEndsReachIntoQuotedFields() throws IOException {
    rows.begin(0).text("two\nlines").end();
    assertEquals("\"two\r\nlines\"\r\n", written("\r\n"));
  }

  @Test
  void lastRowIsRepeatedAtItsOwnTime() throws IOException {
    rows.begin(9).plain("a").number(7).end();
    rows.begin(4).plain("b").number(8).end();
    rows.repeatLast("  ");
    assertEquals("b,8\nb,8  \na,7\n", written("\n"));
  }

  @Test
  void absentTimesAndNumbersAreEmpty() throws IOException {
    rows.begin(0).minute(0).second(0).numberOrEmpty(0).numberOrEmpty(5).end();
    assertEquals(",,,5\n", written("\n"));
  }

  @Property
  void decimalsPrintAsDecimalsDo(@ForAll @IntRange(min = 0, max = 1_000_000) int number)
      throws IOException {
    rows.begin(0).decimal(number, 2).decimal(number, 1).number(number).end();
    String expected =
        BigDecimal.valueOf(number, 2) + "," + BigDecimal.valueOf(number, 1) + "," + number + "\n";
    assertEquals(expected, written("\n"));
  }

  @Property
  void timesPrintAsTheGeneralFormatDoes(
      @ForAll @LongRange(min = 1_590_000_000L, max = 2_000_000_000L) long seconds)
      throws IOException {
    rows.begin(seconds).minute(seconds).second(seconds).date(seconds).end();
    var local = Instant.ofEpochSecond(seconds).atZone(Calendar.ZONE);
    String format = "yyyy-MM-dd'T'HH:mm,yyyy-MM-dd HH:mm:ss,yyyy-MM-dd";
    assertEquals(DateTimeFormatter.ofPattern(format).format(local) + "\n", written("\n"));
  }

  private String written(String lineEnd) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    rows.writeTo(out, lineEnd);
    rows.clear();
    return out.toString(StandardCharsets.UTF_8);
  }
}
