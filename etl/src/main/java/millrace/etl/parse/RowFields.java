package millrace.etl.parse;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/**
 * The fields of one record, by the contract's columns: blanks trimmed, quotes taken off. Reused
 * from row to row. A field that the record or the file lacks is empty.
 */
public final class RowFields {
  private final int[] from;
  private final int[] to;
  private final byte[][] holder;
  private int fieldsInRow;

  /**
   * @param columns number of columns of the contract's table
   */
  public RowFields(int columns) {
    from = new int[columns];
    to = new int[columns];
    holder = new byte[columns][];
  }

  /**
   * Splits a record.
   *
   * @param row the record
   * @param columnOfField for each field of the file's header the contract column it holds, or -1
   */
  public void split(RawRow row, int[] columnOfField) {
    Arrays.fill(from, 0);
    Arrays.fill(to, 0);
    Arrays.fill(holder, row.bytes());
    byte[] bytes = row.bytes();
    int at = row.from();
    int end = row.to();
    int field = 0;
    while (true) {
      int fieldFrom = at;
      boolean quote = at < end && bytes[at] == '"';
      if (quote) {
        at = afterQuoted(bytes, at, end);
      }
      while (at < end && bytes[at] != ',') {
        at++;
      }
      if (field < columnOfField.length && columnOfField[field] >= 0) {
        put(columnOfField[field], bytes, fieldFrom, at, quote);
      }
      field++;
      if (at >= end) {
        break;
      }
      at++;
    }
    fieldsInRow = field;
  }

  /**
   * Whether a field of a record can be read where it stands: no field up to it starts with a quote.
   * Then {@code range} holds its trimmed start and end.
   *
   * @param field position of the field in the record
   */
  public static boolean findPlain(byte[] bytes, int from, int to, int field, int[] range) {
    int at = from;
    for (int passed = 0; ; passed++) {
      if (at < to && bytes[at] == '"') {
        return false;
      }
      int start = at;
      while (at < to && bytes[at] != ',') {
        at++;
      }
      if (passed == field) {
        range[0] = start;
        range[1] = at;
        trim(bytes, range);
        return true;
      }
      if (at >= to) {
        range[0] = to;
        range[1] = to;
        return true;
      }
      at++;
    }
  }

  private static void trim(byte[] bytes, int[] range) {
    while (range[0] < range[1] && isBlank(bytes[range[0]])) {
      range[0]++;
    }
    while (range[1] > range[0] && isBlank(bytes[range[1] - 1])) {
      range[1]--;
    }
  }

  /** Number of fields that the record had. */
  public int fieldsInRow() {
    return fieldsInRow;
  }

  /** Whether the column is empty. */
  public boolean isEmpty(int column) {
    return from[column] == to[column];
  }

  /** The column's text, trimmed. */
  public String text(int column) {
    int length = to[column] - from[column];
    return length == 0
        ? ""
        : new String(holder[column], from[column], length, StandardCharsets.UTF_8);
  }

  /** Bytes that hold the column's text. */
  public byte[] bytes(int column) {
    return holder[column];
  }

  /** Start of the column's text in {@link #bytes(int)}. */
  public int from(int column) {
    return from[column];
  }

  /** End of the column's text in {@link #bytes(int)}. */
  public int to(int column) {
    return to[column];
  }

  /** A hash of all columns, for finding rows that are equal as text. */
  public long hash() {
    long hash = 0x9E3779B97F4A7C15L;
    for (int column = 0; column < from.length; column++) {
      byte[] bytes = holder[column];
      for (int i = from[column]; i < to[column]; i++) {
        hash = (hash ^ bytes[i]) * 0x100000001B3L;
      }
      hash = (hash ^ 0xFF) * 0x9E3779B97F4A7C15L;
      hash ^= hash >>> 29;
    }
    return hash;
  }

  /** Whether all columns are equal as text. */
  public boolean sameText(RowFields other) {
    for (int c = 0; c < from.length; c++) {
      if (!Arrays.equals(holder[c], from[c], to[c], other.holder[c], other.from[c], other.to[c])) {
        return false;
      }
    }
    return true;
  }

  private void put(int column, byte[] bytes, int fieldFrom, int fieldTo, boolean quote) {
    byte[] source = bytes;
    int start = fieldFrom;
    int stop = fieldTo;
    if (quote) {
      source = new byte[fieldTo - fieldFrom];
      stop = unquote(bytes, fieldFrom, fieldTo, source);
      start = 0;
    }
    while (start < stop && isBlank(source[start])) {
      start++;
    }
    while (stop > start && isBlank(source[stop - 1])) {
      stop--;
    }
    holder[column] = source;
    from[column] = start;
    to[column] = stop;
  }

  private static boolean isBlank(byte b) {
    return b == ' ' || b == '\t' || b == '\r' || b == '\n';
  }

  /** Position after the closing quote of the quoted part that starts at {@code at}. */
  private static int afterQuoted(byte[] bytes, int at, int end) {
    int i = at + 1;
    while (i < end) {
      if (bytes[i] == '"') {
        if (i + 1 < end && bytes[i + 1] == '"') {
          i++;
        } else {
          return i + 1;
        }
      }
      i++;
    }
    return end;
  }

  private static int unquote(byte[] bytes, int from, int to, byte[] target) {
    int length = 0;
    boolean quoted = true;
    for (int i = from + 1; i < to; i++) {
      if (quoted && bytes[i] == '"') {
        if (i + 1 < to && bytes[i + 1] == '"') {
          target[length++] = '"';
          i++;
        } else {
          quoted = false;
        }
      } else {
        target[length++] = bytes[i];
      }
    }
    return length;
  }
}
