package millrace.etl.check;

import java.util.function.IntPredicate;

/**
 * Finds among numbered items one with the same hash that also matches. Open addressing; room for a
 * known number.
 */
final class HashIndex {
  private final long[] hashes;
  private final int[] items;
  private final int mask;

  HashIndex(int capacity) {
    int size = Integer.highestOneBit(Math.max(4, capacity) * 2 - 1) * 2;
    hashes = new long[size];
    items = new int[size];
    mask = size - 1;
  }

  /** True when an earlier item has the hash and matches; otherwise remembers the item. */
  boolean addOrMatch(long hash, int item, IntPredicate matches) {
    int slot = (int) (hash ^ (hash >>> 32)) & mask;
    while (items[slot] != 0) {
      if (hashes[slot] == hash && matches.test(items[slot] - 1)) {
        return true;
      }
      slot = (slot + 1) & mask;
    }
    hashes[slot] = hash;
    items[slot] = item + 1;
    return false;
  }
}
