package millrace.etl.spark;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The rows of a part of a file with their keys, held until all are read and then packed by key. Not
 * for several threads.
 */
final class RowArena {
  private byte[] bytes = new byte[1 << 20];
  private int size;
  private int[] rowKey = new int[1 << 12];
  private int[] rowFrom = new int[1 << 12];
  private int[] rowLength = new int[1 << 12];
  private int[] rowLine = new int[1 << 12];
  private int rows;
  private final KeyIndex keys = new KeyIndex();

  /** A block of packed rows and their key. */
  record Keyed(String key, byte[] block) {}

  /** Keeps a row. */
  void add(long line, byte[] source, int from, int to, byte[] key, int keyFrom, int keyTo) {
    if (rows == rowKey.length) {
      rowKey = Arrays.copyOf(rowKey, rows * 2);
      rowFrom = Arrays.copyOf(rowFrom, rows * 2);
      rowLength = Arrays.copyOf(rowLength, rows * 2);
      rowLine = Arrays.copyOf(rowLine, rows * 2);
    }
    int length = to - from;
    if (size + length > bytes.length) {
      bytes = Arrays.copyOf(bytes, Math.max(size + length, bytes.length * 2));
    }
    System.arraycopy(source, from, bytes, size, length);
    rowKey[rows] = keys.number(key, keyFrom, keyTo);
    rowFrom[rows] = size;
    rowLength[rows] = length;
    rowLine[rows] = (int) line;
    size += length;
    rows++;
  }

  /** A block for each key, rows in the order in which they came. */
  List<Keyed> packed(int table, int file) {
    int[] order = byKey();
    List<Keyed> blocks = new ArrayList<>(keys.size());
    int from = 0;
    while (from < rows) {
      int key = rowKey[order[from]];
      int to = from;
      int text = 0;
      while (to < rows && rowKey[order[to]] == key) {
        text += rowLength[order[to]];
        to++;
      }
      PatientBlock block = new PatientBlock(table, file, to - from, text);
      for (int i = from; i < to; i++) {
        int row = order[i];
        block.add(rowLine[row], bytes, rowFrom[row], rowFrom[row] + rowLength[row]);
      }
      blocks.add(new Keyed(keys.text(key), block.packed()));
      from = to;
    }
    return blocks;
  }

  /** Rows in order of their key's number, and in the order of coming within a key. */
  private int[] byKey() {
    int[] start = new int[keys.size() + 1];
    for (int i = 0; i < rows; i++) {
      start[rowKey[i] + 1]++;
    }
    for (int k = 0; k < keys.size(); k++) {
      start[k + 1] += start[k];
    }
    int[] order = new int[rows];
    for (int i = 0; i < rows; i++) {
      order[start[rowKey[i]]++] = i;
    }
    return order;
  }

  /** Numbers texts in the order in which they first come. Open addressing on their bytes. */
  private static final class KeyIndex {
    private int[] slots = new int[1 << 12];
    private final List<byte[]> texts = new ArrayList<>();

    int size() {
      return texts.size();
    }

    String text(int number) {
      return new String(texts.get(number), StandardCharsets.UTF_8);
    }

    int number(byte[] key, int from, int to) {
      if (texts.size() * 2 >= slots.length) {
        grow();
      }
      int slot = slot(key, from, to);
      if (slots[slot] == 0) {
        texts.add(Arrays.copyOfRange(key, from, to));
        slots[slot] = texts.size();
      }
      return slots[slot] - 1;
    }

    private int slot(byte[] key, int from, int to) {
      long hash = 0xCBF29CE484222325L;
      for (int i = from; i < to; i++) {
        hash = (hash ^ key[i]) * 0x100000001B3L;
      }
      int slot = (int) (hash ^ (hash >>> 32)) & (slots.length - 1);
      while (slots[slot] != 0 && !same(texts.get(slots[slot] - 1), key, from, to)) {
        slot = (slot + 1) & (slots.length - 1);
      }
      return slot;
    }

    private static boolean same(byte[] text, byte[] key, int from, int to) {
      return Arrays.equals(text, 0, text.length, key, from, to);
    }

    private void grow() {
      slots = new int[slots.length * 2];
      for (int i = 0; i < texts.size(); i++) {
        byte[] text = texts.get(i);
        slots[slot(text, 0, text.length)] = i + 1;
      }
    }
  }
}
