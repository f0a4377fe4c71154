package millrace.sampledata.write;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/**
 * The rows of one part of a table as bytes, written out in order of time. Used again for the next
 * part, so that no row costs an object.
 */
public final class RowBuffer {
  private static final int INDEX_BITS = 24;
  private static final long INDEX_MASK = (1L << INDEX_BITS) - 1;
  private static final long TIME_OFFSET = 1L << 37;
  private static final int SPARE = 64;

  private byte[] bytes = new byte[1 << 16];
  private long[] keys = new long[1024];
  private int[] starts = new int[1025];
  private int length;
  private int rows;
  private boolean firstField;

  /** Forgets all rows. */
  public void clear() {
    length = 0;
    rows = 0;
  }

  /**
   * Rows since the last {@link #clear}.
   *
   * @return their number
   */
  public int rows() {
    return rows;
  }

  /**
   * Starts a row.
   *
   * @param seconds its time, which orders the rows; rows of one time stay in the order in which
   *     they came
   * @return this buffer
   */
  public RowBuffer begin(long seconds) {
    if (rows == keys.length) {
      keys = Arrays.copyOf(keys, rows * 2);
      starts = Arrays.copyOf(starts, rows * 2 + 1);
    }
    keys[rows] = (seconds + TIME_OFFSET) << INDEX_BITS | rows;
    starts[rows] = length;
    firstField = true;
    return this;
  }

  /**
   * Writes the last row once more, as an interface that sends a message twice does.
   *
   * @param blanks blanks to put after it
   */
  public void repeatLast(String blanks) {
    if (rows == 0) {
      return;
    }
    int from = starts[rows - 1];
    byte[] again = Arrays.copyOfRange(bytes, from, length);
    begin((keys[rows - 1] >> INDEX_BITS) - TIME_OFFSET);
    plain(again);
    for (int index = 0; index < blanks.length(); index++) {
      bytes[length++] = ' ';
    }
    end();
  }

  /** Ends the row. */
  public void end() {
    rows++;
    starts[rows] = length;
  }

  /**
   * Adds an empty field.
   *
   * @return this buffer
   */
  public RowBuffer empty() {
    separate(SPARE);
    return this;
  }

  /**
   * Adds a field that needs no quotes.
   *
   * @param field UTF-8 bytes
   * @return this buffer
   */
  public RowBuffer plain(byte[] field) {
    separate(field.length + SPARE);
    System.arraycopy(field, 0, bytes, length, field.length);
    length += field.length;
    return this;
  }

  /**
   * Adds an ASCII field that needs no quotes.
   *
   * @param field the text
   * @return this buffer
   */
  public RowBuffer plain(String field) {
    separate(field.length() + SPARE);
    for (int index = 0; index < field.length(); index++) {
      bytes[length++] = (byte) field.charAt(index);
    }
    return this;
  }

  /**
   * Adds any text, in quotes where it needs them.
   *
   * @param field the text
   * @return this buffer
   */
  public RowBuffer text(String field) {
    boolean quoted =
        field.chars().anyMatch(letter -> letter == ',' || letter == '"' || letter == '\n');
    String written = quoted ? '"' + field.replace("\"", "\"\"") + '"' : field;
    return plain(written.getBytes(StandardCharsets.UTF_8));
  }

  /**
   * Adds a whole number.
   *
   * @param number the number, not negative
   * @return this buffer
   */
  public RowBuffer number(int number) {
    separate(SPARE);
    digits(number);
    return this;
  }

  /**
   * Adds a whole number, or nothing for 0.
   *
   * @param number the number, not negative
   * @return this buffer
   */
  public RowBuffer numberOrEmpty(int number) {
    return number == 0 ? empty() : number(number);
  }

  /**
   * Adds a decimal number.
   *
   * @param number in units of the last decimal, not negative
   * @param decimals 1 or 2
   * @return this buffer
   */
  public RowBuffer decimal(int number, int decimals) {
    separate(SPARE);
    int scale = decimals == 1 ? 10 : 100;
    digits(number / scale);
    bytes[length++] = '.';
    if (decimals == 2) {
      bytes[length++] = (byte) ('0' + number / 10 % 10);
    }
    bytes[length++] = (byte) ('0' + number % 10);
    return this;
  }

  /**
   * Adds a time with {@code T} and minutes, or nothing for 0.
   *
   * @param seconds seconds since the epoch
   * @return this buffer
   */
  public RowBuffer minute(long seconds) {
    separate(SPARE);
    length = seconds == 0 ? length : TimeText.put(bytes, length, seconds, 'T', false);
    return this;
  }

  /**
   * Adds a time with a blank and seconds, or nothing for 0.
   *
   * @param seconds seconds since the epoch
   * @return this buffer
   */
  public RowBuffer second(long seconds) {
    separate(SPARE);
    length = seconds == 0 ? length : TimeText.put(bytes, length, seconds, ' ', true);
    return this;
  }

  /**
   * Adds a bare date.
   *
   * @param seconds seconds since the epoch
   * @return this buffer
   */
  public RowBuffer date(long seconds) {
    separate(SPARE);
    length = TimeText.putDate(bytes, length, seconds);
    return this;
  }

  /**
   * Writes all rows in order of time.
   *
   * @param out where to
   * @param lineEnd end of each line; line breaks within quoted fields are changed to it too
   * @throws IOException when writing fails
   */
  public void writeTo(OutputStream out, String lineEnd) throws IOException {
    byte[] end = lineEnd.getBytes(StandardCharsets.US_ASCII);
    long[] sorted = Arrays.copyOf(keys, rows);
    Arrays.sort(sorted);
    for (long key : sorted) {
      int row = (int) (key & INDEX_MASK);
      if (end.length == 1) {
        out.write(bytes, starts[row], starts[row + 1] - starts[row]);
      } else {
        writeSlowly(out, row, end);
      }
      out.write(end);
    }
  }

  private void writeSlowly(OutputStream out, int row, byte[] end) throws IOException {
    for (int at = starts[row]; at < starts[row + 1]; at++) {
      if (bytes[at] == '\n') {
        out.write(end);
      } else {
        out.write(bytes[at]);
      }
    }
  }

  private void separate(int needed) {
    if (length + needed > bytes.length) {
      bytes = Arrays.copyOf(bytes, Math.max(bytes.length * 2, length + needed));
    }
    if (!firstField) {
      bytes[length++] = ',';
    }
    firstField = false;
  }

  private void digits(int number) {
    int width = 1;
    for (int rest = number; rest >= 10; rest /= 10) {
      width++;
    }
    int rest = number;
    for (int at = length + width - 1; at >= length; at--) {
      bytes[at] = (byte) ('0' + rest % 10);
      rest /= 10;
    }
    length += width;
  }
}
