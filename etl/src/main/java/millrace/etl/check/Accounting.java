package millrace.etl.check;

import java.util.EnumMap;
import java.util.Map;
import millrace.etl.contract.ContractTable;

/** Rows read, kept, merged and quarantined, per table. Not for several threads. */
public final class Accounting {
  /**
   * The account of one table.
   *
   * @param read rows read
   * @param kept rows kept
   * @param merged rows merged as duplicates
   * @param quarantined rows in the quarantine
   */
  public record Line(long read, long kept, long merged, long quarantined) {
    static final Line ZERO = new Line(0, 0, 0, 0);

    /** Whether no row was lost: read = kept + merged + quarantined. */
    public boolean balances() {
      return read == kept + merged + quarantined;
    }

    /** The sum of two accounts. */
    public Line plus(Line other) {
      return new Line(
          read + other.read,
          kept + other.kept,
          merged + other.merged,
          quarantined + other.quarantined);
    }
  }

  private final Map<ContractTable, Line> lines = new EnumMap<>(ContractTable.class);

  /** Adds to a table's account. */
  public void add(ContractTable table, Line line) {
    lines.merge(table, line, Line::plus);
  }

  /** The account of a table; zeros when it has none. */
  public Line of(ContractTable table) {
    return lines.getOrDefault(table, Line.ZERO);
  }

  /** The accounts by table, in the contract's order. */
  public Map<ContractTable, Line> lines() {
    return Map.copyOf(lines);
  }
}
