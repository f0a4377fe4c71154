package millrace.etl.spark;

import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.NoSuchElementException;
import org.apache.spark.sql.Row;

/** Groups rows of a partition that is sorted by its first column, a text. */
final class RowGroups implements Iterator<RowGroups.Group> {
  /** Rows with one key. */
  record Group(String key, List<Row> rows) {}

  private final Iterator<Row> rows;
  private Row ahead;

  RowGroups(Iterator<Row> sorted) {
    rows = sorted;
    ahead = rows.hasNext() ? rows.next() : null;
  }

  @Override
  public boolean hasNext() {
    return ahead != null;
  }

  @Override
  public Group next() {
    if (ahead == null) {
      throw new NoSuchElementException();
    }
    String key = ahead.getString(0);
    List<Row> group = new ArrayList<>();
    while (ahead != null && ahead.getString(0).equals(key)) {
      group.add(ahead);
      ahead = rows.hasNext() ? rows.next() : null;
    }
    return new Group(key, group);
  }
}
