package millrace.etl.parse;

import java.nio.charset.StandardCharsets;
import millrace.etl.record.SourceLine;

/**
 * A record of a file as it stands.
 *
 * @param bytes bytes that hold it
 * @param from its start
 * @param to its end, without the line end
 * @param source where it stands
 */
public record RawRow(byte[] bytes, int from, int to, SourceLine source) {
  /** The text of the record; bytes that are no UTF-8 become U+FFFD. */
  public String text() {
    return new String(bytes, from, to - from, StandardCharsets.UTF_8);
  }

  /** A record from its text, for small tables and tests. */
  public static RawRow of(String text, SourceLine source) {
    byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
    return new RawRow(bytes, 0, bytes.length, source);
  }
}
