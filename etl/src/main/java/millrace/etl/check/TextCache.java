package millrace.etl.check;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import millrace.etl.parse.RowFields;

/**
 * Texts that come again and again (codes, units, ids), each made a String once. Not for several
 * threads.
 */
final class TextCache {
  private static final int SLOTS = 4_096;
  private static final int LONGEST = 64;

  private final byte[][] keys = new byte[SLOTS][];
  private final String[] texts = new String[SLOTS];

  String text(RowFields fields, int column) {
    byte[] bytes = fields.bytes(column);
    int from = fields.from(column);
    int to = fields.to(column);
    if (from == to) {
      return "";
    }
    if (to - from > LONGEST) {
      return fields.text(column);
    }
    int hash = 1;
    for (int i = from; i < to; i++) {
      hash = 31 * hash + bytes[i];
    }
    int slot = (hash ^ (hash >>> 15)) & (SLOTS - 1);
    byte[] key = keys[slot];
    if (key == null || !Arrays.equals(key, 0, key.length, bytes, from, to)) {
      keys[slot] = Arrays.copyOfRange(bytes, from, to);
      texts[slot] = new String(keys[slot], StandardCharsets.UTF_8);
    }
    return texts[slot];
  }
}
