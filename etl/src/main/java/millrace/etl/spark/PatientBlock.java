package millrace.etl.spark;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import millrace.etl.contract.ContractTable;
import millrace.etl.parse.RawRow;
import millrace.etl.record.SourceLine;

/**
 * Raw rows of one table and file that share a key, packed for the shuffle: table, file, then for
 * each row the lines from the one before, its length and its bytes. Rows stay as text, so that
 * equal rows, rules and the quarantine see what the extract says.
 */
final class PatientBlock {
  private static final int LONGEST_NUMBER = 10;
  private byte[] bytes;
  private int size;
  private long lastLine;

  /** A block with room for that many rows and bytes of text. */
  PatientBlock(int table, int file, int rows, int text) {
    bytes = new byte[text + rows * 6 + LONGEST_NUMBER];
    bytes[size++] = (byte) table;
    putNumber(file);
  }

  void add(long line, byte[] source, int from, int to) {
    int length = to - from;
    ensure(length + 2 * LONGEST_NUMBER);
    putNumber(line - lastLine);
    putNumber(length);
    System.arraycopy(source, from, bytes, size, length);
    size += length;
    lastLine = line;
  }

  byte[] packed() {
    return size == bytes.length ? bytes : Arrays.copyOf(bytes, size);
  }

  /** Unpacks a block into the lists of its table. */
  static void unpack(byte[] block, Map<ContractTable, List<RawRow>> rows) {
    List<RawRow> target = rows.get(ContractTable.values()[block[0]]);
    Cursor cursor = new Cursor(block, 1);
    int file = (int) cursor.number();
    long line = 0;
    while (cursor.at < block.length) {
      line += cursor.number();
      int length = (int) cursor.number();
      target.add(
          new RawRow(block, cursor.at, cursor.at + length, new SourceLine(file, (int) line)));
      cursor.at += length;
    }
  }

  private void ensure(int more) {
    if (size + more > bytes.length) {
      bytes = Arrays.copyOf(bytes, Math.max(bytes.length * 2, size + more));
    }
  }

  private void putNumber(long number) {
    ensure(LONGEST_NUMBER);
    long rest = number;
    while (rest >= 0x80) {
      bytes[size++] = (byte) (rest | 0x80);
      rest >>>= 7;
    }
    bytes[size++] = (byte) rest;
  }

  /** Reads numbers of seven bits a byte. */
  private static final class Cursor {
    private final byte[] block;
    private int at;

    Cursor(byte[] block, int at) {
      this.block = block;
      this.at = at;
    }

    long number() {
      long number = 0;
      int shift = 0;
      while (block[at] < 0) {
        number |= (long) (block[at++] & 0x7F) << shift;
        shift += 7;
      }
      return number | (long) block[at++] << shift;
    }
  }
}
