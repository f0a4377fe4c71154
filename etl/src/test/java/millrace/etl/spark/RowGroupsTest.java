package millrace.etl.spark;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.stream.Stream;
import org.apache.spark.sql.RowFactory;
import org.junit.jupiter.api.Test;

class RowGroupsTest {
  private static RowGroups of(String... keys) {
    return new RowGroups(Stream.of(keys).map(k -> RowFactory.create(k)).iterator());
  }

  @Test
  void rowsOfOneKeyAreOneGroup() {
    List<String> groups = new ArrayList<>();
    of("a", "a", "b", "c", "c", "c").forEachRemaining(g -> groups.add(g.key() + g.rows().size()));

    assertEquals(List.of("a2", "b1", "c3"), groups);
  }

  @Test
  void withoutRowsThereIsNoGroup() {
    assertFalse(of().hasNext());
    assertThrows(NoSuchElementException.class, () -> of().next());
  }
}
