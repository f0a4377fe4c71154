package millrace.analytics.patient;

import java.util.HashMap;
import java.util.Map;
import java.util.function.BiConsumer;
import millrace.etl.check.Findings;

/** Sums that are taken over all patients, by a key of words. Not for several threads. */
public final class Tally {
  /** What is summed. */
  public enum Group {
    /** Admissions by cohort class. */
    FLOW,
    /** Findings by kind, table, detail. */
    FINDING,
    /** Rows by table and fate. */
    ACCOUNT,
    /** Exposed and monitored days by number of subject. */
    MONITORING,
    /** Occupied seconds and results by month and unit. */
    TESTING
  }

  /** A key: a group and up to three words. */
  public record Key(Group group, String first, String second, String third)
      implements java.io.Serializable {}

  private final Map<Key, Long> sums = new HashMap<>();

  /** Adds to a sum. */
  public void add(Group group, String first, String second, String third, long more) {
    if (more != 0) {
      sums.merge(new Key(group, first, second, third), more, Long::sum);
    }
  }

  /** Adds findings. */
  public void addFindings(Findings findings) {
    findings.forEach(
        (key, rows) -> add(Group.FINDING, key.kind().word(), key.table(), key.detail(), rows));
  }

  /** A sum; 0 when nothing was added. */
  public long sum(Key key) {
    return sums.getOrDefault(key, 0L);
  }

  /** All sums, in no order. */
  public void forEach(BiConsumer<Key, Long> visitor) {
    sums.forEach(visitor);
  }
}
