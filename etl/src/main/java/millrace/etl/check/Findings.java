package millrace.etl.check;

import java.util.Map;
import java.util.TreeMap;
import java.util.function.BiConsumer;
import millrace.etl.contract.ContractTable;

/** Counts of findings by kind, table and detail. Not for several threads. */
public final class Findings {
  /**
   * What is counted together.
   *
   * @param kind kind of finding
   * @param table name of the table
   * @param detail column, code or word; may be empty, never a value of a patient
   */
  public record Key(FindingKind kind, String table, String detail) implements Comparable<Key> {
    @Override
    public int compareTo(Key other) {
      int byKind = kind.compareTo(other.kind);
      int byTable = byKind != 0 ? byKind : table.compareTo(other.table);
      return byTable != 0 ? byTable : detail.compareTo(other.detail);
    }
  }

  private final Map<Key, Long> counts = new TreeMap<>();

  /** Counts one. */
  public void count(FindingKind kind, ContractTable table, String detail) {
    add(new Key(kind, table.tableName(), detail), 1);
  }

  /** Adds a count. */
  public void add(Key key, long rows) {
    if (rows != 0) {
      counts.merge(key, rows, Long::sum);
    }
  }

  /** All counts, in a fixed order. */
  public void forEach(BiConsumer<Key, Long> action) {
    counts.forEach(action);
  }
}
