package millrace.etl.normalise;

import java.io.Serializable;
import java.util.Arrays;

/**
 * Which identifiers exist, at eight bytes each, so that the ids of millions of admissions fit in
 * memory. An id that is not in the extract is taken for one with a chance of about one in 10^12 at
 * five million admissions.
 *
 * @param hashes hashes of the identifiers, sorted
 */
public record KeySet(long[] hashes) implements Serializable {
  /** The set of these hashes; sorts the array. */
  public static KeySet of(long[] hashes) {
    Arrays.sort(hashes);
    return new KeySet(hashes);
  }

  /** Whether the identifier is in the set. */
  public boolean contains(String id) {
    return Arrays.binarySearch(hashes, hash(id)) >= 0;
  }

  /** The hash of an identifier. */
  public static long hash(String id) {
    long hash = 0xCBF29CE484222325L;
    for (int i = 0; i < id.length(); i++) {
      hash = (hash ^ id.charAt(i)) * 0x100000001B3L;
    }
    hash ^= hash >>> 32;
    hash *= 0x9E3779B97F4A7C15L;
    return hash ^ (hash >>> 29);
  }
}
